import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { kappaAxis, multiplesBetween, paddedAxis } from "@/components/charts/axis-range";

describe("kappaAxis", () => {
  it("runs from 0.2 to 1 when every value lies above", () => {
    expect(kappaAxis([0.52, 0.95])).toEqual({ low: 0.2, high: 1, ticks: [0.2, 0.4, 0.6, 0.8, 1] });
    expect(kappaAxis([])).toMatchObject({ low: 0.2, high: 1 });
  });
  it("starts at 0, or below, when a value asks for it", () => {
    expect(kappaAxis([0.15]).low).toBe(0);
    expect(kappaAxis([0.21]).low).toBe(0); // a dot on the very end would look cut off
    expect(kappaAxis([-0.05]).low).toBe(-0.2);
    expect(kappaAxis([-0.05]).ticks).toEqual([-0.2, 0, 0.2, 0.4, 0.6, 0.8, 1]);
  });
  it("holds every possible kappa", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -1, max: 1, noNaN: true })), (values) => {
        const { low, high } = kappaAxis(values);
        for (const value of values) {
          expect(value).toBeGreaterThanOrEqual(low);
          expect(value).toBeLessThanOrEqual(high);
        }
      }),
    );
  });
});

describe("paddedAxis", () => {
  const degrees = { steps: [1, 2, 5, 10, 20, 50], tickCountMax: 6 };
  it("holds every value with room, and writes no more ticks than asked", () => {
    fc.assert(
      fc.property(fc.array(fc.double({ min: -90, max: 90, noNaN: true }), { minLength: 1 }), (values) => {
        const { low, high, ticks } = paddedAxis(values, degrees);
        expect(low).toBeLessThan(Math.min(...values));
        expect(high).toBeGreaterThan(Math.max(...values));
        expect(ticks.length).toBeLessThanOrEqual(6);
        for (const tick of ticks) expect(tick >= low && tick <= high).toBe(true);
      }),
    );
  });
  it("does not go beyond the bound of the scale", () => {
    const kappa = { steps: [0.05, 0.1, 0.2], tickCountMax: 6, highest: 1 };
    expect(paddedAxis([0.7, 0.99], kappa).high).toBe(1);
    expect(paddedAxis([0.7, 0.8], kappa).high).toBeLessThan(1);
  });
});

describe("multiplesBetween", () => {
  it("gives clean numbers, zero without a sign", () => {
    expect(multiplesBetween(-0.1, 0.3, 0.1)).toEqual([-0.1, 0, 0.1, 0.2, 0.3]);
    expect(multiplesBetween(-20, 25, 10)).toEqual([-20, -10, 0, 10, 20]);
    expect(multiplesBetween(3, 4, 10)).toEqual([]);
  });
});
