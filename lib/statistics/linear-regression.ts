import { mean } from "simple-statistics";
import { studentInterval } from "./intervals";
import type { Estimate } from "./result";
import { sumOfSquares, withoutCancellation, withoutRounding } from "./rounding";
import { studentTwoSided } from "./student";

/** `p` tests a slope of 0, two-sided; left out on a line without residuals, where t is not defined. */
export type Line = { slope: Estimate; intercept: Estimate; p?: number };

/**
 * Least squares line of y on x, with t intervals on n − 2 degrees of freedom; undefined when x does not vary.
 *
 * Shape: equal-length arrays of at least two finite numbers. Units: slope in y per x, intercept in y.
 */
export function fitLine(x: readonly number[], y: readonly number[], confidence: number): Line | undefined {
  const n = x.length;
  const xMean = mean(x);
  const yMean = mean(y);
  const xDeviations = x.map((value) => value - xMean);
  const yDeviations = y.map((value) => value - yMean);
  const size = sumOfSquares(x) + sumOfSquares(y);
  const sxx = withoutCancellation(sumOfSquares(xDeviations), size);
  const syy = withoutCancellation(sumOfSquares(yDeviations), size);
  if (sxx === 0) return undefined;
  const sxy = xDeviations.reduce((sum, deviation, i) => sum + deviation * (yDeviations[i] ?? 0), 0);
  const slope = syy === 0 ? 0 : sxy / sxx;
  const residuals = yDeviations.map((deviation, i) => deviation - slope * (xDeviations[i] ?? 0));
  const residualSumOfSquares = syy === 0 ? 0 : withoutRounding(sumOfSquares(residuals), syy);
  const df = n - 2;
  const residualSd = Math.sqrt(residualSumOfSquares / df); // NaN at two points: then there is no interval
  const slopeError = residualSd / Math.sqrt(sxx);
  return {
    slope: studentInterval(slope, slopeError, df, confidence),
    intercept: studentInterval(yMean - slope * xMean, residualSd * Math.sqrt(1 / n + xMean ** 2 / sxx), df, confidence),
    ...(slopeError > 0 && { p: studentTwoSided(slope / slopeError, df) }),
  };
}
