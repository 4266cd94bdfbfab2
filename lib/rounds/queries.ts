import "server-only";
import type { Knex } from "knex";
import type { ReadingRole } from "@/lib/auth/roles";
import type { ItemKind, RoundDetail, RoundDraft, RoundProgress, RoundState, RoundSummary } from "./schema";

type RoundRow = {
  id: string;
  department_id: string;
  number: number;
  title: string;
  instructions: string;
  state: RoundState;
  opens_at: Date | null;
  closes_at: Date | null;
  convention: string;
  own_degrees_per_mm: string | null;
  updated_at: Date;
  closed_at: Date | null;
  released_at: Date | null;
};

/** A round as services need it, dates as dates. */
export type Round = {
  id: string;
  departmentId: string;
  number: number;
  title: string;
  state: RoundState;
  opensAt: Date | null;
  closesAt: Date | null;
  convention: string;
  ownDegreesPerMm: number | null;
};

function toRound(row: RoundRow): Round {
  return {
    id: row.id,
    departmentId: row.department_id,
    number: row.number,
    title: row.title,
    state: row.state,
    opensAt: row.opens_at,
    closesAt: row.closes_at,
    convention: row.convention,
    ownDegreesPerMm: row.own_degrees_per_mm === null ? null : Number(row.own_degrees_per_mm),
  };
}

/** Locks a round of the department against every other change until the transaction ends; null when there is none. */
export async function lockRound(trx: Knex.Transaction, departmentId: string, roundId: string): Promise<Round | null> {
  const row = await trx<RoundRow>("rounds").where({ id: roundId, department_id: departmentId }).forUpdate().first();
  return row ? toRound(row) : null;
}

/** The same for the job queue, which acts for no department. */
export async function lockRoundById(trx: Knex.Transaction, roundId: string): Promise<Round | null> {
  const row = await trx<RoundRow>("rounds").where({ id: roundId }).forUpdate().first();
  return row ? toRound(row) : null;
}

/** The time by the database's clock. */
export async function readClock(db: Knex): Promise<Date> {
  const { rows } = await db.raw("SELECT clock_timestamp() AS now");
  return rows[0].now;
}

const iso = (date: Date | null) => date?.toISOString() ?? null;

type SummaryRow = RoundRow & {
  item_count: string;
  examiner_count: string;
  submitted_count: string;
  reading_count: string;
};

function summaries(db: Knex, departmentId: string) {
  const assignments = () => db("assignments").whereRaw("assignments.round_id = rounds.id");
  return db("rounds")
    .where("rounds.department_id", departmentId)
    .select(
      db("items").whereRaw("items.round_id = rounds.id").count("*").as("item_count"),
      assignments().count("*").as("examiner_count"),
      assignments().whereNotNull("submitted_at").count("*").as("submitted_count"),
      assignments()
        .join("assignment_items", "assignment_items.assignment_id", "assignments.id")
        .join("readings", "readings.assignment_item_id", "assignment_items.id")
        .count("*")
        .as("reading_count"),
    )
    .select<SummaryRow[]>("rounds.*");
}

function toSummary(row: SummaryRow): RoundSummary {
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    state: row.state,
    opensAt: iso(row.opens_at),
    closesAt: iso(row.closes_at),
    closedAt: iso(row.closed_at),
    releasedAt: iso(row.released_at),
    itemCount: Number(row.item_count),
    examinerCount: Number(row.examiner_count),
    submittedCount: Number(row.submitted_count),
    readingCount: Number(row.reading_count),
  };
}

export async function listRoundSummaries(db: Knex, departmentId: string): Promise<RoundSummary[]> {
  return (await summaries(db, departmentId).orderBy("rounds.number", "desc")).map(toSummary);
}

export async function findRoundDetail(db: Knex, departmentId: string, roundId: string): Promise<RoundDetail | null> {
  const row = await summaries(db, departmentId).where("rounds.id", roundId).first();
  if (!row) return null;
  const items = await db("items").where({ round_id: roundId }).orderBy("position").select("case_id", "kind");
  const people = await db("assignments").where({ round_id: roundId }).select("person_id");
  return {
    ...toSummary(row),
    instructions: row.instructions,
    convention: row.convention,
    items: items.map(({ case_id, kind }) => ({ caseId: case_id, kind })),
    examinerIds: people.map(({ person_id }) => person_id),
    updatedAt: row.updated_at.toISOString(),
  };
}

/** Adds a draft under the department's next number, with the department's convention fixed on it. */
export async function insertDraft(
  trx: Knex.Transaction,
  record: { departmentId: string; title: string; createdBy: string },
): Promise<string> {
  // The department's row is the lock that keeps two drafts from taking one number.
  const department = await trx("departments").where({ id: record.departmentId }).forUpdate().first();
  const highest = await trx("rounds").where({ department_id: record.departmentId }).max("number as number").first();
  const [row] = await trx("rounds")
    .insert({
      department_id: record.departmentId,
      number: (highest?.number ?? 0) + 1,
      title: record.title,
      convention: department.convention,
      own_degrees_per_mm: department.own_degrees_per_mm,
      created_by: record.createdBy,
    })
    .returning("id");
  return row.id;
}

export type DraftExaminer = { personId: string; assignedAs: ReadingRole };

export async function replaceDraft(
  trx: Knex.Transaction,
  round: Round,
  draft: RoundDraft,
  examiners: DraftExaminer[],
  now: Date,
): Promise<void> {
  await trx("rounds").where({ id: round.id }).update({
    title: draft.title,
    instructions: draft.instructions,
    opens_at: draft.opensAt,
    closes_at: draft.closesAt,
    updated_at: now,
  });
  const owner = { round_id: round.id, department_id: round.departmentId };
  await trx("items").where({ round_id: round.id }).delete();
  await trx("assignments").where({ round_id: round.id }).delete();
  const items = draft.items.map(({ caseId, kind }, index) => ({
    ...owner,
    case_id: caseId,
    kind,
    position: index + 1,
  }));
  if (items.length > 0) await trx("items").insert(items);
  const rows = examiners.map(({ personId, assignedAs }) => ({
    ...owner,
    person_id: personId,
    assigned_as: assignedAs,
  }));
  if (rows.length > 0) await trx("assignments").insert(rows);
}

/** Of the given cases those that the department has and has not retired. */
export async function usableCaseIds(db: Knex, departmentId: string, caseIds: string[]): Promise<Set<string>> {
  const rows = await db("cases")
    .where({ department_id: departmentId })
    .whereNull("retired_at")
    .whereIn("id", caseIds)
    .select("id");
  return new Set(rows.map(({ id }) => id));
}

export type DraftItem = { id: string; caseId: string; kind: ItemKind; storageKey: string };

export async function listDraftItems(trx: Knex.Transaction, roundId: string): Promise<DraftItem[]> {
  const rows = await trx("items")
    .join("cases", "cases.id", "items.case_id")
    .join("photographs", "photographs.id", "cases.photograph_id")
    .where("items.round_id", roundId)
    .orderBy("items.position")
    .select("items.id", "items.case_id", "items.kind", "photographs.storage_key");
  return rows.map((row) => ({ id: row.id, caseId: row.case_id, kind: row.kind, storageKey: row.storage_key }));
}

export type ItemPicture = { itemId: string; key: string; width: number; height: number };

export async function setItemPicture(trx: Knex.Transaction, { itemId, key, width, height }: ItemPicture) {
  await trx("items").where({ id: itemId }).update({ picture_key: key, picture_width: width, picture_height: height });
}

/** Of the given keys those that an item names. */
export async function pictureKeysInUse(db: Knex, keys: readonly string[]): Promise<Set<string>> {
  const rows = await db("items").whereIn("picture_key", keys).select("picture_key");
  return new Set(rows.map(({ picture_key }) => picture_key));
}

export async function listAssignments(db: Knex, roundId: string): Promise<{ id: string; personId: string }[]> {
  const rows = await db("assignments").where({ round_id: roundId }).orderBy("id").select("id", "person_id");
  return rows.map((row) => ({ id: row.id, personId: row.person_id }));
}

/** Stores every examiner's own order, item ids in the order of reading. */
export async function insertOrders(trx: Knex.Transaction, orders: { assignmentId: string; itemIds: string[] }[]) {
  const rows = orders.flatMap(({ assignmentId, itemIds }) =>
    itemIds.map((itemId, index) => ({ assignment_id: assignmentId, item_id: itemId, place: index + 1 })),
  );
  await trx.batchInsert("assignment_items", rows, 1000);
}

/** Moves a round to the next state; the database refuses any other step. */
export async function setRoundState(trx: Knex.Transaction, roundId: string, to: RoundState, now: Date): Promise<void> {
  const stamps = { draft: null, open: "published_at", closed: "closed_at", released: "released_at" } as const;
  const stamp = stamps[to];
  await trx("rounds")
    .where({ id: roundId })
    .update({ state: to, updated_at: now, ...(stamp && { [stamp]: now }) });
}

export async function hasResults(db: Knex, roundId: string): Promise<boolean> {
  return (await db("results").where({ round_id: roundId }).first("id")) !== undefined;
}

/** Null when the department has no such round. */
export async function findProgress(db: Knex, departmentId: string, roundId: string): Promise<RoundProgress | null> {
  const round = await db("rounds").where({ id: roundId, department_id: departmentId }).first("state");
  if (!round) return null;
  const items = await db("items").where({ round_id: roundId }).count<{ count: string }>("* as count").first();
  const rows = await db("assignments")
    .join("people", "people.id", "assignments.person_id")
    .leftJoin("assignment_items", "assignment_items.assignment_id", "assignments.id")
    .leftJoin("readings", "readings.assignment_item_id", "assignment_items.id")
    .where("assignments.round_id", roundId)
    .groupBy("assignments.id", "people.id")
    .orderBy("people.name")
    .select(
      "people.id",
      "people.name",
      "assignments.assigned_as",
      "assignments.opened_at",
      "assignments.submitted_at",
      db.raw("count(readings.id)::int AS read_count"),
      db.raw("max(readings.saved_at) AS last_saved_at"),
    );
  return {
    state: round.state,
    itemCount: Number(items?.count ?? 0),
    hasResults: await hasResults(db, roundId),
    examiners: rows.map((row) => ({
      personId: row.id,
      name: row.name,
      assignedAs: row.assigned_as,
      openedAt: iso(row.opened_at),
      readCount: row.read_count,
      lastSavedAt: iso(row.last_saved_at),
      submittedAt: iso(row.submitted_at),
    })),
  };
}
