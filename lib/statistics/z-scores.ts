import { type ChartState, chartState } from "./chart-state";
import { type Readings, requireFinite, requirePositive } from "./input";
import { InputError, type Result, refuse } from "./result";

export type ZScore = {
  z: number;
  /** Warning beyond 2, action beyond 3. */
  state: ChartState;
};

export type ZScoreOptions = {
  assigned: number;
  /** Standard deviation for the assessment: how far apart good values may lie. */
  sd: number;
  /** Standard uncertainty of the assigned value; 0 unless set, and with it the scores are z′. */
  uncertainty?: number;
};

/**
 * How far each value lies from the assigned one, in standard deviations; z′ = (x − assigned)/√(sd² + u²) allows for an
 * assigned value that is itself uncertain.
 *
 * `scores` are in the order of the values, null where one is missing; `n` counts the others, and without any it refuses.
 * Throws InputError for values or an assigned value that are not finite, an sd not above 0, a negative uncertainty.
 * Source: ISO 13528:2015, 9.4 and 9.5.
 */
export function zScores(values: Readings, options: ZScoreOptions): Result<{ scores: (ZScore | null)[] }> {
  const { assigned, sd, uncertainty = 0 } = options;
  requireFinite(values, "values");
  requireFinite([assigned], "assigned");
  requirePositive(sd, "sd");
  if (!(uncertainty >= 0 && Number.isFinite(uncertainty))) {
    throw new InputError(`uncertainty is finite and not negative; got ${uncertainty}.`);
  }
  const n = values.filter((value) => value !== null).length;
  if (n === 0) return refuse(0, "no values");
  const spread = Math.hypot(sd, uncertainty);
  const scores = values.map((value) => {
    if (value === null) return null;
    const z = (value - assigned) / spread;
    return { z, state: chartState(Math.abs(z), 3) };
  });
  return { ok: true, n, scores };
}
