import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { normalQuantile } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import { runLength } from "@/lib/statistics/run-length";
import { widthForRunLength } from "@/lib/statistics/width-for-run-length";
import { near } from "./near";

describe("widthForRunLength", () => {
  it("gives the widths that Lucas & Saccucci 1990 print for a run of 500", () => {
    // Technometrics 1990; 32: 1-12, as tabulated by Montgomery: from memory, three decimals.
    const widths = [0.5, 0.4, 0.25, 0.2, 0.1, 0.05, 0.03].map((lambda) =>
      widthForRunLength({ lambda, runLength: 500 }),
    );
    const printed = [3.071, 3.054, 2.998, 2.962, 2.814, 2.615, 2.437];
    expect(widths).toEqual(printed.map((width) => expect.closeTo(width, 3)));
  });

  it("is the two-sided normal quantile at lambda 1", () => {
    for (const length of [1.01, 2, 370.4, 1e6]) {
      expect(widthForRunLength({ lambda: 1, runLength: length })).toEqual(
        near(-normalQuantile(1 / (2 * length)), 1e-4),
      );
    }
  });

  it("gives back the run length that was wished", () => {
    const wish = fc.record({
      lambda: fc.double({ min: 0.05, max: 1, noNaN: true }),
      runLength: fc.double({ min: 1.5, max: 2000, noNaN: true }),
    });
    fc.assert(
      fc.property(wish, ({ lambda, runLength: wished }) => {
        const width = widthForRunLength({ lambda, runLength: wished });
        expect(runLength.ewma({ lambda, width })).toEqual(near(wished, 1e-6));
      }),
      { numRuns: 12 },
    );
  }, 30_000);

  it.each([
    ["lambda 0", { lambda: 0, runLength: 100 }],
    ["a run length of 1, which needs no limits", { lambda: 0.2, runLength: 1 }],
    ["an endless run length", { lambda: 0.2, runLength: Number.POSITIVE_INFINITY }],
    ["a run length that is no number", { lambda: 0.2, runLength: Number.NaN }],
  ])("throws on %s", (_, options) => {
    expect(() => widthForRunLength(options)).toThrow(InputError);
  });
});
