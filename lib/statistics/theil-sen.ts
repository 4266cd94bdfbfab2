import { median, quickselect } from "simple-statistics";
import { pairReadings, type Readings, requireConfidence } from "./input";
import { normalQuantile } from "./normal";
import { type Estimate, type Result, refuse } from "./result";

/**
 * Theil-Sen line: the median slope over all pairs of points with different x, which single wild readings do not move.
 *
 * Shape: equal-length arrays; index i is the same case in both; a null drops its point, and `n` counts the points left.
 * Units: slope in y per x, intercept in y (the median of y − slope·x). Refuses when no two points differ in x; throws
 * InputError when the arrays cannot be paired. An end of the interval that few points cannot give is left out.
 * Source: Theil (1950) Indag Math 12: 85-91; Sen (1968) J Am Stat Assoc 63: 1379-1389, interval by the normal
 * approximation to Kendall's S with ties in x, ranks rounded outwards.
 */
export function theilSen(
  x: Readings,
  y: Readings,
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<{ slope: Estimate; intercept: number }> {
  requireConfidence(confidence);
  const points = pairReadings(x, y);
  const n = points.length;
  const slopes = pairwiseSlopes(points);
  if (slopes.length === 0) return refuse(n, "no two points differ in x");
  const half = slopes.length / 2;
  const estimate = (valueAtRank(slopes, Math.ceil(half)) + valueAtRank(slopes, Math.floor(half) + 1)) / 2;
  const intercept = median(points.map(([a, b]) => b - estimate * a));
  const reach = normalQuantile(0.5 + confidence / 2) * Math.sqrt(varianceOfKendall(points.map(([a]) => a)));
  const rank = Math.floor((slopes.length - reach) / 2);
  if (rank < 1) return { ok: true, n, slope: { estimate }, intercept };
  const low = valueAtRank(slopes, rank);
  const high = valueAtRank(slopes, slopes.length - rank + 1);
  return { ok: true, n, slope: { estimate, low, high }, intercept };
}

function pairwiseSlopes(points: readonly [number, number][]): number[] {
  const slopes: number[] = [];
  points.forEach(([x1, y1], index) => {
    for (let other = index + 1; other < points.length; other += 1) {
      const [x2, y2] = points[other] ?? [x1, y1];
      if (x1 !== x2) slopes.push((y2 - y1) / (x2 - x1));
    }
  });
  return slopes;
}

/** The value with the given rank from 1. Reorders `values`: selecting takes linear time where sorting does not. */
function valueAtRank(values: number[], rank: number): number {
  quickselect(values, rank - 1);
  return values[rank - 1] ?? Number.NaN;
}

/** Variance of Kendall's S without association, corrected for ties in x. */
function varianceOfKendall(x: readonly number[]): number {
  const sizes = new Map<number, number>();
  for (const value of x) sizes.set(value, (sizes.get(value) ?? 0) + 1);
  const term = (m: number) => m * (m - 1) * (2 * m + 5);
  return [...sizes.values()].reduce((sum, size) => sum - term(size), term(x.length)) / 18;
}
