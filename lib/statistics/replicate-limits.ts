import { symmetricInterval } from "./intervals";
import type { Estimate } from "./result";

export type ReplicateLimits = { bias: Estimate; sd: number; lower: Estimate; upper: Estimate };

/** How many SDs from the bias to a limit, and how many standard errors from an estimate to the end of its interval. */
export type LimitFactors = { limit: number; interval: number };

/**
 * Limits from the variance of a single difference, with intervals by the delta method of Bland & Altman (1999), 5.1:
 * the variance of a limit is that of the bias plus factor²·V/(4 variance), V the variance of the estimated variance.
 */
export function limitsFromVariance(
  bias: number,
  variance: number,
  { varianceOfBias, varianceOfVariance }: { varianceOfBias: number; varianceOfVariance: number },
  factors: LimitFactors,
): ReplicateLimits {
  const sd = Math.sqrt(variance);
  const varianceOfSd = variance === 0 ? 0 : varianceOfVariance / (4 * variance);
  const limitError = Math.sqrt(varianceOfBias + factors.limit ** 2 * varianceOfSd);
  return {
    bias: symmetricInterval(bias, Math.sqrt(varianceOfBias), factors.interval),
    sd,
    lower: symmetricInterval(bias - factors.limit * sd, limitError, factors.interval),
    upper: symmetricInterval(bias + factors.limit * sd, limitError, factors.interval),
  };
}
