import "server-only";
import type { Knex } from "knex";
import type { z } from "zod";
import { ExaminerFiguresSchema, type PanelFigures, PanelFiguresSchema } from "@/lib/results/schema";

export type ReleasedRound = {
  id: string;
  resultId: string;
  number: number;
  title: string;
  closedAt: Date;
  panel: PanelFigures;
};

/** Released rounds with their newest result, oldest first. */
export async function listReleasedRounds(db: Knex, departmentId: string): Promise<ReleasedRound[]> {
  const rows = await db("rounds")
    .join("results", "results.round_id", "rounds.id")
    .where({ "rounds.department_id": departmentId, "rounds.state": "released" })
    .distinctOn("rounds.closed_at", "rounds.id")
    .orderBy(["rounds.closed_at", "rounds.id", { column: "results.revision", order: "desc" }])
    .select(
      "rounds.id",
      "rounds.number",
      "rounds.title",
      "rounds.closed_at",
      "results.id as result_id",
      "results.panel",
    );
  return rows.map((row) => ({
    id: row.id,
    resultId: row.result_id,
    number: row.number,
    title: row.title,
    closedAt: row.closed_at,
    panel: PanelFiguresSchema.parse(row.panel),
  }));
}

/** What a chart needs of an examiner's figures, taken out in the database: the readings behind them stay there. */
const ChartFiguresSchema = ExaminerFiguresSchema.pick({ kappa: true }).extend({
  horizontal: ExaminerFiguresSchema.shape.horizontal.shape.limits,
  vertical: ExaminerFiguresSchema.shape.vertical.shape.limits,
  size: ExaminerFiguresSchema.shape.size.shape.limits,
});

export type ExaminerRound = {
  resultId: string;
  personId: string;
  name: string;
  assignedAs: "examiner" | "trainee";
  figures: z.infer<typeof ChartFiguresSchema>;
};

export async function listExaminerRounds(db: Knex, resultIds: string[]): Promise<ExaminerRound[]> {
  const rows = await db("examiner_results")
    .join("assignments", "assignments.id", "examiner_results.assignment_id")
    .join("people", "people.id", "assignments.person_id")
    .whereIn("examiner_results.result_id", resultIds)
    .orderBy("people.name")
    .select("examiner_results.result_id", "people.id", "people.name", "assignments.assigned_as")
    .select(
      db.raw(`jsonb_build_object('kappa', figures -> 'kappa', 'horizontal', figures #> '{horizontal,limits}',
        'vertical', figures #> '{vertical,limits}', 'size', figures #> '{size,limits}') AS figures`),
    );
  return rows.map((row) => ({
    resultId: row.result_id,
    personId: row.id,
    name: row.name,
    assignedAs: row.assigned_as,
    figures: ChartFiguresSchema.parse(row.figures),
  }));
}
