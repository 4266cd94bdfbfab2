import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("departments", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.text("name").notNullable();
    table.text("time_zone").notNullable();
    table.text("convention").notNullable().defaultTo("landmarks");
    table.decimal("own_degrees_per_mm", 5, 2);
    table.text("notation").notNullable().defaultTo("tropia");
    table.decimal("kappa_floor", 3, 2).notNullable().defaultTo(0.6);
    table.boolean("is_demo").notNullable().defaultTo(false);
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
  });
  await knex.raw(`
    ALTER TABLE departments
      ADD CONSTRAINT departments_convention CHECK (convention IN
        ('landmarks', '7-per-mm', '12-per-mm', '11-per-mm-limbus', 'own')),
      ADD CONSTRAINT departments_own_figure CHECK
        ((convention = 'own') = (own_degrees_per_mm IS NOT NULL) AND own_degrees_per_mm > 0),
      ADD CONSTRAINT departments_notation CHECK (notation IN ('tropia', 'squint')),
      ADD CONSTRAINT departments_kappa_floor CHECK (kappa_floor BETWEEN -1 AND 1)
  `);

  await knex.schema.createTable("people", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.text("name").notNullable();
    table.text("email").notNullable();
    table.text("password_hash").notNullable();
    table.text("theme").notNullable().defaultTo("system");
    // Raising it ends every session of this person.
    table.integer("session_version").notNullable().defaultTo(1);
    table.timestamp("disabled_at", { useTz: true });
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
  });
  await knex.raw(`
    ALTER TABLE people
      ADD CONSTRAINT people_theme CHECK (theme IN ('system', 'light', 'dark')),
      ADD CONSTRAINT people_name CHECK (btrim(name) <> '')
  `);
  await knex.raw("CREATE UNIQUE INDEX people_email_unique ON people (lower(email))");

  await knex.schema.createTable("memberships", (table) => {
    table.uuid("person_id").notNullable().references("people.id");
    table.uuid("department_id").notNullable().references("departments.id");
    table.specificType("roles", "text[]").notNullable();
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.primary(["person_id", "department_id"]);
    table.index("department_id");
  });
  await knex.raw(`
    ALTER TABLE memberships ADD CONSTRAINT memberships_roles CHECK
      (cardinality(roles) > 0 AND roles <@ ARRAY['lead', 'examiner', 'trainee', 'reviewer', 'admin'])
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("memberships");
  await knex.schema.dropTable("people");
  await knex.schema.dropTable("departments");
}
