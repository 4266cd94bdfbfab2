import { disagreementsFor } from "./agreement-weights";
import { requireConfidence, requirePositive, requireWhole } from "./input";
import { kappaMoments, kappaVariances } from "./kappa-moments";
import { normalQuantile } from "./normal";
import { InputError, type Result, refuse } from "./result";

export type ExpectedKappa = {
  kappa: number;
  /** The share of cases in the first of two categories: as the first rater reads, and as the second does. */
  marginals: readonly [number, number];
  confidence?: number;
};

/**
 * How precise kappa of two raters and two categories will be with `n` cases: its standard error, and the half-width of
 * its interval at the confidence asked for.
 *
 * Throws InputError where no table has these margins and that kappa, for n that is not a whole number from 1, and for
 * confidence outside (0, 1).
 * Source: variance of Fleiss, Cohen & Everitt 1969; for planning Flack, Afifi, Lachenbruch & Schouten, Psychometrika
 * 1988; 53: 321-325, and Cantor, Psychological Methods 1996; 1: 150-153.
 */
export function planKappa({
  n,
  confidence = 0.95,
  ...expected
}: ExpectedKappa & { n: number }): Result<{ standardError: number; halfWidth: number }> {
  requireWhole(n, "n", 1);
  requireConfidence(confidence);
  const standardError = Math.sqrt(kappaVariance(expected) / n);
  return { ok: true, n, standardError, halfWidth: normalQuantile(0.5 + confidence / 2) * standardError };
}

/**
 * The fewest cases with which the half-width of the interval is not above `halfWidth`.
 *
 * Refuses where the variance is 0 (kappa 1, or a rater who uses one category): the formula then sets no number of cases.
 * Throws InputError as `planKappa` does, and for a half-width that is not positive.
 */
export function casesForKappa({
  halfWidth,
  confidence = 0.95,
  ...expected
}: ExpectedKappa & { halfWidth: number }): Result<object> {
  requirePositive(halfWidth, "halfWidth");
  requireConfidence(confidence);
  const variance = kappaVariance(expected);
  if (variance === 0) return refuse(0, "this kappa has no large-sample variance, so no number of cases follows");
  return { ok: true, n: Math.ceil((normalQuantile(0.5 + confidence / 2) / halfWidth) ** 2 * variance) };
}

/** n times the variance of kappa in the table that margins and kappa fix between them. */
function kappaVariance({ kappa, marginals: [first, second] }: ExpectedKappa): number {
  const expected = first * second + (1 - first) * (1 - second);
  const observed = expected + kappa * (1 - expected);
  const both = (observed + first + second - 1) / 2;
  const table = [both, first - both, second - both, 1 - first - second + both].map(clearRounding);
  const cells = { size: 2, cells: Float64Array.from(table) };
  const disagreements = disagreementsFor("none", 2);
  const moments = kappaMoments(cells, disagreements);
  if (table.every((share) => share >= 0) && moments.expected > 0) {
    return kappaVariances(cells, disagreements, moments).variance;
  }
  throw new InputError(`No table of two raters has the margins ${first} and ${second} and kappa ${kappa}.`);
}

/** A share that should be 0 may come out a hair above or below. */
function clearRounding(share: number): number {
  return Math.abs(share) < 1e-12 ? 0 : share;
}
