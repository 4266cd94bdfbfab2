import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { findRoot } from "@/lib/statistics/find-root";

describe("findRoot", () => {
  it("finds the zero of a monotone function wherever it starts", () => {
    fc.assert(
      fc.property(
        fc.double({ min: -50, max: 50, noNaN: true }),
        fc.double({ min: -80, max: 80, noNaN: true }),
        (root, start) => {
          const cubic = (x: number) => (x - root) ** 3 + (x - root);
          expect(findRoot(cubic, start, 0.5)).toBeCloseTo(root, 12);
        },
      ),
    );
  });

  it("survives infinite values on one side", () => {
    expect(findRoot((x) => Math.log(Math.max(x, 0)), 40, 1)).toBeCloseTo(1, 14);
    expect(findRoot((x) => (x <= 1 ? Number.NEGATIVE_INFINITY : Math.log(x / 2)), 1, 0.25)).toBeCloseTo(2, 14);
  });

  it("throws rather than answer when nothing crosses zero", () => {
    expect(() => findRoot(() => 1, 0, 1)).toThrow(RangeError);
  });
});
