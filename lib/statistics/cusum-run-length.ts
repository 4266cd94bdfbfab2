import { requireCusum } from "./cusum";
import { type Chain, extrapolateRunLength, finiteRunLength, requireShift } from "./markov-run-length";
import { normalCdf } from "./normal";
import { normalCells } from "./normal-cells";
import { InputError } from "./result";

export type CusumRunLengthOptions = {
  /** Slack and decision interval, in sigma. */
  k: number;
  h: number;
  /** How far the mean of the values lies from the target, in sigma; 0 unless set. */
  shift?: number;
  /** Watch both sides (default), or only the upper one. */
  sided?: "one" | "two";
  /** Where the sums start, in sigma, 0 unless set; with two sides up to k + h/2. */
  headStart?: number;
};

/**
 * The average number of points until a tabular CUSUM chart signals: independent normal values, from the head start.
 * Accurate to 1e-4 of itself.
 *
 * Throws InputError for options out of range, and for a decision interval so wide that there is no number for it.
 * Source: Brook & Evans, Biometrika 1972; 59: 539-549; both sides together Lucas & Crosier, Technometrics 1982; 24:
 * 199-205, which holds as long as one sum must have come back to 0 when the other signals.
 */
export function cusumRunLength(options: CusumRunLengthOptions): number {
  const { k, h, shift = 0, sided = "two", headStart = 0 } = options;
  requireCusum(k, h, headStart);
  requireShift(shift);
  if (sided !== "one" && sided !== "two") throw new InputError(`sided is "one" or "two"; got "${sided}".`);
  if (sided === "two" && headStart > k + h / 2) {
    throw new InputError(`With two sides a head start lies from 0 to k + h/2; got ${headStart}.`);
  }
  return finiteRunLength(
    sided === "one"
      ? extrapolateRunLength(cusumChain(h, shift - k, headStart))
      : twoSided(k, h, Math.abs(shift), headStart),
  );
}

/** For a shift upwards; downwards is the same with the sides changed. */
function twoSided(k: number, h: number, shift: number, headStart: number): number {
  const upper = extrapolateRunLength(cusumChain(h, shift - k, 0));
  const lower = shift === 0 ? upper : extrapolateRunLength(cusumChain(h, -shift - k, 0), upper);
  if (headStart === 0) return 1 / (1 / upper + 1 / lower);
  const upperAhead = extrapolateRunLength(cusumChain(h, shift - k, headStart));
  const lowerAhead = shift === 0 ? upperAhead : extrapolateRunLength(cusumChain(h, -shift - k, headStart), upper);
  return (upperAhead / upper + lowerAhead / lower - 1) / (1 / upper + 1 / lower);
}

/**
 * The sum of one side, in sigma, which each point moves by `drift` on average. Its states lie a width apart, the lowest at
 * 0 with half a width above it: what falls below stays there.
 */
function cusumChain(h: number, drift: number, headStart: number): Chain {
  const stateWidth = (count: number) => h / (count - 0.5);
  // Against the drift a sum climbs in steps of twice its size, however rare they are.
  const reach = Math.max(9, 6 + 2 * Math.abs(drift));
  return {
    countMin: Math.max(12, Math.ceil(1.25 * h)),
    width: stateWidth,
    buildRows: (count) => {
      const width = stateWidth(count);
      const buildRow = (sum: number, upwards: Float64Array) => {
        const steps = new Float64Array(count + 1);
        steps[1] = normalCdf(width / 2 - sum - drift);
        steps.set(upwards, 2);
        return { steps, exit: normalCdf(sum + drift - h) };
      };
      const start = buildRow(headStart, normalCells(width / 2 - headStart - drift, width, count - 1, reach));
      // A step depends on how many states it spans alone, so one series of them serves every row.
      const spans = normalCells((1.5 - count) * width - drift, width, 2 * count - 2, reach);
      const states = Array.from({ length: count }, (_, state) =>
        buildRow(state * width, spans.subarray(count - 1 - state, 2 * count - 2 - state)),
      );
      return [start, ...states];
    },
  };
}
