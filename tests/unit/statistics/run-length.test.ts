import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cusum } from "@/lib/statistics/cusum";
import { normalCdf, normalQuantile } from "@/lib/statistics/normal";
import { seededRandom } from "@/lib/statistics/random";
import { InputError } from "@/lib/statistics/result";
import { runLength } from "@/lib/statistics/run-length";
// Lucas & Crosier, Technometrics 1982; 24: 199-205, table 1, and Brook & Evans, Biometrika 1972; 59: 539-549; recomputed
// with the R package spc.
import cusumReference from "../../reference/arl-cusum.json";
// Lucas & Saccucci, Technometrics 1990; 32: 1-12, table 3, and the SAS/QC manual; recomputed with the R package spc.
import ewmaReference from "../../reference/arl-ewma.json";
import { near } from "./near";

const TOLERANCE = ewmaReference.tolerance.default.relative;

const ewmaRows = ewmaReference.data.cases.flatMap(({ id, lambda, L: width, mu }) => {
  const expected = Object.entries(ewmaReference.expected.cases).find(([key]) => key === id)?.[1].arl ?? [];
  const lengths = [expected].flat();
  return [mu].flat().map((shift, index) => ({ lambda, width, shift, expected: lengths[index] ?? Number.NaN }));
});

const cusumRows = cusumReference.data.cases.flatMap(({ id, k, h, mu }) => {
  const expected = Object.entries(cusumReference.expected.cases).find(([key]) => key === id)?.[1];
  return mu.flatMap((shift, index) => [
    { k, h, shift, sided: "one" as const, expected: expected?.oneSided[index] ?? Number.NaN },
    { k, h, shift, sided: "two" as const, expected: expected?.twoSided[index] ?? Number.NaN },
  ]);
});

describe("runLength.ewma", () => {
  it.each(ewmaRows)("gives $expected at lambda $lambda, width $width, shift $shift", ({ expected, ...scheme }) => {
    expect(runLength.ewma(scheme)).toEqual(near(expected, TOLERANCE));
  });

  it("rounds to what Lucas & Saccucci 1990 print", () => {
    const { mu = [] } = { mu: [ewmaReference.data.cases[0]?.mu ?? []].flat() };
    const lengths = mu.map((shift) => runLength.ewma({ lambda: 0.5, width: 3.071, shift }));
    expect(lengths.map((length) => Number(length.toPrecision(3)))).toEqual(ewmaReference.published["LS90-0.5"]);
    expect(runLength.ewma({ lambda: 0.25, width: 3, shift: 1 })).toEqual(near(ewmaReference.published.SAS, TOLERANCE));
  });

  it("is that of independent single values at lambda 1, however long", () => {
    // A value signals with probability Φ(shift − width) + Φ(−shift − width).
    for (const [width, shift] of [
      [3, 0],
      [3, 1.5],
      [10, 0],
    ] as const) {
      const expected = 1 / (normalCdf(shift - width) + normalCdf(-shift - width));
      expect(runLength.ewma({ lambda: 1, width, shift }) / expected).toBeCloseTo(1, 9);
    }
  });

  it("does not depend on the side of the shift, and shortens as the shift grows", () => {
    const scheme = fc.record({
      lambda: fc.double({ min: 0.05, max: 1, noNaN: true }),
      width: fc.double({ min: 0.5, max: 3.2, noNaN: true }),
      shift: fc.double({ min: 0.1, max: 3, noNaN: true }),
    });
    fc.assert(
      fc.property(scheme, ({ shift, ...options }) => {
        const shifted = runLength.ewma({ ...options, shift });
        expect(runLength.ewma({ ...options, shift: -shift })).toEqual(near(shifted, 1e-9));
        expect(runLength.ewma(options)).toBeGreaterThan(shifted);
      }),
      { numRuns: 30 },
    );
  });

  it.each([
    ["lambda 0", { lambda: 0, width: 3 }],
    ["lambda above 1", { lambda: 1.5, width: 3 }],
    ["a width of 0", { lambda: 0.2, width: 0 }],
    ["a width that is no number", { lambda: 0.2, width: Number.NaN }],
    ["a shift that is no number", { lambda: 0.2, width: 3, shift: Number.NaN }],
    ["limits too wide for a number", { lambda: 1, width: 40 }],
    ["limits that would take too many states", { lambda: 0.00001, width: 3 }],
  ])("throws on %s", (_, options) => {
    expect(() => runLength.ewma(options)).toThrow(InputError);
  });
});

describe("runLength.cusum", () => {
  it.each(cusumRows)("gives $expected at k $k, h $h, shift $shift, sides: $sided", ({ expected, ...scheme }) => {
    expect(runLength.cusum(scheme)).toEqual(near(expected, TOLERANCE));
  });

  it("rounds to what Lucas & Crosier 1982 print, from 0 and from a head start of h/2", () => {
    const shifts = cusumReference.data.cases[0]?.mu ?? [];
    const lengths = (headStart: number) =>
      shifts.map((shift) => Number(runLength.cusum({ k: 0.5, h: 4, shift, headStart }).toPrecision(3)));
    expect(lengths(0)).toEqual(cusumReference.published["k0.5-h4"].twoSided);
    // Same table, column of the head start: from memory, confirmed by this chain and the simulation below.
    expect(lengths(2)).toEqual([149, 62.7, 20.1, 8.97, 5.29, 2.86, 2.01, 1.59, 1.33, 1.07, 1.01]);
  });

  it("agrees with simulated charts, head start and all", () => {
    const random = seededRandom(1954);
    const signalAfter = (headStart: number) => {
      let [points, sums] = [0, { upper: headStart, lower: headStart }];
      while (points < 2000) {
        const value = 1 + normalQuantile((Math.floor(random() * 2 ** 32) + 0.5) / 2 ** 32);
        points += 1;
        sums = { upper: Math.max(0, sums.upper + value - 0.5), lower: Math.max(0, sums.lower - value - 0.5) };
        if (Math.max(sums.upper, sums.lower) > 4) return points;
      }
      return points;
    };
    for (const headStart of [0, 2]) {
      const runs = Array.from({ length: 10_000 }, () => signalAfter(headStart));
      const average = runs.reduce((sum, points) => sum + points, 0) / runs.length;
      // Their standard error is about 0.05 from 0 and 0.04 from 2.
      expect(Math.abs(average - runLength.cusum({ k: 0.5, h: 4, shift: 1, headStart }))).toBeLessThan(0.2);
    }
  });

  it("is 1 where the first point is sure to signal, as the chart shows", () => {
    expect(runLength.cusum({ k: 0.5, h: 4, shift: 60 })).toBeCloseTo(1, 12);
    expect(runLength.cusum({ k: 0.5, h: 4, shift: -60 })).toBeCloseTo(1, 12);
    expect(cusum([-60], { k: 0.5, h: 4, target: 0, sigma: 1 })).toMatchObject({ points: [{ state: "action" }] });
  });

  it("tends to that of single values beyond k as the interval closes", () => {
    for (const k of [0, 0.5, 2]) {
      expect(runLength.cusum({ k, h: 1e-9 })).toEqual(near(1 / (2 * normalCdf(-k)), 1e-7));
      expect(runLength.cusum({ k, h: 1e-9, sided: "one", shift: 1 })).toEqual(near(1 / normalCdf(1 - k), 1e-7));
    }
  });

  it("keeps its digits in runs that hardly ever end", () => {
    // Far against the drift only one single value can signal: once in 1/Φ(shift − k − h) points.
    const rare = runLength.cusum({ k: 0.5, h: 4, shift: -30, sided: "one" });
    expect(rare * normalCdf(-34.5)).toBeCloseTo(1, 4);
  });

  it("does not depend on the side of the shift when it watches both", () => {
    const scheme = fc.record({
      k: fc.double({ min: 0, max: 1.5, noNaN: true }),
      h: fc.double({ min: 0.5, max: 6, noNaN: true }),
      shift: fc.double({ min: 0.1, max: 3, noNaN: true }),
    });
    fc.assert(
      fc.property(scheme, ({ shift, ...options }) => {
        const shifted = runLength.cusum({ ...options, shift });
        expect(runLength.cusum({ ...options, shift: -shift })).toBe(shifted);
        expect(runLength.cusum(options)).toBeGreaterThan(shifted);
        expect(runLength.cusum({ ...options, shift, headStart: options.h / 2 })).toBeLessThan(shifted);
        const oneSide = runLength.cusum({ ...options, shift, sided: "one" });
        expect(oneSide).toBeGreaterThanOrEqual(shifted);
        expect(1 / oneSide + 1 / runLength.cusum({ ...options, shift: -shift, sided: "one" })).toEqual(
          near(1 / shifted, TOLERANCE),
        );
      }),
      { numRuns: 30 },
    );
  });

  it.each([
    ["a negative k", { k: -1, h: 4 }],
    ["an h of 0", { k: 0.5, h: 0 }],
    ["an endless h", { k: 0.5, h: Number.POSITIVE_INFINITY }],
    ["a shift that is no number", { k: 0.5, h: 4, shift: Number.NaN }],
    ["a head start beyond h", { k: 0.5, h: 4, headStart: 5, sided: "one" as const }],
    ["head starts on two sides that could signal at once", { k: 0.5, h: 4, headStart: 2.6 }],
    ["a run too long for a number", { k: 0.5, h: 4, shift: -60, sided: "one" as const }],
    ["an interval that would take too many states", { k: 0.1, h: 500 }],
  ])("throws on %s", (_, options) => {
    expect(() => runLength.cusum(options)).toThrow(InputError);
  });

  it("throws on an unknown number of sides", () => {
    const options = { k: 0.5, h: 4, sided: "two" as const };
    expect(() => runLength.cusum(Object.assign(options, { sided: "three" }))).toThrow(InputError);
  });
});
