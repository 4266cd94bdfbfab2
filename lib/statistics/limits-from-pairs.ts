import { pairReadings, type Ratings } from "./input";
import { analyseOneWay } from "./one-way";
import { type LimitFactors, limitsFromVariance, type ReplicateLimits } from "./replicate-limits";
import { type Result, refuse } from "./result";

/**
 * Limits for single readings from pairs taken together while the true value varies: the variance of a difference is the
 * sum of its parts between and within cases.
 *
 * A case that one of the two never read is left out; a case with unequal numbers of readings cannot be paired and throws.
 * Source: Bland & Altman (1999), section 5.3, which gives no standard errors. Ours apply the delta method of section 5.1
 * to the two mean squares; with equal numbers of pairs both variances are exact.
 */
export function limitsFromPairs(first: Ratings, second: Ratings, factors: LimitFactors): Result<ReplicateLimits> {
  const cases = first
    .map((row, i) => {
      const other = second[i] ?? [];
      return row.length === 0 || other.length === 0 ? [] : pairReadings(row, other);
    })
    .map((pairs) => pairs.map(([a, b]) => a - b))
    .filter((differences) => differences.length > 0);
  const n = cases.length;
  if (n < 2) return refuse(n, "fewer than two cases read by both");
  const { mean, between, within } = analyseOneWay(cases);
  const count = between.df + within.df + 1;
  const sumOfSquaredSizes = cases.reduce((sum, { length }) => sum + length ** 2, 0);
  // Pairs to a case, averaged so that the mean square between cases expects within + size·between.
  const size = (count - sumOfSquaredSizes / count) / (n - 1);
  const meanSquareBetween = between.sumOfSquares / between.df;
  const meanSquareWithin = within.df === 0 ? 0 : within.sumOfSquares / within.df;
  const varianceBetween = (meanSquareBetween - meanSquareWithin) / size;
  const varianceOfVariance =
    2 * ((meanSquareBetween / size) ** 2 / between.df) +
    (within.df === 0 ? 0 : 2 * ((meanSquareWithin * (1 - 1 / size)) ** 2 / within.df));
  const varianceOfBias = (varianceBetween * sumOfSquaredSizes) / count ** 2 + meanSquareWithin / count;
  const variance = varianceBetween + meanSquareWithin;
  return { ok: true, n, ...limitsFromVariance(mean, variance, { varianceOfBias, varianceOfVariance }, factors) };
}
