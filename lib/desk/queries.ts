import "server-only";
import type { Knex } from "knex";
import { findingColumnsOf, fromFindingColumns, toFindingColumns } from "@/lib/findings/columns";
import type { ConventionName } from "@/lib/reflex/named-convention";
import { conventionLabel } from "@/lib/rounds/convention-label";
import type { RoundState } from "@/lib/rounds/schema";
import type { DeskItem, DeskRound, DeskRoundState, ReadingInput, SavedReading } from "./schema";

/** Whose desk: a person in one department. Every query here is held to it. */
export type Reader = { id: string; departmentId: string };

type AssignmentRow = {
  id: string;
  assignment_id: string;
  number: number;
  title: string;
  instructions: string;
  convention: ConventionName;
  own_degrees_per_mm: string | null;
  state: RoundState;
  opens_at: Date;
  closes_at: Date;
  submitted_at: Date | null;
  item_count: number;
  read_count: number;
};

function ownRounds(db: Knex, reader: Reader) {
  return db("assignments")
    .join("rounds", "rounds.id", "assignments.round_id")
    .leftJoin("assignment_items", "assignment_items.assignment_id", "assignments.id")
    .leftJoin("readings", "readings.assignment_item_id", "assignment_items.id")
    .where({ "assignments.person_id": reader.id, "assignments.department_id": reader.departmentId })
    .whereNot("rounds.state", "draft")
    .groupBy("assignments.id", "rounds.id")
    .select<AssignmentRow[]>(
      "rounds.id",
      "assignments.id as assignment_id",
      "rounds.number",
      "rounds.title",
      "rounds.instructions",
      "rounds.convention",
      "rounds.own_degrees_per_mm",
      "rounds.state",
      "rounds.opens_at",
      "rounds.closes_at",
      "assignments.submitted_at",
      db.raw("count(assignment_items.id)::int AS item_count"),
      db.raw("count(readings.id)::int AS read_count"),
    );
}

function deskState(row: AssignmentRow, now: Date): DeskRoundState {
  if (row.state === "released") return "released";
  if (row.state === "closed" || row.closes_at <= now) return "closed";
  if (row.submitted_at) return "submitted";
  return row.opens_at > now ? "waiting" : "open";
}

function toDeskRound(row: AssignmentRow, now: Date): DeskRound {
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    state: deskState(row, now),
    opensAt: row.opens_at.toISOString(),
    closesAt: row.closes_at.toISOString(),
    submittedAt: row.submitted_at?.toISOString() ?? null,
    itemCount: row.item_count,
    readCount: row.read_count,
  };
}

export async function listDeskRounds(db: Knex, reader: Reader, now: Date): Promise<DeskRound[]> {
  const rows = await ownRounds(db, reader).orderBy("rounds.number", "desc");
  return rows.map((row) => toDeskRound(row, now));
}

export type OwnRound = DeskRound & { assignmentId: string; instructions: string; convention: string };

export async function findOwnRound(db: Knex, reader: Reader, roundId: string, now: Date): Promise<OwnRound | null> {
  const row = await ownRounds(db, reader).where("rounds.id", roundId).first();
  if (!row) return null;
  const { assignment_id: assignmentId, instructions } = row;
  return { ...toDeskRound(row, now), assignmentId, instructions, convention: conventionLabel(row) };
}

const READING_COLUMNS = [
  ...findingColumnsOf("readings"),
  "readings.confidence",
  "readings.seconds",
  "readings.revision",
  "readings.save_id",
  "readings.saved_at",
];

type ReadingRow = Parameters<typeof fromFindingColumns>[0] & {
  confidence: SavedReading["confidence"];
  seconds: string;
  revision: number;
  save_id: string;
  saved_at: Date;
};

function toSavedReading(row: ReadingRow): SavedReading {
  return {
    finding: fromFindingColumns(row),
    confidence: row.confidence,
    seconds: Number(row.seconds),
    revision: row.revision,
    savedAt: row.saved_at.toISOString(),
  };
}

/** The showings of one assignment in their examiner's own order. */
export async function listDeskItems(db: Knex, assignmentId: string): Promise<DeskItem[]> {
  const rows = await db("assignment_items")
    .join("items", "items.id", "assignment_items.item_id")
    .leftJoin("readings", "readings.assignment_item_id", "assignment_items.id")
    .where("assignment_items.assignment_id", assignmentId)
    .orderBy("assignment_items.place")
    .select("assignment_items.id", "assignment_items.place", "items.picture_width", "items.picture_height")
    .select(READING_COLUMNS);
  return rows.map((row) => ({
    id: row.id,
    place: row.place,
    pictureHref: `/api/desk/items/${row.id}/picture`,
    width: row.picture_width,
    height: row.picture_height,
    reading: row.revision === null ? null : toSavedReading(row),
  }));
}

/**
 * Where the picture of a showing is stored, for the examiner it belongs to once the round has opened. A released round
 * no longer shows a case that the person also has in a round still sealed, where it could be laid beside it.
 */
export async function findOwnPictureKey(db: Knex, reader: Reader, itemId: string, now: Date): Promise<string | null> {
  const row = await db("assignment_items")
    .join("assignments", "assignments.id", "assignment_items.assignment_id")
    .join("rounds", "rounds.id", "assignments.round_id")
    .join("items", "items.id", "assignment_items.item_id")
    .where({
      "assignment_items.id": itemId,
      "assignments.person_id": reader.id,
      "assignments.department_id": reader.departmentId,
    })
    .where("rounds.opens_at", "<=", now)
    .where((shown) => shown.whereNot("rounds.state", "released").orWhereNotExists(sealedAgain(db, reader)))
    .first("items.picture_key");
  return row?.picture_key ?? null;
}

/** The same case in a round of the person's that is not released yet. */
function sealedAgain(db: Knex, reader: Reader) {
  return db("items as again")
    .join("rounds as sealed", "sealed.id", "again.round_id")
    .join("assignments as theirs", "theirs.round_id", "sealed.id")
    .whereRaw("again.case_id = items.case_id")
    .where("theirs.person_id", reader.id)
    .whereIn("sealed.state", ["open", "closed"])
    .select(db.raw("1"));
}

export type OwnShowing = {
  assignmentId: string;
  submittedAt: Date | null;
  state: RoundState;
  opensAt: Date;
  closesAt: Date;
  convention: string;
  ownDegreesPerMm: string | null;
};

/**
 * Locks a showing for a save. The round is locked in share mode, so that it cannot close between the check and the
 * write, while any number of examiners save at once; the assignment is locked, so that saves of one person queue up.
 */
export async function lockShowing(trx: Knex.Transaction, reader: Reader, itemId: string): Promise<OwnShowing | null> {
  const { rows } = await trx.raw(
    `SELECT assignments.id, assignments.submitted_at, rounds.state, rounds.opens_at, rounds.closes_at,
            rounds.convention, rounds.own_degrees_per_mm
     FROM assignment_items
     JOIN assignments ON assignments.id = assignment_items.assignment_id
     JOIN rounds ON rounds.id = assignments.round_id
     WHERE assignment_items.id = ? AND assignments.person_id = ? AND assignments.department_id = ?
       AND rounds.state <> 'draft'
     FOR UPDATE OF assignments FOR SHARE OF rounds`,
    [itemId, reader.id, reader.departmentId],
  );
  const row = rows[0];
  if (!row) return null;
  return {
    assignmentId: row.id,
    submittedAt: row.submitted_at,
    state: row.state,
    opensAt: row.opens_at,
    closesAt: row.closes_at,
    convention: row.convention,
    ownDegreesPerMm: row.own_degrees_per_mm,
  };
}

export type StoredReading = SavedReading & { saveId: string };

export async function findReading(db: Knex, itemId: string): Promise<StoredReading | null> {
  const row = await db("readings").where({ assignment_item_id: itemId }).first(READING_COLUMNS);
  return row ? { ...toSavedReading(row), saveId: row.save_id } : null;
}

export async function upsertReading(
  trx: Knex.Transaction,
  itemId: string,
  input: ReadingInput,
  showing: OwnShowing,
  now: Date,
): Promise<void> {
  const changing = {
    ...toFindingColumns(input.finding),
    confidence: input.confidence,
    seconds: input.seconds,
    convention: showing.convention,
    own_degrees_per_mm: showing.ownDegreesPerMm,
    save_id: input.saveId,
    revision: input.revision,
    saved_at: now,
  };
  await trx("readings")
    .insert({ assignment_item_id: itemId, first_saved_at: now, ...changing })
    .onConflict("assignment_item_id")
    .merge(changing);
}

export async function markOpened(db: Knex, assignmentId: string, now: Date): Promise<void> {
  await db("assignments").where({ id: assignmentId }).whereNull("opened_at").update({ opened_at: now });
}

export type OwnAssignment = {
  id: string;
  submittedAt: Date | null;
  state: RoundState;
  opensAt: Date;
  closesAt: Date;
};

export async function lockAssignment(
  trx: Knex.Transaction,
  reader: Reader,
  roundId: string,
): Promise<OwnAssignment | null> {
  const { rows } = await trx.raw(
    `SELECT assignments.id, assignments.submitted_at, rounds.state, rounds.opens_at, rounds.closes_at
     FROM assignments JOIN rounds ON rounds.id = assignments.round_id
     WHERE rounds.id = ? AND assignments.person_id = ? AND assignments.department_id = ? AND rounds.state <> 'draft'
     FOR UPDATE OF assignments FOR SHARE OF rounds`,
    [roundId, reader.id, reader.departmentId],
  );
  const row = rows[0];
  if (!row) return null;
  return {
    id: row.id,
    submittedAt: row.submitted_at,
    state: row.state,
    opensAt: row.opens_at,
    closesAt: row.closes_at,
  };
}

/** The places that still lack a reading. */
export async function listUnreadPlaces(db: Knex, assignmentId: string): Promise<number[]> {
  const rows = await db("assignment_items")
    .leftJoin("readings", "readings.assignment_item_id", "assignment_items.id")
    .where("assignment_items.assignment_id", assignmentId)
    .whereNull("readings.id")
    .orderBy("assignment_items.place")
    .select("assignment_items.place");
  return rows.map(({ place }) => place);
}

export async function markSubmitted(trx: Knex.Transaction, assignmentId: string, now: Date): Promise<void> {
  await trx("assignments").where({ id: assignmentId }).update({ submitted_at: now });
}
