import { normalQuantile } from "./normal";

/**
 * How many standard deviations each way hold the given share of a normal distribution.
 *
 * Exactly 1.96 at 0.95, as Bland & Altman print their limits (1999), so that published figures come out to the last digit;
 * the normal quantile at any other share.
 */
export function coverageFactor(coverage: number): number {
  return coverage === 0.95 ? 1.96 : normalQuantile(0.5 + coverage / 2);
}
