import { mean } from "simple-statistics";
import { pairReadings, type Readings, requireConfidence } from "./input";
import { normalQuantile } from "./normal";
import { type Estimate, type Result, refuse } from "./result";
import { sumOfSquares, withoutCancellation } from "./rounding";

/**
 * Lin's concordance correlation: how close pairs of readings lie to the line of identity, 1 on it.
 *
 * Shape: equal-length arrays; index i is the same case in both; a null drops its pair, and `n` counts the pairs left.
 * Refuses fewer than three pairs and readings that are all the same. There is no interval when a column is constant (then
 * rho is 0) or rho is ±1. Throws InputError when the arrays cannot be paired.
 * Source: Lin (1989) Biometrics 45: 255-268, variances with divisor n; standard error as corrected in Lin (2000)
 * Biometrics 56: 324-325, divisor n − 2; interval by Fisher's z.
 */
export function concordance(
  first: Readings,
  second: Readings,
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<{ rho: Estimate }> {
  requireConfidence(confidence);
  const pairs = pairReadings(first, second);
  const n = pairs.length;
  if (n < 3) return refuse(n, "fewer than three pairs");
  const firstMean = mean(pairs.map(([a]) => a));
  const secondMean = mean(pairs.map(([, b]) => b));
  const size = sumOfSquares(pairs.flat());
  const firstVariance = withoutCancellation(sumOfSquares(pairs.map(([a]) => a - firstMean)), size) / n;
  const secondVariance = withoutCancellation(sumOfSquares(pairs.map(([, b]) => b - secondMean)), size) / n;
  const shift = firstMean - secondMean;
  const spread = firstVariance + secondVariance + withoutCancellation(n * shift * shift, size) / n;
  if (spread === 0) return refuse(n, "all readings are the same");
  if (firstVariance === 0 || secondVariance === 0) return { ok: true, n, rho: { estimate: 0 } };

  const covariance = mean(pairs.map(([a, b]) => (a - firstMean) * (b - secondMean)));
  const rho = (2 * covariance) / spread;
  if (1 - Math.abs(rho) < 1e-12) return { ok: true, n, rho: { estimate: Math.sign(rho) } };
  const geometric = Math.sqrt(firstVariance * secondVariance);
  const correlation = covariance / geometric;
  const accuracy = (2 * geometric) / spread; // rho over the correlation, defined where that is 0 too
  const location = shift ** 2 / geometric;
  const variance =
    ((1 - correlation ** 2) * accuracy ** 2 * (1 - rho ** 2) +
      2 * rho ** 2 * (1 - rho) * accuracy * location -
      0.5 * (rho * accuracy * location) ** 2) /
    (n - 2);
  if (variance < 0) return { ok: true, n, rho: { estimate: rho } };
  const standardError = Math.sqrt(variance);
  const reach = (normalQuantile(0.5 + confidence / 2) * standardError) / (1 - rho ** 2);
  const low = Math.tanh(Math.atanh(rho) - reach);
  const high = Math.tanh(Math.atanh(rho) + reach);
  return { ok: true, n, rho: { estimate: rho, standardError, low, high } };
}
