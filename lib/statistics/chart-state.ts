import { type Readings, requireFinite, requirePositive } from "./input";
import { InputError } from "./result";

/** Within the limits, beyond two thirds of them, or beyond the limits themselves. */
export type ChartState = "in" | "warning" | "action";

/** Standard deviation of the values: one for all, or one for each point (where a point is missing, null will do). */
export type Sigma = number | Readings;

/** State of a point that lies `distance` from the middle, with a limit `limit` away; strictly beyond counts, on it not. */
export function chartState(distance: number, limit: number): ChartState {
  // A point meant to lie on a limit misses it by rounding alone; without this slack it would signal by chance.
  const reach = distance * (1 - 1e-12);
  if (reach > limit) return "action";
  return reach > (limit * 2) / 3 ? "warning" : "in";
}

/**
 * The values of a chart with the sigma of each; null where the point is missing.
 * Throws InputError on NaN and infinities, a sigma that is not positive, and as many sigmas as there are not points.
 */
export function chartPoints(values: Readings, sigma: Sigma): ({ value: number; sigma: number } | null)[] {
  requireFinite(values, "values");
  if (typeof sigma === "number") requirePositive(sigma, "sigma");
  else if (sigma.length !== values.length) {
    throw new InputError(`sigma is one number or one for each point; got ${sigma.length} for ${values.length} points.`);
  }
  return values.map((value, index) => {
    if (value === null) return null;
    const own = typeof sigma === "number" ? sigma : (sigma[index] ?? Number.NaN);
    requirePositive(own, `sigma[${index}]`);
    return { value, sigma: own };
  });
}

export function requireTarget(target: number): void {
  if (!Number.isFinite(target)) throw new InputError(`target is a finite number; got ${target}.`);
}
