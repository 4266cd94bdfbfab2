import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { chiSquareCdf, chiSquareQuantile, chiSquareTails } from "@/lib/statistics/chi-square";
import { normalQuantile } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import { expectClose } from "./close-to";
import { integrate } from "./integrate";

describe("chiSquareQuantile", () => {
  // Computed with mpmath 1.3 at 40 digits; 30.191 and 7.564 are in printed tables.
  it.each([
    [0.975, 17, 30.191009121639805],
    [0.025, 17, 7.564186449577569],
    [0.975, 170, 207.99543153977544],
    [0.025, 1, 0.000982069117175256],
    [0.95, 0.5, 2.4202322748895253],
    [0.001, 9999, 9567.690346556727],
    [0.999, 2301.5, 2516.8699942977482],
  ])("is right to 12 digits at p %f with %f degrees of freedom", (p, df, expected) => {
    expectClose(chiSquareQuantile(p, df), expected, 1e-12, 0);
  });

  it("has closed forms at one and two degrees of freedom", () => {
    expectClose(chiSquareQuantile(0.95, 1), normalQuantile(0.975) ** 2, 1e-12, 0);
    expectClose(chiSquareQuantile(0.95, 2), -2 * Math.log(0.05), 1e-12, 0);
  });

  it("undoes chiSquareCdf for any degrees of freedom", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-9, max: 0.999, noNaN: true }),
        fc.double({ min: 0.3, max: 9000, noNaN: true }),
        (p, df) => {
          expectClose(chiSquareCdf(chiSquareQuantile(p, df), df), p, 1e-10, 0);
        },
      ),
    );
  });

  it("gives the ends of its range, and throws on what is no probability or degree of freedom", () => {
    expect(chiSquareQuantile(0, 3)).toBe(0);
    expect(chiSquareQuantile(1, 3)).toBe(Number.POSITIVE_INFINITY);
    expect(() => chiSquareQuantile(2, 3)).toThrow(InputError);
    expect(() => chiSquareQuantile(0.5, -1)).toThrow(InputError);
  });
});

describe("chiSquareCdf", () => {
  it("agrees with an integral of its density, which needs no gamma function", () => {
    // With χ² = v² the density is v^(df − 1) exp(−v²/2), normalised by its own integral.
    for (const df of [4, 9, 60]) {
      const kernel = (v: number) => v ** (df - 1) * Math.exp((df - v * v) / 2) * df ** (-df / 2);
      const whole = integrate(kernel, 0, Math.sqrt(df) + 12);
      for (const ratio of [0.4, 0.9, 1.3]) {
        const x = ratio * df;
        expectClose(chiSquareCdf(x, df), integrate(kernel, 0, Math.sqrt(x)) / whole, 1e-9, 1e-10);
      }
    }
  });

  it("keeps both tails", () => {
    expect(chiSquareTails(0, 2)).toEqual({ lower: 0, upper: 1 });
    expect(chiSquareTails(Number.POSITIVE_INFINITY, 2)).toEqual({ lower: 1, upper: 0 });
    expectClose(chiSquareTails(100, 2).upper, Math.exp(-50), 1e-12, 0);
    expect(() => chiSquareCdf(Number.NaN, 2)).toThrow(InputError);
  });
});
