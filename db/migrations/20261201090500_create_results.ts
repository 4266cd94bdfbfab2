import type { Knex } from "knex";

/** Results are computed once and kept; a later change of a reference adds a revision beside the old one. */
export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("results", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("round_id").notNullable().references("rounds.id");
    table.integer("revision").notNullable();
    table.text("method_version").notNullable();
    table.text("reason").notNullable();
    table.jsonb("panel").notNullable();
    table.timestamp("computed_at", { useTz: true }).notNullable();
    table.unique(["round_id", "revision"]);
  });
  await knex.raw("ALTER TABLE results ADD CONSTRAINT results_revision CHECK (revision >= 1)");

  // Which revision of each reference the results were computed with.
  await knex.schema.createTable("result_references", (table) => {
    table.uuid("result_id").notNullable().references("results.id");
    table.uuid("item_id").notNullable().references("items.id");
    table.uuid("reference_id").notNullable().references("case_references.id");
    table.primary(["result_id", "item_id"]);
  });

  await knex.schema.createTable("examiner_results", (table) => {
    table.uuid("result_id").notNullable().references("results.id");
    table.uuid("assignment_id").notNullable().references("assignments.id");
    table.jsonb("figures").notNullable();
    table.primary(["result_id", "assignment_id"]);
    table.index("assignment_id");
  });
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("examiner_results");
  await knex.schema.dropTable("result_references");
  await knex.schema.dropTable("results");
}
