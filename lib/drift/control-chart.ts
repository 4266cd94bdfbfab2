import { compareKappas, type Estimate, shewhart } from "@/lib/statistics";
import type { DriftChart, DriftPoint } from "./schema";

/** One round's figure: the value with its standard error, and for a bias its limits of agreement. */
export type Figure =
  | { roundId: string; n: number; value: Estimate; lower?: Estimate; upper?: Estimate }
  | { roundId: string; n: number; reason: string };

/**
 * A Shewhart chart of bias: the target is the reference (0), warning beyond 2 and action beyond 3 standard errors of
 * the round's own bias, so that a round with few readings has wide limits instead of false alarms.
 */
export function biasChart(figures: readonly Figure[]): DriftChart {
  return { centre: 0, points: chartPoints(figures, 0) };
}

/**
 * The same of kappa around a given centre, the pooled kappa of the department. Only a fall is of interest, so there
 * are lower limits only.
 */
export function kappaChart(figures: readonly Figure[], centre: number | undefined): DriftChart {
  if (centre === undefined) return { points: figures.map((figure) => withoutLimits(figure)) };
  const points = chartPoints(figures, centre).map((point): DriftPoint => {
    const { upperWarning: _, upperAction: __, ...lowerOnly } = point;
    const hasRisen = point.value !== undefined && point.value.estimate > centre;
    return hasRisen ? { ...lowerOnly, state: point.state === "none" ? "none" : "in" } : lowerOnly;
  });
  return { centre, points };
}

/** Kappa of the department over all examiners and rounds, each weighted by its precision; undefined without any. */
export function pooledKappa(figures: readonly Figure[]): number | undefined {
  const kappas = figures.flatMap((figure) => {
    const value = "value" in figure ? figure.value : undefined;
    const standardError = value?.standardError;
    return value && standardError ? [{ estimate: value.estimate, standardError }] : [];
  });
  const pooled = compareKappas(kappas);
  return pooled.ok ? pooled.pooled.estimate : undefined;
}

function chartPoints(figures: readonly Figure[], target: number): DriftPoint[] {
  return figures.map((figure) => {
    const standardError = "value" in figure ? figure.value.standardError : undefined;
    if (!("value" in figure) || !standardError) return withoutLimits(figure);
    const chart = shewhart([figure.value.estimate], { target, sigma: standardError });
    const state = chart.ok ? (chart.points[0]?.state ?? "none") : "none";
    return {
      ...withoutLimits(figure),
      state,
      lowerWarning: target - 2 * standardError,
      upperWarning: target + 2 * standardError,
      lowerAction: target - 3 * standardError,
      upperAction: target + 3 * standardError,
    };
  });
}

function withoutLimits(figure: Figure): DriftPoint {
  return { ...figure, state: "none" };
}
