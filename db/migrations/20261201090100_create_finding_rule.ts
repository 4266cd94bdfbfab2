import type { Knex } from "knex";

/**
 * The rules of a finding, kept by the database itself for references and readings alike: not readable with a reason,
 * or readable with an eye exactly when a part deviates, and degrees (1 to 45, or beyond the limbus) exactly where a
 * part deviates. Every branch ends in TRUE or FALSE, because a CHECK lets NULL pass.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE FUNCTION finding_part_is_sound(direction text, degrees smallint, beyond boolean, allowed text[])
    RETURNS boolean LANGUAGE sql IMMUTABLE AS $$
      SELECT CASE
        WHEN direction IS NULL OR beyond IS NULL THEN FALSE
        WHEN direction = 'none' THEN degrees IS NULL AND NOT beyond
        WHEN NOT direction = ANY (allowed) THEN FALSE
        WHEN beyond THEN degrees IS NULL
        ELSE degrees IS NOT NULL AND degrees BETWEEN 1 AND 45
      END
    $$
  `);
  await knex.raw(`
    CREATE FUNCTION finding_is_sound(
      readable boolean, unreadable_reason text, eye text,
      horizontal text, horizontal_degrees smallint, horizontal_beyond boolean,
      vertical text, vertical_degrees smallint, vertical_beyond boolean
    ) RETURNS boolean LANGUAGE sql IMMUTABLE AS $$
      SELECT CASE
        WHEN readable IS NULL THEN FALSE
        WHEN NOT readable THEN
          COALESCE(unreadable_reason IN ('blurred', 'reflex-hidden', 'pupil-not-visible', 'not-fixating',
            'irregular-pupil', 'needs-cover-test', 'other'), FALSE)
          AND eye IS NULL AND horizontal IS NULL AND horizontal_degrees IS NULL AND horizontal_beyond IS NULL
          AND vertical IS NULL AND vertical_degrees IS NULL AND vertical_beyond IS NULL
        ELSE
          unreadable_reason IS NULL
          AND COALESCE(eye IN ('none', 'right', 'left'), FALSE)
          AND finding_part_is_sound(horizontal, horizontal_degrees, horizontal_beyond, ARRAY['eso', 'exo'])
          AND finding_part_is_sound(vertical, vertical_degrees, vertical_beyond, ARRAY['hyper', 'hypo'])
          AND ((eye = 'none') = (horizontal = 'none' AND vertical = 'none'))
      END
    $$
  `);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("DROP FUNCTION finding_is_sound");
  await knex.raw("DROP FUNCTION finding_part_is_sound");
}
