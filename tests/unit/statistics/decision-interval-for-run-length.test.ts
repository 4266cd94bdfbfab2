import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { decisionIntervalForRunLength } from "@/lib/statistics/decision-interval-for-run-length";
import { normalCdf } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import { runLength } from "@/lib/statistics/run-length";
// Run lengths in control of Lucas & Crosier 1982 and Brook & Evans 1972, recomputed with the R package spc.
import reference from "../../reference/arl-cusum.json";
import { near } from "./near";

describe("decisionIntervalForRunLength", () => {
  it("gives the intervals whose run lengths are published", () => {
    const { "k0.5-h4": h4, "k0.5-h5": h5, "k0.5-h3": h3, "k0.25-h8": h8 } = reference.expected.cases;
    const rows = [
      [0.5, 4, h4],
      [0.5, 5, h5],
      [0.5, 3, h3],
      [0.25, 8, h8],
    ] as const;
    for (const [k, h, { twoSided }] of rows) {
      const wished = twoSided[0] ?? Number.NaN;
      expect(decisionIntervalForRunLength({ k, runLength: wished })).toEqual(near(h, 1e-4));
    }
  });

  it("gives back the run length that was wished", () => {
    const wish = fc.record({
      k: fc.double({ min: 0.1, max: 1.5, noNaN: true }),
      times: fc.double({ min: 1.1, max: 500, noNaN: true }),
    });
    fc.assert(
      fc.property(wish, ({ k, times }) => {
        const wished = times / (2 * normalCdf(-k));
        const h = decisionIntervalForRunLength({ k, runLength: wished });
        expect(runLength.cusum({ k, h })).toEqual(near(wished, 1e-6));
      }),
      { numRuns: 25 },
    );
  });

  it("works without slack", () => {
    const h = decisionIntervalForRunLength({ k: 0, runLength: 100 });
    expect(runLength.cusum({ k: 0, h })).toEqual(near(100, 1e-6));
  });

  it("says which run is the shortest that k allows", () => {
    expect(() => decisionIntervalForRunLength({ k: 1, runLength: 3 })).toThrow("above 3.151");
  });

  it.each([
    ["a negative k", { k: -0.5, runLength: 100 }],
    ["a k that is no number", { k: Number.NaN, runLength: 100 }],
    ["a run shorter than k alone makes it", { k: 1, runLength: 3.15 }],
    ["an endless run length", { k: 0.5, runLength: Number.POSITIVE_INFINITY }],
    ["a run length that is no number", { k: 0.5, runLength: Number.NaN }],
  ])("throws on %s", (_, options) => {
    expect(() => decisionIntervalForRunLength(options)).toThrow(InputError);
  });
});
