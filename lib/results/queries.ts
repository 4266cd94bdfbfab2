import "server-only";
import type { Knex } from "knex";
import { type FindingColumns, findingColumnsOf, fromFindingColumns } from "@/lib/findings/columns";
import type { Finding } from "@/lib/reflex/finding";
import { conventionLabel } from "@/lib/rounds/convention-label";
import type { ItemKind } from "@/lib/rounds/schema";
import { type ExaminerFigures, ExaminerFiguresSchema, type PanelFigures, PanelFiguresSchema } from "./schema";

export type RoundItem = {
  itemId: string;
  caseId: string;
  code: string;
  kind: ItemKind;
  referenceId: string;
  /** As the case has it; mirrored items show its mirror image. */
  reference: Finding;
};

type ItemRow = FindingColumns & { id: string; case_id: string; code: string; kind: ItemKind; reference_id: string };

function toRoundItem(row: ItemRow): RoundItem {
  return {
    itemId: row.id,
    caseId: row.case_id,
    code: row.code,
    kind: row.kind,
    referenceId: row.reference_id,
    reference: fromFindingColumns(row),
  };
}

/** The items of a round with the reference in force now, for computing. */
export async function listItemsWithReference(db: Knex, roundId: string): Promise<RoundItem[]> {
  const rows = await db("items")
    .join("cases", "cases.id", "items.case_id")
    .joinRaw(`JOIN LATERAL (
      SELECT * FROM case_references WHERE case_references.case_id = cases.id ORDER BY revision DESC LIMIT 1
    ) latest ON TRUE`)
    .where("items.round_id", roundId)
    .orderBy("items.position")
    .select("items.id", "items.case_id", "cases.code", "items.kind", "latest.id as reference_id")
    .select(findingColumnsOf("latest"));
  return rows.map(toRoundItem);
}

/** The items of a round with the reference that a result was computed with. */
export async function listItemsOfResult(db: Knex, resultId: string): Promise<RoundItem[]> {
  const rows = await db("result_references")
    .join("items", "items.id", "result_references.item_id")
    .join("cases", "cases.id", "items.case_id")
    .join("case_references", "case_references.id", "result_references.reference_id")
    .where("result_references.result_id", resultId)
    .orderBy("items.position")
    .select("items.id", "items.case_id", "cases.code", "items.kind", "case_references.id as reference_id")
    .select(findingColumnsOf("case_references"));
  return rows.map(toRoundItem);
}

export type AssignmentReadings = {
  assignmentId: string;
  personId: string;
  name: string;
  assignedAs: "examiner" | "trainee";
  submittedAt: Date | null;
  /** By item. */
  readings: Map<string, Finding>;
};

/** Every assignment of a round with its readings. Only ever called for a round that is closed. */
export async function listReadingsByAssignment(db: Knex, roundId: string): Promise<AssignmentReadings[]> {
  const assignments = await db("assignments")
    .join("people", "people.id", "assignments.person_id")
    .where("assignments.round_id", roundId)
    .orderBy("people.name")
    .select("assignments.id", "people.id as person_id", "people.name", "assigned_as", "submitted_at");
  const rows = await db("readings")
    .join("assignment_items", "assignment_items.id", "readings.assignment_item_id")
    .join("assignments", "assignments.id", "assignment_items.assignment_id")
    .where("assignments.round_id", roundId)
    .select("assignments.id as assignment_id", "assignment_items.item_id")
    .select(findingColumnsOf("readings"));
  const byAssignment = new Map(assignments.map(({ id }) => [id, new Map<string, Finding>()]));
  for (const row of rows) byAssignment.get(row.assignment_id)?.set(row.item_id, fromFindingColumns(row));
  return assignments.map((row) => ({
    assignmentId: row.id,
    personId: row.person_id,
    name: row.name,
    assignedAs: row.assigned_as,
    submittedAt: row.submitted_at,
    readings: byAssignment.get(row.id) ?? new Map(),
  }));
}

export type NewResult = {
  roundId: string;
  revision: number;
  methodVersion: string;
  reason: string;
  panel: PanelFigures;
  computedAt: Date;
  references: { itemId: string; referenceId: string }[];
  examiners: { assignmentId: string; figures: ExaminerFigures }[];
};

export async function insertResult(trx: Knex.Transaction, result: NewResult): Promise<void> {
  const [row] = await trx("results")
    .insert({
      round_id: result.roundId,
      revision: result.revision,
      method_version: result.methodVersion,
      reason: result.reason,
      panel: JSON.stringify(result.panel),
      computed_at: result.computedAt,
    })
    .returning("id");
  const references = result.references.map(({ itemId, referenceId }) => ({
    result_id: row.id,
    item_id: itemId,
    reference_id: referenceId,
  }));
  await trx.batchInsert("result_references", references, 1000);
  const examiners = result.examiners.map(({ assignmentId, figures }) => ({
    result_id: row.id,
    assignment_id: assignmentId,
    figures: JSON.stringify(figures),
  }));
  await trx.batchInsert("examiner_results", examiners, 200);
}

export async function highestRevision(db: Knex, roundId: string): Promise<number> {
  const row = await db("results").where({ round_id: roundId }).max("revision as revision").first();
  return row?.revision ?? 0;
}

/** The reference ids of the newest result of a round by item. */
export async function latestResultReferences(db: Knex, roundId: string): Promise<Map<string, string>> {
  const rows = await db("result_references")
    .where("result_id", db("results").where({ round_id: roundId }).orderBy("revision", "desc").limit(1).select("id"))
    .select("item_id", "reference_id");
  return new Map(rows.map((row) => [row.item_id, row.reference_id]));
}

export type StoredResult = {
  id: string;
  revision: number;
  methodVersion: string;
  reason: string;
  computedAt: Date;
  panel: PanelFigures;
};

export async function findLatestResult(db: Knex, roundId: string): Promise<StoredResult | null> {
  const row = await db("results").where({ round_id: roundId }).orderBy("revision", "desc").first();
  if (!row) return null;
  return {
    id: row.id,
    revision: row.revision,
    methodVersion: row.method_version,
    reason: row.reason,
    computedAt: row.computed_at,
    panel: PanelFiguresSchema.parse(row.panel),
  };
}

/** Figures by assignment. */
export async function listExaminerFigures(db: Knex, resultId: string): Promise<Map<string, ExaminerFigures>> {
  const rows = await db("examiner_results").where({ result_id: resultId }).select("assignment_id", "figures");
  return new Map(rows.map((row) => [row.assignment_id, ExaminerFiguresSchema.parse(row.figures)]));
}

export type ResultRound = {
  id: string;
  number: number;
  title: string;
  state: string;
  /** As it is named on the screen. */
  convention: string;
  releasedAt: Date | null;
  kappaFloor: number;
};

export async function findResultRound(db: Knex, departmentId: string, roundId: string): Promise<ResultRound | null> {
  const row = await db("rounds")
    .join("departments", "departments.id", "rounds.department_id")
    .where({ "rounds.id": roundId, "rounds.department_id": departmentId })
    .first("rounds.*", "departments.kappa_floor");
  if (!row) return null;
  return {
    id: row.id,
    number: row.number,
    title: row.title,
    state: row.state,
    convention: conventionLabel(row),
    releasedAt: row.released_at,
    kappaFloor: Number(row.kappa_floor),
  };
}

/**
 * Rounds whose results rest, or will rest, on the reference of a case. Open ones are among them: one may be closing at
 * this moment, with results that cannot see a reference not committed yet. Always in one order, so that two who queue
 * jobs for the same rounds do not wait for each other.
 */
export async function publishedRoundsWithCase(db: Knex, caseId: string): Promise<string[]> {
  const rows = await db("items")
    .join("rounds", "rounds.id", "items.round_id")
    .where("items.case_id", caseId)
    .whereNot("rounds.state", "draft")
    .distinct("rounds.id")
    .orderBy("rounds.id");
  return rows.map(({ id }) => id);
}
