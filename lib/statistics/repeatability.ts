import { chiSquareQuantile } from "./chi-square";
import { presentReadings, type Ratings, requireConfidence } from "./input";
import { analyseOneWay } from "./one-way";
import { type Estimate, type Result, refuse } from "./result";

/**
 * Repeatability: how far apart two readings of one case by the same examiner may lie.
 *
 * Shape: one row of replicates for each case, any number in each; null where there is none. `n` counts the cases read
 * twice or more. Units: those of the readings. `withinSd` is the pooled SD within cases, `coefficient` 1.96·√2 times it:
 * 95% of pairs of repeats differ by less. Refuses when no case was read twice; throws InputError on NaN and infinities.
 * Source: Bland & Altman (1999), section 2 (standard error sw/√(2 df)); χ² interval on Σ(m − 1) degrees of freedom.
 */
export function repeatability(
  replicates: Ratings,
  { confidence = 0.95 }: { confidence?: number } = {},
): Result<{ withinSd: Estimate; coefficient: Estimate }> {
  requireConfidence(confidence);
  const repeated = replicates
    .map((row, index) => presentReadings(row, `replicates[${index}]`))
    .filter((row) => row.length > 1);
  const n = repeated.length;
  if (n === 0) return refuse(0, "no case was read twice");
  const { sumOfSquares, df } = analyseOneWay(repeated).within;
  const sdAt = (divisor: number) => Math.sqrt(sumOfSquares / divisor);
  const withinSd = {
    estimate: sdAt(df),
    standardError: sdAt(df) / Math.sqrt(2 * df),
    low: sdAt(chiSquareQuantile(0.5 + confidence / 2, df)),
    high: sdAt(chiSquareQuantile(0.5 - confidence / 2, df)),
  };
  const scale = 1.96 * Math.SQRT2;
  const coefficient = {
    estimate: scale * withinSd.estimate,
    standardError: scale * withinSd.standardError,
    low: scale * withinSd.low,
    high: scale * withinSd.high,
  };
  return { ok: true, n, withinSd, coefficient };
}
