import { type ChartState, chartPoints, chartState, requireTarget, type Sigma } from "./chart-state";
import { type Readings, requirePositive } from "./input";
import { InputError, type Result, refuse } from "./result";

export type CusumOptions = {
  /** Slack: half the shift to be seen, in sigma. */
  k: number;
  /** Decision interval: how large a sum may grow, in sigma. */
  h: number;
  target: number;
  sigma: Sigma;
  /** Where both sums start, in sigma, from 0 (default) up to h; h/2 makes for a fast first response. */
  headStart?: number;
};

export type CusumPoint = {
  value: number | null;
  /** Sums of what lies above target + k and below target − k, in sigma; neither is ever negative. */
  upper: number;
  lower: number;
  /** The limit of both sums, h. */
  limit: number;
  state: ChartState;
};

/**
 * A two-sided tabular CUSUM chart, for a shift of known size. The sums are not reset after a signal.
 *
 * Units: sums in sigma. `n` counts the points that are there; without any it refuses.
 * A missing point (null) says nothing new: it repeats the sums and state of the point before it (at the start those of
 * the head start), and the next point adds to them as if it had followed directly.
 * Throws InputError for values, target or sigma that are not finite, and options out of range.
 * Source: Page, Biometrika 1954; 41: 100-115; head start Lucas & Crosier, Technometrics 1982; 24: 199-205.
 */
export function cusum(values: Readings, options: CusumOptions): Result<{ points: CusumPoint[] }> {
  const { k, h, target, sigma, headStart = 0 } = options;
  requireCusum(k, h, headStart);
  requireTarget(target);
  const points = chartPoints(values, sigma);
  const n = points.filter((point) => point !== null).length;
  if (n === 0) return refuse(0, "no points");

  let [upper, lower] = [headStart, headStart];
  const chart = points.map((point) => {
    if (point) {
      const z = (point.value - target) / point.sigma;
      upper = Math.max(0, upper + z - k);
      lower = Math.max(0, lower - z - k);
    }
    return { value: point?.value ?? null, upper, lower, limit: h, state: chartState(Math.max(upper, lower), h) };
  });
  return { ok: true, n, points: chart };
}

export function requireCusum(k: number, h: number, headStart: number): void {
  if (!(k >= 0 && Number.isFinite(k))) throw new InputError(`k is finite and not negative; got ${k}.`);
  requirePositive(h, "h");
  if (!(headStart >= 0 && headStart <= h)) throw new InputError(`headStart lies from 0 to h; got ${headStart}.`);
}
