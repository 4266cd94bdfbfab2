import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { normalCdf, normalDensity, normalQuantile } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import { expectClose } from "./close-to";
import { integrate } from "./integrate";

describe("normalCdf", () => {
  // Computed with mpmath 1.3 at 40 digits; the first is also in every printed table (0.1587).
  it.each([
    [-1, 0.15865525393145705],
    [-3, 0.0013498980316300946],
    [-10, 7.619853024160525e-24],
    [-30, 4.906713927148187e-198],
    [0.5, 0.6914624612740131],
  ])("keeps its relative accuracy at %f", (x, expected) => {
    expectClose(normalCdf(x), expected, 1e-14, 0);
  });

  it("agrees with the integral of the density", () => {
    for (const x of [-2.5, -2, -1.999, -0.3, 0, 1.1, 2, 3.7]) {
      expectClose(normalCdf(x), 0.5 + integrate(normalDensity, 0, x), 1e-12, 1e-13);
    }
  });

  it("gives complementary tails", () => {
    for (let x = -6; x <= 6; x += 0.37) expectClose(normalCdf(x) + normalCdf(-x), 1, 1e-15);
  });
});

describe("normalQuantile", () => {
  // Computed with mpmath 1.3 at 40 digits; 1.959964 and 2.575829 are in every printed table.
  it.each([
    [0.75, 0.6744897501960817],
    [0.9, 1.2815515655446004],
    [0.975, 1.9599639845400543],
    [0.995, 2.575829303548901],
    [0.001, -3.0902323061678136],
    [1e-10, -6.361340902404057],
    [1e-100, -21.273453560965326],
  ])("is right to 13 digits at %f", (p, expected) => {
    expectClose(normalQuantile(p), expected, 1e-13, 0);
  });

  it("undoes normalCdf", () => {
    fc.assert(
      fc.property(fc.double({ min: -35, max: 5, noNaN: true }), (x) => {
        expectClose(normalQuantile(normalCdf(x)), x, 1e-9, 1e-9);
      }),
    );
  });

  it("is symmetric, 0 in the middle and infinite at the ends", () => {
    expect(normalQuantile(0.5)).toBeCloseTo(0, 15);
    expect(normalQuantile(0.75)).toBe(-normalQuantile(0.25));
    expect(normalQuantile(0)).toBe(Number.NEGATIVE_INFINITY);
    expect(normalQuantile(1)).toBe(Number.POSITIVE_INFINITY);
  });

  it.each([-0.1, 1.1, Number.NaN])("throws on %f, which is no probability", (p) => {
    expect(() => normalQuantile(p)).toThrow(InputError);
  });
});
