import { describe, expect, it } from "vitest";
import { type ChainRow, extrapolateRunLength } from "@/lib/statistics/markov-run-length";
import { InputError } from "@/lib/statistics/result";

/** A chain of one state that lasts as long as asked for, so that the error of a chain can be made up. */
function lasting(length: (width: number) => number) {
  const width = (count: number) => 1 / count;
  const buildRows = (count: number): ChainRow[] => [{ steps: new Float64Array(1), exit: 1 / length(width(count)) }];
  return { countMin: 10, width, buildRows };
}

/** The same few states whatever the count: rows of steps, then the exit. */
function fixed(...rows: [...steps: number[], exit: number][]) {
  const buildRows = () => rows.map((row) => ({ steps: Float64Array.from(row.slice(0, -1)), exit: row.at(-1) ?? 0 }));
  return { countMin: 10, width: (count: number) => 1 / count, buildRows };
}

describe("extrapolateRunLength", () => {
  it("carries a series in the square of the width on to width 0", () => {
    const series = lasting((width) => 100 + 30 * width ** 2 - 2000 * width ** 4 + 9000 * width ** 6);
    expect(extrapolateRunLength(series)).toBeCloseTo(100, 9);
  });

  it("takes narrower states until the orders agree", () => {
    const slow = lasting((width) => 100 / (1 + 2000 * width ** 4));
    expect(Math.abs(extrapolateRunLength(slow) / 100 - 1)).toBeLessThan(1e-4);
  });

  it("gives the average time in a chain", () => {
    // From the start to 2, from there to 3, from there half the time out and half the time to 1, which leads out: 3.5.
    expect(extrapolateRunLength(fixed([0, 0, 1, 0, 0], [0, 0, 0, 0, 1], [0, 0, 0, 1, 0], [0, 0.5, 0, 0, 0.5]))).toBe(
      3.5,
    );
    // A state that is left once in four points takes four on average.
    expect(extrapolateRunLength(fixed([0, 0.5, 0.5], [0, 0.75, 0.25]))).toBe(3);
  });

  it("is without end where nothing leads out", () => {
    expect(extrapolateRunLength(fixed([0, 1, 0], [0, 1, 0]))).toBe(Number.POSITIVE_INFINITY);
  });

  it("throws where no number of states removes the doubt, unless the length does not matter", () => {
    let sign = 1;
    const noisy = lasting(() => {
      sign = -sign;
      return 1e6 * (1 + sign / 100);
    });
    expect(() => extrapolateRunLength(noisy)).toThrow(InputError);
    expect(extrapolateRunLength(noisy, 1)).toBeGreaterThan(1e5);
  });
});
