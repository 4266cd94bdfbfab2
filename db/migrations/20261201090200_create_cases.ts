import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("photographs", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("department_id").notNullable().references("departments.id");
    table.text("storage_key").notNullable().unique();
    table.integer("width").notNullable();
    table.integer("height").notNullable();
    table.integer("size_bytes").notNullable();
    table.text("original_name").notNullable();
    table.text("consent").notNullable();
    table.uuid("uploaded_by").references("people.id");
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.unique(["id", "department_id"]);
  });
  await knex.raw(`
    ALTER TABLE photographs ADD CONSTRAINT photographs_consent CHECK (consent IN ('patient-consent', 'drawn'))
  `);

  await knex.schema.createTable("cases", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("department_id").notNullable().references("departments.id");
    table.text("code").notNullable();
    table.uuid("photograph_id").notNullable();
    table.text("note").notNullable().defaultTo("");
    table.boolean("is_anchor").notNullable().defaultTo(false);
    table.timestamp("retired_at", { useTz: true });
    table.uuid("created_by").references("people.id");
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    // One department's case never shows another department's photograph.
    table.foreign(["photograph_id", "department_id"]).references(["id", "department_id"]).inTable("photographs");
    table.unique(["id", "department_id"]);
  });
  await knex.raw("ALTER TABLE cases ADD CONSTRAINT cases_code CHECK (code ~ '^[A-Za-z0-9][A-Za-z0-9._-]{0,23}$')");
  await knex.raw("CREATE UNIQUE INDEX cases_code_unique ON cases (department_id, lower(code))");

  await knex.schema.createTable("case_references", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("case_id").notNullable().references("cases.id");
    table.integer("revision").notNullable();
    table.boolean("readable").notNullable();
    table.text("unreadable_reason");
    table.text("eye");
    table.text("horizontal");
    table.specificType("horizontal_degrees", "smallint");
    table.boolean("horizontal_beyond");
    table.text("vertical");
    table.specificType("vertical_degrees", "smallint");
    table.boolean("vertical_beyond");
    table.text("basis").notNullable();
    table.decimal("uncertainty_degrees", 4, 1);
    table.text("reason").notNullable().defaultTo("");
    table.uuid("created_by").references("people.id");
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.unique(["case_id", "revision"]);
  });
  await knex.raw(`
    ALTER TABLE case_references
      ADD CONSTRAINT case_references_finding CHECK (finding_is_sound(readable, unreadable_reason, eye,
        horizontal, horizontal_degrees, horizontal_beyond, vertical, vertical_degrees, vertical_beyond)),
      ADD CONSTRAINT case_references_revision CHECK (revision >= 1),
      ADD CONSTRAINT case_references_basis CHECK
        (basis IN ('construction', 'cover-test', 'measured-photograph', 'panel', 'one-expert')),
      ADD CONSTRAINT case_references_uncertainty CHECK (uncertainty_degrees >= 0)
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("case_references");
  await knex.schema.dropTable("cases");
  await knex.schema.dropTable("photographs");
}
