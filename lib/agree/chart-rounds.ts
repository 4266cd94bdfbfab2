import type { Finding } from "@/lib/reflex/finding";
import { examinerFigures, type ShownItem } from "@/lib/results/examiner-figures";
import type { ExaminerFigures } from "@/lib/results/schema";
import { compareKappas } from "@/lib/statistics/compare-kappas";
import { cusum } from "@/lib/statistics/cusum";
import { decisionIntervalForRunLength } from "@/lib/statistics/decision-interval-for-run-length";
import { ewma } from "@/lib/statistics/ewma";
import type { Result } from "@/lib/statistics/result";
import { runLength } from "@/lib/statistics/run-length";
import { shewhart } from "@/lib/statistics/shewhart";
import { widthForRunLength } from "@/lib/statistics/width-for-run-length";
import type { Panel } from "./long-table";
import type { Section, Statistic } from "./report";

/** Common practice, no source: the newest round weighs a fifth, and a false alarm comes once in 500 rounds on average. */
const LAMBDA = 0.2;
const K = 0.5;
const RUN_LENGTH = 500;

type Component = "horizontal" | "vertical";

/**
 * One examiner from round to round: kappa, and charts of bias against the reference. Each round's bias is a point whose
 * sigma is its own standard error; a round without one is a missing point. Nothing below two rounds.
 */
export function chartRounds(
  examiner: string,
  { rounds, rows }: Panel<Finding>,
  items: readonly ShownItem[],
): Section[] {
  if (rounds.length < 2 || items.length === 0) return [];
  const figures = rounds.map((round) =>
    examinerFigures(items.filter(({ itemId }) => rows[Number(itemId)]?.round === round)),
  );
  const comparison = compareKappas(figures.map(({ kappa }) => kappa));
  const perRound = figures.map(({ kappa }, index) => ({
    round: rounds[index] ?? "",
    ...(kappa.ok ? { kappa: kappa.kappa, n: kappa.n } : kappa),
  }));
  const statistics: Statistic[] = [
    { statistic: "compareKappas", of: "direction", result: { ...comparison, perRound }, nOf: "round" },
    ...(["horizontal", "vertical"] as const).flatMap((component) => chartBias(figures, component, rounds)),
  ];
  return [{ title: `${examiner} over the rounds`, statistics }];
}

function chartBias(figures: readonly ExaminerFigures[], component: Component, rounds: readonly string[]): Statistic[] {
  const biases = figures.map((figure) => {
    const { limits } = figure[component];
    return limits.ok && limits.bias.standardError ? limits.bias : null;
  });
  const values = biases.map((bias) => bias?.estimate ?? null);
  const sigma = biases.map((bias) => bias?.standardError ?? null);
  const base = { target: 0, sigma };
  const width = widthForRunLength({ lambda: LAMBDA, runLength: RUN_LENGTH });
  const h = decisionIntervalForRunLength({ k: K, runLength: RUN_LENGTH });
  const afterShift = {
    ewma: runLength.ewma({ lambda: LAMBDA, width, shift: 1 }),
    cusum: runLength.cusum({ k: K, h, shift: 1 }),
  };
  const of = `${component} degrees`;
  const named = <Point extends object>(result: Result<{ points: Point[] }>) =>
    result.ok
      ? { ...result, points: result.points.map((point, index) => ({ round: rounds[index] ?? "", ...point })) }
      : result;
  return [
    { statistic: "shewhart", of, result: named(shewhart(values, base)), nOf: "round" },
    {
      statistic: "ewma",
      of,
      variant: `lambda ${LAMBDA}`,
      result: {
        ...named(ewma(values, { ...base, lambda: LAMBDA, width })),
        width,
        roundsToSeeOneSigma: afterShift.ewma,
      },
      nOf: "round",
    },
    {
      statistic: "cusum",
      of,
      variant: `k ${K}`,
      result: { ...named(cusum(values, { ...base, k: K, h })), h, roundsToSeeOneSigma: afterShift.cusum },
      nOf: "round",
    },
  ];
}
