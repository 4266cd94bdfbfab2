import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fCdf, fQuantile, fTails } from "@/lib/statistics/f-distribution";
import { InputError } from "@/lib/statistics/result";
import { studentQuantile } from "@/lib/statistics/student";
import { expectClose } from "./close-to";
import { integrate } from "./integrate";

describe("fQuantile", () => {
  // Computed with mpmath 1.3 at 40 digits; 161.4 and 3.38 are in printed tables.
  it.each([
    [0.975, 5, 18, 3.381967805875243],
    [0.025, 5, 15, 0.1555759630784871],
    [0.975, 4.78514386221276, 5, 7.190737169238163],
    [0.95, 1, 1, 161.4476387975885],
    [0.975, 59, 2301, 1.399400302556553],
    [0.001, 2, 7.5, 0.0010006338122429757],
    [0.975, 0.5, 3, 19.171897589457963],
    [0.025, 40.25, 0.7, 0.15798065640069417],
  ])("is right to 12 digits at p %f with %f and %f degrees of freedom", (p, df1, df2, expected) => {
    expectClose(fQuantile(p, df1, df2), expected, 1e-12, 0);
  });

  it("is the square of Student's t for one degree of freedom above", () => {
    expectClose(fQuantile(0.95, 1, 13), studentQuantile(0.975, 13) ** 2, 1e-12, 0);
  });

  it("undoes fCdf for any degrees of freedom", () => {
    const df = fc.double({ min: 0.3, max: 3000, noNaN: true });
    fc.assert(
      fc.property(fc.double({ min: 1e-9, max: 0.999, noNaN: true }), df, df, (p, df1, df2) => {
        expectClose(fCdf(fQuantile(p, df1, df2), df1, df2), p, 1e-10, 0);
      }),
    );
  });

  it("turns over when its degrees of freedom change places", () => {
    expectClose(fQuantile(0.975, 4, 9), 1 / fQuantile(0.025, 9, 4), 1e-12, 0);
  });

  it("gives the ends of its range, and throws on what is no probability or degree of freedom", () => {
    expect(fQuantile(0, 3, 4)).toBe(0);
    expect(fQuantile(1, 3, 4)).toBe(Number.POSITIVE_INFINITY);
    expect(() => fQuantile(-0.1, 3, 4)).toThrow(InputError);
    expect(() => fQuantile(0.5, 0, 4)).toThrow(InputError);
    expect(() => fQuantile(0.5, 3, Number.POSITIVE_INFINITY)).toThrow(InputError);
  });
});

describe("fCdf", () => {
  it("agrees with an integral of its density, which needs no gamma function", () => {
    // With df1·F/df2 = tan² θ the density is sin^(df1 − 1) θ · cos^(df2 − 1) θ, normalised by its own integral.
    for (const [df1, df2] of [
      [5, 15],
      [9, 4],
      [59, 120],
    ] as const) {
      const kernel = (angle: number) => Math.sin(angle) ** (df1 - 1) * Math.cos(angle) ** (df2 - 1);
      const whole = integrate(kernel, 0, Math.PI / 2);
      for (const x of [0.2, 0.9, 1.6, 4]) {
        const part = integrate(kernel, 0, Math.atan(Math.sqrt((df1 * x) / df2)));
        expectClose(fCdf(x, df1, df2), part / whole, 1e-9, 1e-10);
      }
    }
  });

  it("keeps both tails, also beyond its range", () => {
    expect(fTails(0, 2, 3)).toEqual({ lower: 0, upper: 1 });
    expect(fTails(Number.POSITIVE_INFINITY, 2, 3)).toEqual({ lower: 1, upper: 0 });
    expect(fTails(1e9, 10, 40).upper).toBeGreaterThan(0);
    expect(() => fCdf(Number.NaN, 2, 3)).toThrow(InputError);
  });
});
