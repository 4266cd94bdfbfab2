import { mean, median, medianAbsoluteDeviation, sampleStandardDeviation } from "simple-statistics";
import { presentReadings, type Readings } from "./input";
import { type Result, refuse } from "./result";

const ITERATIONS_MAX = 10_000;

export type RobustLocationScale = {
  /** Robust mean and standard deviation, in the units of the values. */
  location: number;
  scale: number;
  /** Standard uncertainty of the location as an assigned value, 1.25 scale/√n. */
  uncertainty: number;
};

/**
 * Algorithm A: mean and standard deviation that a few wild values hardly move, by drawing whatever lies further than 1.5
 * scale from the mean back to that distance until nothing changes.
 *
 * Missing values (null) take no part. Refuses no values, and values of which more than half are the same: the scale
 * would start at 0 and stay there. Throws InputError for values that are not finite.
 * Source: ISO 13528:2015, annex C.3 and 7.7.3; iterated to a relative change below 1e-12 instead of three digits.
 */
export function robustLocationScale(values: Readings): Result<RobustLocationScale> {
  const present = presentReadings(values, "values");
  const n = present.length;
  if (n === 0) return refuse(0, "no values");
  const center = median(present);
  // From the median, so that digits are not lost where the values lie far from 0 and close together.
  const deviations = present.map((value) => value - center);
  let location = 0;
  let scale = 1.483 * medianAbsoluteDeviation(deviations);
  const rounding = 1e-12 * Math.abs(center);
  if (scale <= rounding) return refuse(n, "more than half of the values are the same");
  for (let iteration = 0; iteration < ITERATIONS_MAX; iteration += 1) {
    const [low, high] = [location - 1.5 * scale, location + 1.5 * scale];
    const drawnIn = deviations.map((value) => Math.min(Math.max(value, low), high));
    const next = { location: mean(drawnIn), scale: 1.134 * sampleStandardDeviation(drawnIn) };
    const change = Math.max(Math.abs(next.location - location), Math.abs(next.scale - scale));
    ({ location, scale } = next);
    if (change < 1e-12 * scale) {
      return { ok: true, n, location: center + location, scale, uncertainty: (1.25 * scale) / Math.sqrt(n) };
    }
  }
  return refuse(n, "the robust mean does not settle");
}
