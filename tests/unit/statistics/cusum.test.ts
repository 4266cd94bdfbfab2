import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cusum } from "@/lib/statistics/cusum";
import { InputError } from "@/lib/statistics/result";
// NIST/SEMATECH e-Handbook of Statistical Methods, 6.3.2.3, from memory of the page; both columns recomputed with R.
import nist from "../../reference/chart-cusum-nist.json";
import { arbitraryFullPoints, arbitraryPoints } from "./arbitrary-chart";
import { near } from "./near";

const { values, target, k, h } = nist.data;
const BASE = { k: 0.5, h: 4, target: 0, sigma: 1 };

function chart(...args: Parameters<typeof cusum>) {
  const result = cusum(...args);
  if (!result.ok) throw new Error(result.reason);
  return result.points;
}

describe("cusum", () => {
  it("gives both sums and the signals of the handbook's example", () => {
    const points = chart(values, { k, h, target, sigma: 1 });
    expect(points.map(({ upper }) => upper)).toEqual(nist.expected.upper.map((sum) => near(sum)));
    expect(points.map(({ lower }) => lower)).toEqual(nist.expected.lower.map((sum) => near(sum)));
    expect(points.flatMap(({ state }, index) => (state === "action" ? [index + 1] : []))).toEqual(
      nist.published.signals,
    );
    points.forEach(({ upper, lower }, index) => {
      expect(Math.abs(upper - (nist.published.upper[index] ?? Number.NaN))).toBeLessThanOrEqual(0.005 + 1e-9);
      expect(Math.abs(lower - (nist.published.lower[index] ?? Number.NaN))).toBeLessThanOrEqual(0.005 + 1e-9);
    });
  });

  it("counts in sigma: the same chart whatever the unit", () => {
    const degrees = chart([3, -6, 12], { ...BASE, target: 3, sigma: 3 });
    expect(degrees.map(({ upper, lower }) => [upper, lower])).toEqual([
      [0, 0],
      [0, 2.5],
      [2.5, 0],
    ]);
    expect(chart([3, -6, 12], { ...BASE, target: 3, sigma: [3, 3, 3] })).toEqual(degrees);
    expect(chart([3, -6, 12], { ...BASE, target: 3, sigma: [3, 9, 3] })[1]?.lower).toBe(0.5);
  });

  it("starts both sums at the head start and signals only beyond h", () => {
    expect(chart([1, 1.5, 0.75], { ...BASE, headStart: 2 })).toEqual([
      { value: 1, upper: 2.5, lower: 0.5, limit: 4, state: "in" },
      { value: 1.5, upper: 3.5, lower: 0, limit: 4, state: "warning" },
      { value: 0.75, upper: 3.75, lower: 0, limit: 4, state: "warning" },
    ]);
    expect(chart([2.5], { ...BASE, headStart: 2 })[0]).toMatchObject({ upper: 4, state: "warning" });
    expect(chart([-2.625], { ...BASE, headStart: 2 })[0]).toMatchObject({ lower: 4.125, state: "action" });
  });

  it("goes on after a signal without a reset", () => {
    expect(chart([5, 1, 1], BASE).map(({ upper, state }) => [upper, state])).toEqual([
      [4.5, "action"],
      [5, "action"],
      [5.5, "action"],
    ]);
  });

  it("never has a negative sum, and mirrors when the values do", () => {
    fc.assert(
      fc.property(arbitraryFullPoints, (points) => {
        const plain = chart(points, BASE);
        const mirrored = chart(
          points.map((value) => -value),
          BASE,
        );
        plain.forEach((point, index) => {
          expect(Math.min(point.upper, point.lower)).toBeGreaterThanOrEqual(0);
          expect(mirrored[index]).toMatchObject({ upper: point.lower, lower: point.upper, state: point.state });
        });
      }),
    );
  });

  it("stays the same when values and target move", () => {
    fc.assert(
      fc.property(arbitraryFullPoints, fc.integer({ min: -50, max: 50 }), (points, shift) => {
        const moved = chart(
          points.map((value) => value + shift),
          { ...BASE, target: shift },
        );
        expect(moved.map(({ value: _, ...point }) => point)).toEqual(
          chart(points, BASE).map(({ value: _, ...point }) => point),
        );
      }),
    );
  });

  it("lets a missing point repeat the one before and shift no other", () => {
    fc.assert(
      fc.property(arbitraryPoints, (points) => {
        const kept = points.filter((value) => value !== null);
        const whole = cusum(points, { ...BASE, headStart: 1 });
        const without = cusum(kept, { ...BASE, headStart: 1 });
        if (!whole.ok || !without.ok) throw new Error("refused");
        expect(whole.points).toHaveLength(points.length);
        expect(whole.n).toBe(kept.length);
        expect(whole.points.filter((point) => point.value !== null)).toEqual(without.points);
        whole.points.forEach((point, index) => {
          const before = whole.points[index - 1] ?? { upper: 1, lower: 1, limit: 4, state: "in" };
          if (point.value === null) expect(point).toEqual({ ...before, value: null });
        });
      }),
    );
  });

  it("leaves its input as it was", () => {
    const points = Object.freeze([1, null, 3]);
    const sigma = Object.freeze([1, null, 2]);
    expect(chart(points, { ...BASE, sigma })[2]).toMatchObject({ upper: 1.5, lower: 0 });
  });

  it("refuses a chart without points", () => {
    expect(cusum([], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
    expect(cusum([null], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
  });

  it.each([
    ["a negative k", [1], { ...BASE, k: -0.1 }],
    ["a k that is no number", [1], { ...BASE, k: Number.NaN }],
    ["an h of 0", [1], { ...BASE, h: 0 }],
    ["a negative head start", [1], { ...BASE, headStart: -1 }],
    ["a head start beyond h", [1], { ...BASE, headStart: 4.5 }],
    ["an endless target", [1], { ...BASE, target: Number.NEGATIVE_INFINITY }],
    ["a sigma of 0", [1], { ...BASE, sigma: 0 }],
    ["too many sigmas", [1], { ...BASE, sigma: [1, 1] }],
    ["a value that is no number", [Number.NaN], BASE],
  ])("throws on %s", (_, points, options) => {
    expect(() => cusum(points, options)).toThrow(InputError);
  });
});
