import { type ChartState, chartPoints, chartState, requireTarget, type Sigma } from "./chart-state";
import { type Readings, requirePositive } from "./input";
import { type Result, refuse } from "./result";

export type ShewhartOptions = {
  target: number;
  sigma: Sigma;
  /** Distance of the limits in sigma; 3 unless set. */
  width?: number;
};

export type ShewhartPoint = {
  value: number | null;
  /** The value itself; null where the point is missing. */
  statistic: number | null;
  lower: number;
  upper: number;
  state: ChartState;
};

/**
 * A Shewhart chart of single values, for large sudden shifts.
 *
 * Units: those of the values. `n` counts the points that are there; without any it refuses.
 * The chart has no memory: a missing point (null) has no statistic and is never out of limits. It takes its limits from
 * the point before it (at the start from the first that is there), and changes no other point.
 * Throws InputError for values, target or sigma that are not finite, and a width that is not positive.
 * Source: Shewhart, Economic Control of Quality of Manufactured Product, 1931: limits at three sigma.
 */
export function shewhart(values: Readings, options: ShewhartOptions): Result<{ points: ShewhartPoint[] }> {
  const { target, sigma, width = 3 } = options;
  requirePositive(width, "width");
  requireTarget(target);
  const points = chartPoints(values, sigma);
  const present = points.filter((point) => point !== null);
  const [first] = present;
  if (!first) return refuse(0, "no points");

  let reach = width * first.sigma;
  const chart = points.map((point) => {
    if (point) reach = width * point.sigma;
    const statistic = point?.value ?? null;
    const state = chartState(statistic === null ? 0 : Math.abs(statistic - target), reach);
    return { value: statistic, statistic, lower: target - reach, upper: target + reach, state };
  });
  return { ok: true, n: present.length, points: chart };
}
