import { mean } from "simple-statistics";
import { presentReadings, type Ratings } from "./input";
import { analyseOneWay } from "./one-way";
import { type LimitFactors, limitsFromVariance, type ReplicateLimits } from "./replicate-limits";
import { type Result, refuse } from "./result";
import { sumOfSquares, withoutCancellation } from "./rounding";

/**
 * Limits for single readings from the differences of case means, which are too narrow by what averaging took away:
 * c·s² is added for each method, s² its variance within cases and c = 1 − mean 1/m.
 * Source: Bland & Altman (1999), sections 5.1 (equal numbers of replicates) and 5.2 (unequal).
 */
export function limitsFromMeans(first: Ratings, second: Ratings, factors: LimitFactors): Result<ReplicateLimits> {
  const cases = first
    .map((row, i) => [presentReadings(row, `first[${i}]`), presentReadings(second[i] ?? [], `second[${i}]`)] as const)
    .filter(([a, b]) => a.length > 0 && b.length > 0);
  const n = cases.length;
  if (n < 2) return refuse(n, "fewer than two cases read by both");
  const differences = cases.map(([a, b]) => mean(a) - mean(b));
  const bias = mean(differences);
  const squared = sumOfSquares(differences.map((difference) => difference - bias));
  const ofMeans = withoutCancellation(squared, sumOfSquares(cases.flat(2))) / (n - 1);
  const corrections = [cases.map(([a]) => a), cases.map(([, b]) => b)].map(averagedAway);
  const variance = corrections.reduce((sum, correction) => sum + correction.variance, ofMeans);
  const varianceOfVariance = corrections.reduce(
    (sum, correction) => sum + correction.varianceOfVariance,
    (2 * ofMeans ** 2) / (n - 1),
  );
  const limits = limitsFromVariance(bias, variance, { varianceOfBias: ofMeans / n, varianceOfVariance }, factors);
  return { ok: true, n, ...limits };
}

/** The variance that taking means removed from one method; nothing when every case has one reading. */
function averagedAway(replicates: number[][]): { variance: number; varianceOfVariance: number } {
  const share = 1 - mean(replicates.map((row) => 1 / row.length));
  const { sumOfSquares: within, df } = analyseOneWay(replicates).within;
  if (df === 0) return { variance: 0, varianceOfVariance: 0 };
  const variance = share * (within / df);
  return { variance, varianceOfVariance: (2 * variance ** 2) / df };
}
