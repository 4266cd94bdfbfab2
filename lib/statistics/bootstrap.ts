import { sampleStandardDeviation } from "simple-statistics";
import { requireConfidence, requireWhole } from "./input";
import { normalCdf, normalQuantile } from "./normal";
import { percentileSorted } from "./percentile";
import { seededRandom } from "./random";
import { type Estimate, InputError, type Result, refuse } from "./result";

/** A figure of the cases with these numbers, from 0; a number may come twice. Not finite: it cannot be computed. */
export type CaseStatistic = (indices: readonly number[]) => number;

export type BootstrapOptions = {
  resamples: number;
  /** A whole number from 0. The same seed gives the same interval. */
  seed: number;
  method: "percentile" | "bca";
  confidence?: number;
};

/** The estimate is the statistic of all cases; `leftOut` counts the resamples in which it could not be computed. */
export type BootstrapEstimate = Estimate & { leftOut: number };

/**
 * A bootstrap interval: how much a statistic varies when `n` cases are drawn again from the `n` at hand.
 *
 * Refuses no cases, and a statistic that all cases together cannot give. Without an interval at one case, and with bca
 * where all resamples lie on one side of the estimate or leaving out some case undoes the statistic. Throws InputError
 * for an unknown method, fewer than one resample, confidence outside (0, 1).
 * Source: Efron & Tibshirani, An Introduction to the Bootstrap, 1993, chapters 13 and 14; ties count half in z₀.
 */
export function bootstrapInterval(
  n: number,
  statistic: CaseStatistic,
  options: BootstrapOptions,
): Result<BootstrapEstimate> {
  const { resamples, seed, method, confidence = 0.95 } = options;
  requireWhole(n, "n", 0);
  requireWhole(resamples, "resamples", 1);
  requireConfidence(confidence);
  if (method !== "percentile" && method !== "bca") {
    throw new InputError(`method is "percentile" or "bca"; got "${method}".`);
  }
  if (n === 0) return refuse(0, "no cases");
  const allCases = Array.from({ length: n }, (_, index) => index);
  const estimate = statistic(allCases);
  if (!Number.isFinite(estimate)) return refuse(n, "the statistic cannot be computed from these cases");
  if (n === 1) return { ok: true, n, estimate, leftOut: 0 };

  const random = seededRandom(seed);
  const drawn = Array.from({ length: resamples }, () => statistic(allCases.map(() => Math.floor(random() * n))));
  const replicates = drawn.filter(Number.isFinite).sort((a, b) => a - b);
  const leftOut = resamples - replicates.length;
  if (replicates.length < 2) return { ok: true, n, estimate, leftOut };
  const tails: Shares = [(1 - confidence) / 2, (1 + confidence) / 2];
  const shares = method === "bca" ? correctShares(tails, replicates, estimate, jackknife(allCases, statistic)) : tails;
  const ends = shares && {
    low: percentileSorted(replicates, shares[0]),
    high: percentileSorted(replicates, shares[1]),
  };
  return { ok: true, n, estimate, standardError: sampleStandardDeviation(replicates), ...ends, leftOut };
}

/** The shares of the resamples that lie below the lower and the upper end. */
type Shares = [number, number];

/** Moves both shares for median bias (z₀) and for a standard error that changes with the value (acceleration). */
function correctShares(tails: Shares, replicates: number[], estimate: number, leaveOneOut: number[]): Shares | null {
  const rounding = 1e-12 * Math.max(...[estimate, replicates[0] ?? 0, replicates.at(-1) ?? 0].map(Math.abs));
  const below = replicates.filter((value) => value < estimate - rounding).length;
  const above = replicates.filter((value) => value > estimate + rounding).length;
  const bias = normalQuantile(0.5 + (below - above) / (2 * replicates.length)); // ties count half
  const acceleration = accelerationOf(leaveOneOut);
  const shares = tails.map((share) => {
    const moved = bias + normalQuantile(share);
    const stretch = 1 - acceleration * moved;
    return stretch > 0 ? normalCdf(bias + moved / stretch) : Number.NaN;
  });
  const [low = Number.NaN, high = Number.NaN] = shares;
  return Number.isFinite(bias) && low < high ? [low, high] : null;
}

function jackknife(allCases: readonly number[], statistic: CaseStatistic): number[] {
  return allCases.map((left) => statistic(allCases.filter((index) => index !== left)));
}

/** A sixth of the skewness of the statistic as cases are left out in turn; 0 where leaving out changes nothing. */
function accelerationOf(leaveOneOut: readonly number[]): number {
  const mean = leaveOneOut.reduce((sum, value) => sum + value, 0) / leaveOneOut.length;
  const squares = leaveOneOut.reduce((sum, value) => sum + (mean - value) ** 2, 0);
  const cubes = leaveOneOut.reduce((sum, value) => sum + (mean - value) ** 3, 0);
  const isRounding = Math.sqrt(squares) <= 1e-12 * Math.abs(mean);
  return isRounding ? 0 : cubes / (6 * squares ** 1.5);
}
