import { chiSquareQuantile } from "./chi-square";
import { completeRows, type Ratings, requireConfidence } from "./input";
import type { LimitOptions } from "./limits-of-agreement";
import { normalQuantile } from "./normal";
import { type Estimate, type Result, refuse } from "./result";
import { analyseTwoWay } from "./two-way";

/** `limit`: how far one observer lies from the mean of all, each way. `offsets`: each observer's mean minus that of all. */
export type MeanLimits = { limit: Estimate; offsets: number[] };

/**
 * Limits of agreement with the mean of many observers: how far one observer may lie from the mean of the panel.
 *
 * Shape: one row for each subject, one column for each observer; only complete rows are used, and `n` counts them.
 * Units: those of the readings. The limit counts the systematic differences between observers as disagreement.
 * Refuses without a complete row or with one observer; has no interval with one row. Throws InputError on bad numbers.
 * Source: Jones, Dobson & O'Brian (2011) Int J Epidemiol 40: 1308-1313; estimate z√((SSB + SSE)/(ab)) and interval of
 * Christensen, Borgbjerg, Børty & Bøgsted (2020) BMC Med Res Methodol 20: 304.
 */
export function limitsWithMean(matrix: Ratings, options: LimitOptions = {}): Result<MeanLimits> {
  const { coverage = 0.95, confidence = 0.95 } = options;
  requireConfidence(coverage, "coverage");
  requireConfidence(confidence);
  const table = completeRows(matrix);
  const n = table.length;
  const observerCount = table[0]?.length ?? 0;
  if (n === 0) return refuse(0, "no row is complete");
  if (observerCount < 2) return refuse(n, "fewer than two observers");
  const { columns, residual, columnOffsets: offsets } = analyseTwoWay(table);
  const factor = normalQuantile(0.5 + coverage / 2);
  const limitAt = (sumOfSquares: number) => factor * Math.sqrt(sumOfSquares / (n * observerCount));
  const estimate = limitAt(columns + residual);
  if (n === 1) return { ok: true, n, limit: { estimate }, offsets };
  const parts = [
    { sumOfSquares: columns, df: observerCount - 1 },
    { sumOfSquares: residual, df: (n - 1) * (observerCount - 1) },
  ];
  const reach = (p: number) =>
    Math.hypot(...parts.map(({ sumOfSquares, df }) => (1 - df / chiSquareQuantile(p, df)) * sumOfSquares));
  const low = limitAt(columns + residual - reach(0.5 + confidence / 2));
  const high = limitAt(columns + residual + reach(0.5 - confidence / 2));
  return { ok: true, n, limit: { estimate, low, high }, offsets };
}
