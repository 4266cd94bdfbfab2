import { type ChartState, chartPoints, chartState, requireTarget, type Sigma } from "./chart-state";
import { type Readings, requirePositive } from "./input";
import { InputError, type Result, refuse } from "./result";

export type EwmaOptions = {
  /** Weight of the newest value, above 0 up to 1. */
  lambda: number;
  /** Distance of the limits in standard deviations of the average. */
  width: number;
  target: number;
  sigma: Sigma;
  /** Limits that widen with the points behind them (default), or those they come to at last. */
  limits?: "widening" | "steady";
};

export type EwmaPoint = {
  value: number | null;
  /** The average after this point. */
  statistic: number;
  lower: number;
  upper: number;
  state: ChartState;
};

/**
 * An exponentially weighted moving average chart, for small lasting shifts. It starts at the target.
 *
 * Units: those of the values. `n` counts the points that are there; without any it refuses.
 * A missing point (null) says nothing new: it repeats average, limits and state of the point before it (at the start the
 * target, in control), and the next point goes on from there as if it had followed directly.
 * Throws InputError for values, target or sigma that are not finite, and options out of range.
 * Source: Lucas & Saccucci, Technometrics 1990; 32: 1-12; limits for unequal sigma by the variance of the weighted sum.
 */
export function ewma(values: Readings, options: EwmaOptions): Result<{ points: EwmaPoint[] }> {
  const { lambda, width, target, sigma, limits = "widening" } = options;
  requireLambda(lambda);
  requirePositive(width, "width");
  requireTarget(target);
  if (limits !== "widening" && limits !== "steady") {
    throw new InputError(`limits are "widening" or "steady"; got "${limits}".`);
  }
  const points = chartPoints(values, sigma);
  const present = points.filter((point) => point !== null);
  const [first] = present;
  if (!first) return refuse(0, "no points");

  const steadyVariance = (pointSigma: number) => (lambda / (2 - lambda)) * pointSigma ** 2;
  let statistic = target;
  let variance = limits === "steady" ? steadyVariance(first.sigma) : 0;
  const chart = points.map((point) => {
    if (point) {
      statistic = lambda * point.value + (1 - lambda) * statistic;
      variance =
        limits === "steady"
          ? steadyVariance(point.sigma)
          : lambda ** 2 * point.sigma ** 2 + (1 - lambda) ** 2 * variance;
    }
    const reach = width * Math.sqrt(variance);
    return {
      value: point?.value ?? null,
      statistic,
      lower: target - reach,
      upper: target + reach,
      state: chartState(Math.abs(statistic - target), reach),
    };
  });
  return { ok: true, n: present.length, points: chart };
}

export function requireLambda(lambda: number): void {
  if (!(lambda > 0 && lambda <= 1)) throw new InputError(`lambda lies above 0 and up to 1; got ${lambda}.`);
}
