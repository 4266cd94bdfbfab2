import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { InputError } from "@/lib/statistics/result";
import { studentCdf, studentQuantile, studentTwoSided } from "@/lib/statistics/student";
import { expectClose } from "./close-to";
import { integrate } from "./integrate";

describe("studentQuantile", () => {
  // Computed with mpmath 1.3 at 40 digits; those at 4 and 16 degrees of freedom are in printed tables (2.776, 2.120).
  it.each([
    [0.975, 4, 2.7764451051977943],
    [0.975, 16, 2.1199052992212546],
    [0.975, 59, 2.000995378088268],
    [0.995, 9.5, 3.2070156284394895],
    [0.6, 3, 0.2766706623326899],
    [0.975, 9999, 1.9602012636213577],
  ])("is right to 12 digits at p %f with %f degrees of freedom", (p, df, expected) => {
    expectClose(studentQuantile(p, df), expected, 1e-12, 0);
  });

  it("agrees with the closed forms at one and two degrees of freedom", () => {
    for (const p of [0.501, 0.6, 0.9, 0.975, 0.9999]) {
      expectClose(studentQuantile(p, 1), Math.tan(Math.PI * (p - 0.5)), 1e-12, 0);
      expectClose(studentQuantile(p, 2), (2 * p - 1) / Math.sqrt(2 * p * (1 - p)), 1e-12, 0);
    }
  });

  it("undoes studentCdf, far tails included", () => {
    const tail = fc.double({ min: 1e-12, max: 0.499, noNaN: true });
    fc.assert(
      fc.property(tail, fc.double({ min: 0.5, max: 5000, noNaN: true }), (p, df) => {
        expectClose(studentCdf(studentQuantile(p, df), df), p, 1e-10, 0);
      }),
    );
  });

  it("is symmetric, 0 in the middle and infinite at the ends", () => {
    expect(studentQuantile(0.5, 7)).toBe(0);
    expect(studentQuantile(0.25, 7)).toBe(-studentQuantile(0.75, 7));
    expect(studentQuantile(0, 7)).toBe(Number.NEGATIVE_INFINITY);
    expect(studentQuantile(1, 7)).toBe(Number.POSITIVE_INFINITY);
  });

  it("throws on impossible probabilities and degrees of freedom", () => {
    expect(() => studentQuantile(1.5, 3)).toThrow(InputError);
    expect(() => studentQuantile(0.975, 0)).toThrow(InputError);
    expect(() => studentQuantile(0.975, Number.NaN)).toThrow(InputError);
  });
});

describe("studentCdf", () => {
  it("agrees with an integral of its density, which needs no gamma function", () => {
    // With t = √df·tan θ the density is cos^(df − 1) θ, normalised by its own integral.
    for (const df of [3, 4.5, 16, 60]) {
      const kernel = (angle: number) => Math.cos(angle) ** (df - 1);
      const whole = integrate(kernel, -Math.PI / 2, Math.PI / 2);
      for (const t of [-3, -1, -0.1, 0.5, 2.1]) {
        const part = integrate(kernel, -Math.PI / 2, Math.atan(t / Math.sqrt(df)));
        expectClose(studentCdf(t, df), part / whole, 1e-9, 1e-10);
      }
    }
  });

  it("gives 0, a half and 1 at the ends and the middle", () => {
    expect(studentCdf(Number.NEGATIVE_INFINITY, 3)).toBe(0);
    expect(studentCdf(0, 3)).toBe(0.5);
    expect(studentCdf(Number.POSITIVE_INFINITY, 3)).toBe(1);
  });
});

describe("studentTwoSided", () => {
  it("is the outside of both tails, whatever the sign", () => {
    expectClose(studentTwoSided(studentQuantile(0.975, 12), 12), 0.05, 1e-12);
    expect(studentTwoSided(-1.3, 5)).toBe(studentTwoSided(1.3, 5));
    expect(studentTwoSided(0, 5)).toBe(1);
  });
});
