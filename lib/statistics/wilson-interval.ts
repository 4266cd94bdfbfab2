import { requireConfidence, requireWhole } from "./input";
import { normalQuantile } from "./normal";
import { type Estimate, InputError, type Result, refuse } from "./result";

/**
 * Wilson's score interval for a share: `count` out of `n`.
 *
 * Stays within 0 and 1 by itself and is exactly 0 or 1 at the ends. Refuses n = 0; throws InputError on counts that are not
 * whole or more than n.
 * Source: Wilson (1927) J Am Stat Assoc 22: 209-212; method 3 of Newcombe (1998) Stat Med 17: 857-872.
 */
export function wilsonInterval(
  count: number,
  n: number,
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<Estimate> {
  requireConfidence(confidence);
  requireWhole(count, "count", 0);
  requireWhole(n, "n", 0);
  if (count > n) throw new InputError(`A count of ${count} cannot come out of ${n}.`);
  if (n === 0) return refuse(0, "nothing was counted");
  const square = normalQuantile(0.5 + confidence / 2) ** 2;
  return {
    ok: true,
    n,
    estimate: count / n,
    low: lowerEnd(count, n, square),
    high: 1 - lowerEnd(n - count, n, square),
  };
}

/** The smaller root of (p − count/n)² = z²·p(1 − p)/n, as product of the roots over the larger, which does not cancel. */
function lowerEnd(count: number, n: number, square: number): number {
  const sum = 2 * count + square;
  const larger = sum + Math.sqrt(square * (square + (4 * count * (n - count)) / n));
  return (2 * count * count) / (n * larger);
}
