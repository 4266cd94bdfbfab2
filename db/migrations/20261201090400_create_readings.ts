import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("readings", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("assignment_item_id").notNullable().unique().references("assignment_items.id");
    table.boolean("readable").notNullable();
    table.text("unreadable_reason");
    table.text("eye");
    table.text("horizontal");
    table.specificType("horizontal_degrees", "smallint");
    table.boolean("horizontal_beyond");
    table.text("vertical");
    table.specificType("vertical_degrees", "smallint");
    table.boolean("vertical_beyond");
    table.text("confidence");
    table.decimal("seconds", 8, 1).notNullable().defaultTo(0);
    table.text("convention").notNullable();
    table.decimal("own_degrees_per_mm", 5, 2);
    // The browser names each save and counts them, so that a repeat counts once and an older save never wins.
    table.uuid("save_id").notNullable();
    table.integer("revision").notNullable();
    table.timestamp("first_saved_at", { useTz: true }).notNullable();
    table.timestamp("saved_at", { useTz: true }).notNullable();
  });
  await knex.raw(`
    ALTER TABLE readings
      ADD CONSTRAINT readings_finding CHECK (finding_is_sound(readable, unreadable_reason, eye,
        horizontal, horizontal_degrees, horizontal_beyond, vertical, vertical_degrees, vertical_beyond)),
      ADD CONSTRAINT readings_confidence CHECK (confidence IN ('sure', 'fairly-sure', 'unsure')),
      ADD CONSTRAINT readings_seconds CHECK (seconds >= 0),
      ADD CONSTRAINT readings_revision CHECK (revision >= 1)
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("readings");
}
