import type { Knex } from "knex";

export async function up(knex: Knex): Promise<void> {
  await knex.schema.createTable("rounds", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("department_id").notNullable().references("departments.id");
    table.integer("number").notNullable();
    table.text("title").notNullable();
    table.text("instructions").notNullable().defaultTo("");
    table.text("state").notNullable().defaultTo("draft");
    table.timestamp("opens_at", { useTz: true });
    table.timestamp("closes_at", { useTz: true });
    table.text("convention").notNullable();
    table.decimal("own_degrees_per_mm", 5, 2);
    table.uuid("created_by").references("people.id");
    table.timestamp("created_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.timestamp("updated_at", { useTz: true }).notNullable().defaultTo(knex.fn.now());
    table.timestamp("published_at", { useTz: true });
    table.timestamp("closed_at", { useTz: true });
    table.timestamp("released_at", { useTz: true });
    table.unique(["department_id", "number"]);
    table.unique(["id", "department_id"]);
  });
  await knex.raw(`
    ALTER TABLE rounds
      ADD CONSTRAINT rounds_state CHECK (state IN ('draft', 'open', 'closed', 'released')),
      ADD CONSTRAINT rounds_title CHECK (btrim(title) <> ''),
      ADD CONSTRAINT rounds_window CHECK (closes_at > opens_at),
      ADD CONSTRAINT rounds_published CHECK
        ((state <> 'draft') = (published_at IS NOT NULL)
         AND (state = 'draft' OR (opens_at IS NOT NULL AND closes_at IS NOT NULL))),
      ADD CONSTRAINT rounds_closed CHECK ((state IN ('closed', 'released')) = (closed_at IS NOT NULL)),
      ADD CONSTRAINT rounds_released CHECK ((state = 'released') = (released_at IS NOT NULL)),
      ADD CONSTRAINT rounds_own_figure CHECK ((convention = 'own') = (own_degrees_per_mm IS NOT NULL))
  `);
  // draft, open, closed, released: one step at a time and never back, whatever code asks for it.
  await knex.raw(`
    CREATE FUNCTION keep_round_one_way() RETURNS trigger LANGUAGE plpgsql AS $$
    DECLARE
      states CONSTANT text[] := ARRAY['draft', 'open', 'closed', 'released'];
    BEGIN
      IF array_position(states, NEW.state) - array_position(states, OLD.state) NOT IN (0, 1) THEN
        RAISE EXCEPTION 'a round that is % cannot become %', OLD.state, NEW.state USING ERRCODE = 'check_violation';
      END IF;
      RETURN NEW;
    END $$
  `);
  await knex.raw(`
    CREATE TRIGGER rounds_one_way BEFORE UPDATE OF state ON rounds
      FOR EACH ROW EXECUTE FUNCTION keep_round_one_way()
  `);

  await knex.schema.createTable("items", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("round_id").notNullable();
    table.uuid("department_id").notNullable();
    table.uuid("case_id").notNullable();
    table.integer("position").notNullable();
    table.text("kind").notNullable().defaultTo("first");
    // Set at publishing: the item's own picture, under a key that says nothing of the case.
    table.text("picture_key").unique();
    table.integer("picture_width");
    table.integer("picture_height");
    table.foreign(["round_id", "department_id"]).references(["id", "department_id"]).inTable("rounds");
    table.foreign(["case_id", "department_id"]).references(["id", "department_id"]).inTable("cases");
    table.unique(["round_id", "position"]);
    table.index("case_id");
  });
  await knex.raw(`
    ALTER TABLE items
      ADD CONSTRAINT items_kind CHECK (kind IN ('first', 'repeat', 'mirrored')),
      ADD CONSTRAINT items_position CHECK (position >= 1)
  `);
  await knex.raw("CREATE UNIQUE INDEX items_first_once ON items (round_id, case_id) WHERE kind = 'first'");

  await knex.schema.createTable("assignments", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("round_id").notNullable();
    table.uuid("department_id").notNullable();
    table.uuid("person_id").notNullable();
    table.text("assigned_as").notNullable();
    table.timestamp("opened_at", { useTz: true });
    table.timestamp("submitted_at", { useTz: true });
    table.foreign(["round_id", "department_id"]).references(["id", "department_id"]).inTable("rounds");
    table.foreign(["person_id", "department_id"]).references(["person_id", "department_id"]).inTable("memberships");
    table.unique(["round_id", "person_id"]);
    table.index("person_id");
  });
  await knex.raw(
    "ALTER TABLE assignments ADD CONSTRAINT assignments_role CHECK (assigned_as IN ('examiner', 'trainee'))",
  );

  // An examiner's own order. Its id is what the examiner's browser sees, so that two browsers share no address.
  await knex.schema.createTable("assignment_items", (table) => {
    table.uuid("id").primary().defaultTo(knex.fn.uuid());
    table.uuid("assignment_id").notNullable().references("assignments.id");
    table.uuid("item_id").notNullable().references("items.id");
    table.integer("place").notNullable();
    table.unique(["assignment_id", "place"]);
    table.unique(["assignment_id", "item_id"]);
    table.index("item_id");
  });
  await knex.raw("ALTER TABLE assignment_items ADD CONSTRAINT assignment_items_place CHECK (place >= 1)");
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("assignment_items");
  await knex.schema.dropTable("assignments");
  await knex.schema.dropTable("items");
  await knex.schema.dropTable("rounds");
  await knex.raw("DROP FUNCTION keep_round_one_way");
}
