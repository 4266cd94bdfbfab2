import { coverageFactor } from "./coverage-factor";
import { type Ratings, requireConfidence } from "./input";
import { limitsFromMeans } from "./limits-from-means";
import { limitsFromPairs } from "./limits-from-pairs";
import type { LimitOptions } from "./limits-of-agreement";
import type { ReplicateLimits } from "./replicate-limits";
import { InputError, type Result } from "./result";

/** `constant`: a case does not change between readings. `varying`: the replicates are pairs taken together, in order. */
export type ReplicateOptions = LimitOptions & { trueValue?: "constant" | "varying" };

/**
 * Limits of agreement for single readings when each case was read several times by both.
 *
 * Shape: one array of replicates for each case in each of `first` and `second`, index i the same case in both; null where
 * there is no reading. `n` counts the cases used. Units: those of the inputs; differences are `first` minus `second`.
 * Refuses fewer than two cases read by both. Throws InputError on unequal numbers of cases, on NaN and infinities, and,
 * when the true value varies, on a case whose two arrays cannot be paired.
 * Source: Bland & Altman (1999) Stat Methods Med Res 8: 135-160, sections 5.1 to 5.3; limits and intervals by 1.96.
 */
export function limitsWithReplicates(
  first: Ratings,
  second: Ratings,
  options: ReplicateOptions = {},
): Result<ReplicateLimits> {
  const { trueValue = "constant", coverage = 0.95, confidence = 0.95 } = options;
  requireConfidence(coverage, "coverage");
  requireConfidence(confidence);
  if (first.length !== second.length) {
    throw new InputError(`Both need the same cases; got ${first.length} and ${second.length}.`);
  }
  const factors = { limit: coverageFactor(coverage), interval: coverageFactor(confidence) };
  if (trueValue === "constant") return limitsFromMeans(first, second, factors);
  if (trueValue === "varying") return limitsFromPairs(first, second, factors);
  throw new InputError(`The true value is "constant" or "varying"; got ${trueValue}.`);
}
