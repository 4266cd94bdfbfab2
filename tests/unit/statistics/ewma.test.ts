import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ewma } from "@/lib/statistics/ewma";
import { InputError } from "@/lib/statistics/result";
// NIST/SEMATECH e-Handbook of Statistical Methods, 6.3.2.4, from memory of the page; all values recomputed with R.
import nist from "../../reference/chart-ewma-nist.json";
import { arbitraryFullPoints, arbitraryPoints } from "./arbitrary-chart";
import { near } from "./near";

const { values, target, sigma, lambda, L: width } = nist.data;
const BASE = { lambda: 0.25, width: 2.5, target: 0, sigma: 1 };

function chart(...args: Parameters<typeof ewma>) {
  const result = ewma(...args);
  if (!result.ok) throw new Error(result.reason);
  return result.points;
}

describe("ewma", () => {
  it("gives the averages and widening limits of the handbook's example", () => {
    const points = chart(values, { lambda, width, target, sigma });
    expect(points).toEqual(
      nist.expected.ewma.map((statistic, index) => ({
        value: values[index],
        statistic: near(statistic),
        lower: near(nist.expected.lclExact[index] ?? Number.NaN),
        upper: near(nist.expected.uclExact[index] ?? Number.NaN),
        state: expect.stringMatching(/^(in|warning)$/), // no signal, as printed
      })),
    );
    points.forEach(({ statistic }, index) => {
      expect(Math.abs(statistic - (nist.published.ewma[index] ?? Number.NaN))).toBeLessThanOrEqual(0.005 + 1e-9);
    });
  });

  it("gives the steady limits of the handbook's example from the first point on", () => {
    for (const point of chart(values, { lambda, width, target, sigma, limits: "steady" })) {
      expect(point).toMatchObject({ lower: near(nist.expected.lclSteady), upper: near(nist.expected.uclSteady) });
      expect(point.state).not.toBe("action");
    }
  });

  it("weighs each point's own sigma in the widening limits, and takes it alone for steady ones", () => {
    const options = { lambda: 0.5, width: 2, target: 0, sigma: [2, 4] };
    const [, second] = chart([1, 1], options);
    expect(second?.upper).toBeCloseTo(2 * Math.sqrt(0.25 * 16 + 0.25 * (0.25 * 4)), 12);
    const [first, last] = chart([1, 1], { ...options, limits: "steady" });
    expect(first?.upper).toBeCloseTo(2 * 2 * Math.sqrt(1 / 3), 12);
    expect(last?.upper).toBeCloseTo(2 * 4 * Math.sqrt(1 / 3), 12);
  });

  it("is a chart of single values at lambda 1", () => {
    const states = chart([0, 1.9, -2.1, 3.1, -3.1, 3], { ...BASE, lambda: 1, width: 3 });
    expect(states.map(({ state }) => state)).toEqual(["in", "in", "warning", "action", "action", "warning"]);
    expect(states.map(({ statistic }) => statistic)).toEqual([0, 1.9, -2.1, 3.1, -3.1, 3]);
  });

  it("moves as one when values and target move", () => {
    fc.assert(
      fc.property(arbitraryPoints, fc.integer({ min: -50, max: 50 }), (points, shift) => {
        const plain = ewma(points, BASE);
        const moved = ewma(
          points.map((value) => (value === null ? null : value + shift)),
          { ...BASE, target: shift },
        );
        if (!plain.ok || !moved.ok) throw new Error("refused");
        plain.points.forEach((point, index) => {
          expect(moved.points[index]).toMatchObject({
            statistic: near(point.statistic + shift),
            lower: near(point.lower + shift),
            upper: near(point.upper + shift),
            state: point.state,
          });
        });
      }),
    );
  });

  it("lets a missing point repeat the one before and shift no other", () => {
    fc.assert(
      fc.property(arbitraryPoints, fc.constantFrom("widening", "steady"), (points, limits) => {
        const kept = points.filter((value) => value !== null);
        const whole = ewma(points, { ...BASE, limits });
        const without = ewma(kept, { ...BASE, limits });
        if (!whole.ok || !without.ok) throw new Error("refused");
        expect(whole.points).toHaveLength(points.length);
        expect(whole.n).toBe(kept.length);
        expect(whole.points.filter((point) => point.value !== null)).toEqual(without.points);
        whole.points.forEach((point, index) => {
          const before = whole.points[index - 1];
          if (point.value === null && before) expect(point).toEqual({ ...before, value: null });
        });
      }),
    );
  });

  it("starts a chart whose first point is missing at the target", () => {
    const options = { ...BASE, target: 7, sigma: [null, 3] };
    expect(chart([null, 8], options)[0]).toEqual({ value: null, statistic: 7, lower: 7, upper: 7, state: "in" });
    const [steady, next] = chart([null, 8], { ...options, limits: "steady" });
    expect(steady).toEqual({ value: null, statistic: 7, lower: next?.lower, upper: next?.upper, state: "in" });
  });

  it("leaves its input as it was", () => {
    fc.assert(
      fc.property(arbitraryFullPoints, (points) => {
        const sigmas = Object.freeze(points.map(() => 1));
        expect(ewma(Object.freeze(points), { ...BASE, sigma: sigmas })).toEqual(ewma([...points], BASE));
      }),
    );
  });

  it("refuses a chart without points", () => {
    expect(ewma([], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
    expect(ewma([null, null], BASE)).toEqual({ ok: false, n: 0, reason: "no points" });
  });

  it.each([
    ["lambda 0", [1], { ...BASE, lambda: 0 }],
    ["lambda above 1", [1], { ...BASE, lambda: 1.1 }],
    ["lambda that is no number", [1], { ...BASE, lambda: Number.NaN }],
    ["a width of 0", [1], { ...BASE, width: 0 }],
    ["an endless width", [1], { ...BASE, width: Number.POSITIVE_INFINITY }],
    ["a target that is no number", [1], { ...BASE, target: Number.NaN }],
    ["a sigma of 0", [1], { ...BASE, sigma: 0 }],
    ["a negative sigma of one point", [1, 2], { ...BASE, sigma: [1, -1] }],
    ["a point without its sigma", [1, 2], { ...BASE, sigma: [1, null] }],
    ["too few sigmas", [1, 2], { ...BASE, sigma: [1] }],
    ["a value that is no number", [1, Number.NaN], BASE],
    ["an endless value", [Number.POSITIVE_INFINITY], BASE],
    ["no points, but a bad sigma", [], { ...BASE, sigma: -1 }],
  ])("throws on %s", (_, points, options) => {
    expect(() => ewma(points, options)).toThrow(InputError);
  });

  it("throws on unknown limits", () => {
    expect(() => ewma([1], Object.assign({ ...BASE, limits: "steady" as const }, { limits: "narrow" }))).toThrow(
      InputError,
    );
  });
});
