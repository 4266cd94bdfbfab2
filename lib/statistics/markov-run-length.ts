import { InputError } from "./result";

/** From one state of a chart: the probability of a step to each state, and of leaving the limits. They add up to 1. */
export type ChainRow = { steps: Float64Array; exit: number };

export type Chain = {
  /** How many states are fine enough to begin with. */
  countMin: number;
  /** The width of a state when what lies within the limits is cut into `count` of them. */
  width: (count: number) => number;
  /** One row for each state. The chart starts in the first, to which nothing leads back. */
  buildRows: (count: number) => ChainRow[];
};

const COUNT_MAX = 200;
const DOUBT_MAX = 2e-4;

/**
 * The average run length of a chart, as that of a Markov chain whose states become ever narrower.
 *
 * The error of a chain is a series in the square of the width of its states. So a curve through four chains is carried on
 * to width 0, and through finer ones until its last two orders agree to 2e-4: then the last is several times closer.
 * Run lengths far beyond `relevant` are wanted only to the accuracy at which they still matter beside it. Infinity if the
 * chance of leaving is too small for a number. Throws InputError where it would take more than 500 states.
 * Source: Brook & Evans, Biometrika 1972; 59: 539-549, with Richardson's extrapolation.
 */
export function extrapolateRunLength(chain: Chain, relevant = Number.POSITIVE_INFINITY): number {
  for (let count = chain.countMin; count <= COUNT_MAX; count = Math.ceil(count * 1.5)) {
    const counts = [2, 3, 4, 5].map((halves) => Math.ceil((count * halves) / 2));
    const lengths = counts.map((states) => averageSteps(chain.buildRows(states)));
    if (lengths.includes(Number.POSITIVE_INFINITY)) return Number.POSITIVE_INFINITY;
    const squares = counts.map((states) => chain.width(states) ** 2);
    const length = extrapolateToZero(squares, lengths);
    const doubt = Math.abs(extrapolateToZero(squares.slice(1), lengths.slice(1)) / length - 1);
    if (doubt < DOUBT_MAX * Math.max(1, length / relevant)) return length;
  }
  throw new InputError("This chart would take more than 500 states: choose narrower limits, or a larger lambda.");
}

/** The value at 0 of the polynomial through the points (Neville's scheme). */
function extrapolateToZero(x: readonly number[], y: readonly number[]): number {
  let values = [...y];
  for (let order = 1; order < x.length; order += 1) {
    values = values.slice(1).map((near, index) => {
      const [farX = 0, nearX = 0] = [x[index], x[index + order]];
      return near + ((near - (values[index] ?? near)) * nearX) / (farX - nearX);
    });
  }
  return values[0] ?? Number.NaN;
}

/**
 * The average number of points until the chain leaves its limits from the first state. Overwrites the rows.
 *
 * States are taken away from the last to the second: what one passes on, its exit and its time are shared out among those
 * that lead to it. No step subtracts, so a run of 1e100 points keeps as many digits as one of ten.
 * Source: Grassmann, Taksar & Heyman, Operations Research 1985; 33: 1107-1116.
 */
function averageSteps(rows: ChainRow[]): number {
  const states = rows.map((row) => ({ ...row, time: 1, lowest: lowestReached(row) }));
  for (let gone = states.length - 1; gone > 0; gone -= 1) {
    const last = states[gone];
    if (!last) continue;
    let leaving = last.exit;
    for (let to = last.lowest; to < gone; to += 1) leaving += last.steps[to] ?? 0;
    if (leaving === 0) return Number.POSITIVE_INFINITY;
    for (let from = 0; from < gone; from += 1) {
      const state = states[from];
      const share = (state?.steps[gone] ?? 0) / leaving;
      if (!state || share === 0) continue;
      for (let to = last.lowest; to < gone; to += 1) {
        state.steps[to] = (state.steps[to] ?? 0) + share * (last.steps[to] ?? 0);
      }
      state.exit += share * last.exit;
      state.time += share * last.time;
      state.lowest = Math.min(state.lowest, last.lowest);
    }
  }
  const [start] = states;
  return start ? start.time / start.exit : Number.NaN;
}

function lowestReached({ steps }: ChainRow): number {
  const first = steps.findIndex((step) => step > 0);
  return Math.max(1, first);
}

export function requireShift(shift: number): void {
  if (!Number.isFinite(shift)) throw new InputError(`shift is a finite number of sigma; got ${shift}.`);
}

/** The run length itself. Throws InputError where it is too long for a number. */
export function finiteRunLength(length: number): number {
  if (!Number.isFinite(length)) throw new InputError("So long a run has no number: choose narrower limits.");
  return length;
}

/** How much longer a run is than wished, as a logarithm; 0 once it is far nearer than run lengths are accurate. */
export function logGap(length: number, wished: number): number {
  const gap = Math.log(length / wished);
  return Math.abs(gap) < 1e-7 ? 0 : gap;
}
