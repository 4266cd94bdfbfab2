import { mean } from "simple-statistics";
import { coverageFactor } from "./coverage-factor";
import { exactLimitFactors } from "./exact-limit-factors";
import { pairReadings, type Readings, requireConfidence } from "./input";
import { studentInterval } from "./intervals";
import { fitLine, type Line } from "./linear-regression";
import { percentileSorted } from "./percentile";
import { type Estimate, type Result, refuse } from "./result";
import { sumOfSquares, withoutCancellation } from "./rounding";

export type LimitOptions = { coverage?: number; confidence?: number };

export type Limits = {
  bias: Estimate;
  sd: number;
  lower: Estimate;
  upper: Estimate;
  exact: { lower: { low: number; high: number }; upper: { low: number; high: number } };
  /** Difference on mean of the two; left out when the means do not vary. */
  proportional?: Line;
  percentiles: { lower: number; median: number; upper: number };
};

/**
 * Bland-Altman limits of agreement: how far apart two readings may lie on one case, with intervals.
 *
 * Shape: equal-length arrays; index i is the same case in both; a null drops its pair, and `n` counts the pairs left.
 * Units: those of the inputs; every difference is `first` minus `second`. `coverage` is the share between the limits.
 * Refuses fewer than three pairs; throws InputError when the arrays cannot be paired or hold no finite number.
 * Source: Bland & Altman (1999) Stat Methods Med Res 8: 135-160, limits bias ± 1.96 sd and their standard error
 * sd·√(1/n + 1.96²/(2(n − 1))); exact intervals of Carkeet (2015), each limit by itself.
 */
export function limitsOfAgreement(first: Readings, second: Readings, options: LimitOptions = {}): Result<Limits> {
  const { coverage = 0.95, confidence = 0.95 } = options;
  requireConfidence(coverage, "coverage");
  requireConfidence(confidence);
  const pairs = pairReadings(first, second);
  const n = pairs.length;
  if (n < 3) return refuse(n, "fewer than three pairs");
  const differences = pairs.map(([a, b]) => a - b);
  const bias = mean(differences);
  const squaredDeviations = sumOfSquares(differences.map((difference) => difference - bias));
  const sd = Math.sqrt(withoutCancellation(squaredDeviations, sumOfSquares(pairs.flat())) / (n - 1));
  const factor = coverageFactor(coverage);
  const limitError = sd * Math.sqrt(1 / n + factor ** 2 / (2 * (n - 1)));
  const exact = exactLimitFactors(n, coverage, confidence);
  const sorted = differences.toSorted((a, b) => a - b);
  const outside = 0.5 - coverage / 2;
  return {
    ok: true,
    n,
    bias: studentInterval(bias, sd / Math.sqrt(n), n - 1, confidence),
    sd,
    lower: studentInterval(bias - factor * sd, limitError, n - 1, confidence),
    upper: studentInterval(bias + factor * sd, limitError, n - 1, confidence),
    exact: {
      lower: { low: bias - exact.outer * sd, high: bias - exact.inner * sd },
      upper: { low: bias + exact.inner * sd, high: bias + exact.outer * sd },
    },
    proportional: fitLine(
      pairs.map(([a, b]) => (a + b) / 2),
      differences,
      confidence,
    ),
    percentiles: {
      lower: percentileSorted(sorted, outside),
      median: percentileSorted(sorted, 0.5),
      upper: percentileSorted(sorted, 1 - outside),
    },
  };
}
