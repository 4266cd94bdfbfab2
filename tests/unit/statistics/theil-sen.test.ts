import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { theilSen } from "@/lib/statistics/theil-sen";
import reference from "../../reference/theil-sen.json"; // constructed, computed with R; slopes confirmed with scipy
import { expectOk } from "./close-to";
import { near } from "./near";

const points = (id: string) => reference.data.cases.find((entry) => entry.id === id) ?? { x: [], y: [] };

describe("theilSen", () => {
  it.each(["oneOutlier", "tiedX", "twoPoints"] as const)("gives slope and intercept of the case %s", (id) => {
    const { x, y } = points(id);
    const { slope, interceptMedianResidual } = reference.expected.cases[id];
    expect(theilSen(x, y)).toMatchObject({
      ok: true,
      n: x.length,
      slope: { estimate: near(slope) },
      intercept: near(interceptMedianResidual),
    });
  });

  it("gives Sen's interval", () => {
    // n = 10: variance of Kendall's S 125, 45 slopes, 1.96·√125 = 21.9, so ranks 11 and 35.
    const { x, y } = points("oneOutlier");
    const slopes = x
      .flatMap((a, i) => x.slice(i + 1).map((b, j) => ((y[i + 1 + j] ?? 0) - (y[i] ?? 0)) / (b - a)))
      .sort((a, b) => a - b);
    expect(expectOk(theilSen(x, y)).slope).toEqual({
      estimate: near(1),
      low: near(slopes[10] ?? Number.NaN),
      high: near(slopes[34] ?? Number.NaN),
    });
    // Ties in x: 125 less 3·(2·1·9)/18 = 122; 42 slopes, 1.96·√122 = 21.6, so ranks 10 and 33, -0.55 and -0.3.
    expect(expectOk(theilSen(points("tiedX").x, points("tiedX").y)).slope).toMatchObject({
      low: near(-0.55),
      high: near(-0.3),
    });
  });

  it("counts ties in x as no evidence", () => {
    // Two groups of six: variance (12·11·29 − 2·6·5·17)/18 = 156, 1.96·√156 = 24.5 of the 36 slopes 70, 71, …, 105, so
    // ranks 5 and 32. Without the ties it would be 212.7, and ranks 3 and 34.
    const x = [0, 0, 0, 0, 0, 0, 1, 1, 1, 1, 1, 1];
    const y = [0, 6, 12, 18, 24, 30, 100, 101, 102, 103, 104, 105];
    expect(expectOk(theilSen(x, y)).slope).toEqual({ estimate: 87.5, low: 74, high: 101 });
  });

  it("leaves the interval out when there are too few points", () => {
    expect(expectOk(theilSen([1, 3], [2, 8])).slope).toEqual({ estimate: 3 });
    expect(expectOk(theilSen([1, 2, 3], [1, 2, 4])).slope).toEqual({ estimate: 1.5 });
  });

  it("refuses when no two points differ in x, and throws on what cannot be paired", () => {
    expect(theilSen([], [])).toEqual({ ok: false, n: 0, reason: "no two points differ in x" });
    expect(theilSen([1], [1])).toEqual({ ok: false, n: 1, reason: "no two points differ in x" });
    expect(theilSen([2, 2, null], [1, 5, 7])).toEqual({ ok: false, n: 2, reason: "no two points differ in x" });
    expect(() => theilSen([1, 2], [1])).toThrow(InputError);
    expect(() => theilSen([1, 2], [1, Number.NaN])).toThrow(InputError);
    expect(() => theilSen([1, 2], [1, 2], { confidence: 0 })).toThrow(InputError);
  });

  it("follows a change of unit and origin, ignores gaps and order, and leaves its input alone", () => {
    const value = fc.integer({ min: -45, max: 45 });
    fc.assert(
      fc.property(
        fc.array(fc.tuple(value, value), { minLength: 2, maxLength: 25 }),
        value,
        value,
        (rows, slope, shift) => {
          const x = Object.freeze(rows.map(([a]) => a));
          const y = Object.freeze(rows.map(([, b]) => b));
          const before = theilSen(x, y);
          if (!before.ok) return;
          const tilted = rows.map(([a, b]) => [a, b + slope * a + shift] as const).reverse();
          const after = expectOk(
            theilSen([null, 3, ...tilted.map(([a]) => a)], [1, null, ...tilted.map(([, b]) => b)]),
          );
          expect(after.slope.estimate).toEqual(near(before.slope.estimate + slope));
          expect(after.intercept).toEqual(near(before.intercept + shift, 1e-9, 1e-8));
          if (before.slope.low !== undefined) expect(after.slope.low).toEqual(near(before.slope.low + slope));
        },
      ),
    );
  });
});
