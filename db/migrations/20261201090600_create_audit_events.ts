import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("audit_events", (table) => {
    table.bigIncrements("id");
    table.uuid("department_id").references("departments.id");
    table.uuid("actor_id").references("people.id");
    table.text("action").notNullable();
    table.text("target_type").notNullable();
    table.uuid("target_id");
    table.jsonb("detail").notNullable().defaultTo("{}");
    table.timestamp("at", { useTz: true }).notNullable();
    table.index(["department_id", "id"]);
  });
  // The trail can be added to and read, and nothing else.
  await knex.raw(`
    CREATE FUNCTION refuse_audit_change() RETURNS trigger LANGUAGE plpgsql AS $$
    BEGIN
      RAISE EXCEPTION 'the audit trail cannot be changed';
    END $$
  `);
  await knex.raw(`
    CREATE TRIGGER audit_events_append_only BEFORE UPDATE OR DELETE OR TRUNCATE ON audit_events
      FOR EACH STATEMENT EXECUTE FUNCTION refuse_audit_change()
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("audit_events");
  await knex.raw("DROP FUNCTION refuse_audit_change");
}
