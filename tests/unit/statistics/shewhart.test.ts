import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { shewhart } from "@/lib/statistics/shewhart";
import { arbitraryPoints } from "./arbitrary-chart";

const BASE = { target: 10, sigma: 2 };

function chart(...args: Parameters<typeof shewhart>) {
  const result = shewhart(...args);
  if (!result.ok) throw new Error(result.reason);
  return result.points;
}

describe("shewhart", () => {
  // Definition (Shewhart 1931): limits three sigma from the target; the values are constructed.
  it("has limits three sigma from the target and signals only beyond them", () => {
    expect(chart([10, 14, 14.5, 16, 16.5, 3.5], BASE)).toEqual(
      [
        [10, "in"],
        [14, "in"],
        [14.5, "warning"],
        [16, "warning"],
        [16.5, "action"],
        [3.5, "action"],
      ].map(([value, state]) => ({ value, statistic: value, lower: 4, upper: 16, state })),
    );
  });

  it("takes each point's own sigma, and another width", () => {
    const points = chart([14, 14], { target: 10, sigma: [1, 4], width: 2 });
    expect(points.map(({ lower, upper, state }) => [lower, upper, state])).toEqual([
      [8, 12, "action"],
      [2, 18, "in"],
    ]);
  });

  it("stays the same when values and target move", () => {
    fc.assert(
      fc.property(arbitraryPoints, fc.integer({ min: -50, max: 50 }), (points, shift) => {
        const plain = shewhart(points, { target: 0, sigma: 1 });
        const moved = shewhart(
          points.map((value) => (value === null ? null : value + shift)),
          { target: shift, sigma: 1 },
        );
        if (!plain.ok || !moved.ok) throw new Error("refused");
        expect(moved.points.map(({ state }) => state)).toEqual(plain.points.map(({ state }) => state));
      }),
    );
  });

  it("gives a missing point limits, no statistic and no signal, and shifts no other", () => {
    fc.assert(
      fc.property(arbitraryPoints, (points) => {
        const kept = points.filter((value) => value !== null);
        const whole = shewhart(points, { target: 0, sigma: 1 });
        const without = shewhart(kept, { target: 0, sigma: 1 });
        if (!whole.ok || !without.ok) throw new Error("refused");
        expect(whole.n).toBe(kept.length);
        expect(whole.points.filter((point) => point.value !== null)).toEqual(without.points);
        for (const point of whole.points.filter(({ value }) => value === null)) {
          expect(point).toEqual({ value: null, statistic: null, lower: -3, upper: 3, state: "in" });
        }
      }),
    );
    const points = chart([null, 40, null, 10], { target: 10, sigma: [null, 1, null, 2] });
    expect(points.map(({ upper, state }) => [upper, state])).toEqual([
      [13, "in"],
      [13, "action"],
      [13, "in"],
      [16, "in"],
    ]);
  });

  it("leaves its input as it was", () => {
    expect(chart(Object.freeze([10, null]), { ...BASE, sigma: Object.freeze([2, null]) })).toHaveLength(2);
  });

  it("refuses a chart without points", () => {
    expect(shewhart([], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
    expect(shewhart([null], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
  });

  it.each([
    ["a target that is no number", [1], { ...BASE, target: Number.NaN }],
    ["a sigma of 0", [1], { ...BASE, sigma: 0 }],
    ["too few sigmas", [1, 2], { ...BASE, sigma: [1] }],
    ["a width of 0", [1], { ...BASE, width: 0 }],
    ["an endless value", [Number.POSITIVE_INFINITY], BASE],
  ])("throws on %s", (_, points, options) => {
    expect(() => shewhart(points, options)).toThrow(InputError);
  });
});
