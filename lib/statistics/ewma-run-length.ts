import { requireLambda } from "./ewma";
import { requirePositive } from "./input";
import { type Chain, extrapolateRunLength, finiteRunLength, requireShift } from "./markov-run-length";
import { normalCdf } from "./normal";
import { normalCells } from "./normal-cells";

/** Steps of more sigma than this are left out within the limits, though not across them; their probability is 2e-19. */
const REACH = 9;

export type EwmaRunLengthOptions = {
  /** Weight of the newest value, above 0 up to 1. */
  lambda: number;
  /** Distance of the limits in standard deviations of the average. */
  width: number;
  /** How far the mean of the values lies from the target, in sigma; 0 unless set. */
  shift?: number;
};

/**
 * The average number of points until an EWMA chart signals: steady limits, both sides, start at the target, independent
 * normal values. Accurate to 1e-4 of itself.
 *
 * Throws InputError for options out of range, and for limits so wide that there is no number for it.
 * Source: Lucas & Saccucci, Technometrics 1990; 32: 1-12.
 */
export function ewmaRunLength({ lambda, width, shift = 0 }: EwmaRunLengthOptions): number {
  requireLambda(lambda);
  requirePositive(width, "width");
  requireShift(shift);
  return finiteRunLength(extrapolateRunLength(ewmaChain(lambda, width, shift)));
}

/** The states of an EWMA chart in sigma, with the target at 0. */
function ewmaChain(lambda: number, width: number, shift: number): Chain {
  const limit = width * Math.sqrt(lambda / (2 - lambda));
  const stateWidth = (count: number) => (2 * limit) / count;
  const rowFrom = (average: number, count: number) => {
    const mean = (1 - lambda) * average + lambda * shift;
    const [start, end] = [(-limit - mean) / lambda, (limit - mean) / lambda];
    const steps = new Float64Array(count + 1);
    steps.set(normalCells(start, stateWidth(count) / lambda, count, REACH), 1);
    return { steps, exit: normalCdf(start) + normalCdf(-end) };
  };
  return {
    countMin: Math.max(12, Math.ceil(((2 * limit) / lambda) * Math.max(1, width / 2.8))),
    width: stateWidth,
    buildRows: (count) => [
      rowFrom(0, count),
      ...Array.from({ length: count }, (_, state) => rowFrom((state + 0.5) * stateWidth(count) - limit, count)),
    ],
  };
}
