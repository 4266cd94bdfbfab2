import "server-only";
import type { Knex } from "knex";
import { findingColumnsOf, fromFindingColumns } from "@/lib/findings/columns";
import type { Finding } from "@/lib/reflex/finding";
import { type ExaminerFigures, ExaminerFiguresSchema } from "./schema";

export type OwnShowing = {
  id: string;
  itemId: string;
  place: number;
  width: number;
  height: number;
  reading: Finding | null;
};

export async function findOwnFigures(db: Knex, resultId: string, personId: string): Promise<ExaminerFigures | null> {
  const row = await db("examiner_results")
    .join("assignments", "assignments.id", "examiner_results.assignment_id")
    .where({ "examiner_results.result_id": resultId, "assignments.person_id": personId })
    .first("examiner_results.figures");
  return row ? ExaminerFiguresSchema.parse(row.figures) : null;
}

export async function listOwnShowings(db: Knex, roundId: string, personId: string): Promise<OwnShowing[]> {
  const rows = await db("assignment_items")
    .join("assignments", "assignments.id", "assignment_items.assignment_id")
    .join("items", "items.id", "assignment_items.item_id")
    .leftJoin("readings", "readings.assignment_item_id", "assignment_items.id")
    .where({ "assignments.round_id": roundId, "assignments.person_id": personId })
    .orderBy("assignment_items.place")
    .select("assignment_items.id", "assignment_items.item_id", "assignment_items.place")
    .select("items.picture_width", "items.picture_height", "readings.id as reading_id")
    .select(findingColumnsOf("readings"));
  return rows.map((row) => ({
    id: row.id,
    itemId: row.item_id,
    place: row.place,
    width: row.picture_width,
    height: row.picture_height,
    reading: row.reading_id === null ? null : fromFindingColumns(row),
  }));
}

/** Cases that the person is to read, or has read, in a round not released yet: their references stay sealed. */
export async function listSealedCaseIds(db: Knex, personId: string): Promise<Set<string>> {
  const rows = await db("items")
    .join("assignments", "assignments.round_id", "items.round_id")
    .join("rounds", "rounds.id", "items.round_id")
    .where("assignments.person_id", personId)
    .whereIn("rounds.state", ["open", "closed"])
    .distinct("items.case_id");
  return new Set(rows.map(({ case_id }) => case_id));
}

/** The person's own kappa in released rounds before this one, oldest first; rounds without one are left out. */
export async function listEarlierKappas(
  db: Knex,
  person: { id: string; departmentId: string },
  beforeNumber: number,
): Promise<{ number: number; kappa: number }[]> {
  const rows = await db("examiner_results")
    .join("results", "results.id", "examiner_results.result_id")
    .join("assignments", "assignments.id", "examiner_results.assignment_id")
    .join("rounds", "rounds.id", "results.round_id")
    .where({
      "assignments.person_id": person.id,
      "rounds.department_id": person.departmentId,
      "rounds.state": "released",
    })
    .where("rounds.number", "<", beforeNumber)
    .distinctOn("rounds.number")
    .orderBy([{ column: "rounds.number" }, { column: "results.revision", order: "desc" }])
    .select("rounds.number", "examiner_results.figures");
  return rows.flatMap(({ number, figures }) => {
    const { kappa } = ExaminerFiguresSchema.parse(figures);
    return kappa.ok ? [{ number, kappa: kappa.kappa.estimate }] : [];
  });
}
