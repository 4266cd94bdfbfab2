import { requireCusum } from "./cusum";
import { cusumRunLength } from "./cusum-run-length";
import { findRoot } from "./find-root";
import { logGap } from "./markov-run-length";
import { normalCdf } from "./normal";
import { InputError } from "./result";

/**
 * The decision interval h of a CUSUM chart, in sigma, at which it signals by chance once in `runLength` points on average
 * (in control, both sides, no head start). Accurate to 1e-4 of itself.
 *
 * Throws InputError for a k that is negative, and for a run length that no h can give: even without an interval the chart
 * signals only when a value lies beyond k, once in 1/(2Φ(−k)) points.
 * Source: inverse of `cusumRunLength`.
 */
export function decisionIntervalForRunLength({ k, runLength }: { k: number; runLength: number }): number {
  requireCusum(k, 1, 0);
  const least = 1 / (2 * normalCdf(-k));
  if (!(runLength > least && Number.isFinite(runLength))) {
    throw new InputError(`With k ${k}, runLength is finite and above ${least.toPrecision(4)}; got ${runLength}.`);
  }
  const near = findRoot((log) => Math.log(siegmundRunLength(k, Math.exp(log)) / runLength), 1, 0.5);
  const gap = (log: number) => logGap(cusumRunLength({ k, h: Math.exp(log) }), runLength);
  return Math.exp(findRoot(gap, near, 0.01));
}

/**
 * A run length within some 2%, to start the search near its end: half of what one side takes.
 * Source: Siegmund, Sequential Analysis, 1985.
 */
function siegmundRunLength(k: number, h: number): number {
  const limit = h + 1.166;
  const exponent = 2 * k * limit;
  // Without slack, or nearly so, the formula tends to the square of the limit.
  if (exponent < 1e-3) return limit ** 2 / 2;
  return (Math.expm1(exponent) - exponent) / (4 * k ** 2);
}
