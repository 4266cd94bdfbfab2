import "server-only";
import type { Knex } from "knex";
import { findKappaFloor } from "@/lib/departments/queries";
import { groupBy } from "@/lib/group-by";
import type { PanelFigures } from "@/lib/results/schema";
import { biasChart, type Figure, kappaChart, pooledKappa } from "./control-chart";
import { type ExaminerRound, listExaminerRounds, listReleasedRounds, type ReleasedRound } from "./queries";
import type { DriftBoard, DriftRow } from "./schema";

type Limits = PanelFigures["horizontal"];
type Kappa = PanelFigures["kappa"];

/** Every examiner and the panel over the released rounds of a department, on charts with control limits. */
export async function loadDriftBoard(db: Knex, departmentId: string): Promise<DriftBoard> {
  const rounds = await listReleasedRounds(db, departmentId);
  const examinerRounds = await listExaminerRounds(
    db,
    rounds.map(({ resultId }) => resultId),
  );
  const people = groupBy(examinerRounds, ({ personId }) => personId);
  const centre = pooledKappa(examinerRounds.map(({ resultId, figures }) => kappaFigure(resultId, figures.kappa)));
  return {
    rounds: rounds.map(({ id, number, title, closedAt }) => ({ id, number, title, closedAt: closedAt.toISOString() })),
    kappaFloor: await findKappaFloor(db, departmentId),
    panel: panelRow(rounds),
    examiners: [...people.values()].flatMap((own) => examinerRow(own, rounds, centre)),
  };
}

function examinerRow(own: ExaminerRound[], rounds: ReleasedRound[], centre: number | undefined) {
  const latest = own.at(-1);
  if (!latest) return [];
  const figuresOf = (pick: (round: ExaminerRound, roundId: string) => Figure) =>
    rounds.map(({ id, resultId }): Figure => {
      const round = own.find((candidate) => candidate.resultId === resultId);
      return round ? pick(round, id) : { roundId: id, n: 0, reason: "did not take part" };
    });
  const { personId, name, assignedAs } = latest;
  const row: DriftRow = {
    kappa: kappaChart(
      figuresOf(({ figures }, id) => kappaFigure(id, figures.kappa)),
      centre,
    ),
    size: biasChart(figuresOf(({ figures }, id) => biasFigure(id, figures.size))),
    horizontal: biasChart(figuresOf(({ figures }, id) => biasFigure(id, figures.horizontal))),
    vertical: biasChart(figuresOf(({ figures }, id) => biasFigure(id, figures.vertical))),
  };
  return [{ personId, name, assignedAs, ...row }];
}

function panelRow(rounds: ReleasedRound[]): DriftRow {
  const kappas = rounds.map(({ id, panel }) => kappaFigure(id, panel.kappa));
  return {
    kappa: kappaChart(kappas, pooledKappa(kappas)),
    size: biasChart(rounds.map(({ id, panel }) => biasFigure(id, panel.size))),
    horizontal: biasChart(rounds.map(({ id, panel }) => biasFigure(id, panel.horizontal))),
    vertical: biasChart(rounds.map(({ id, panel }) => biasFigure(id, panel.vertical))),
  };
}

function kappaFigure(roundId: string, kappa: Kappa): Figure {
  const { n } = kappa;
  return kappa.ok ? { roundId, n, value: kappa.kappa } : { roundId, n, reason: kappa.reason };
}

function biasFigure(roundId: string, limits: Limits): Figure {
  const { n } = limits;
  if (!limits.ok) return { roundId, n, reason: limits.reason };
  return { roundId, n, value: limits.bias, lower: limits.lower, upper: limits.upper };
}
