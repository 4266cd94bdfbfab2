import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { noncentralTCdf, noncentralTQuantile } from "@/lib/statistics/noncentral-t";
import { normalCdf } from "@/lib/statistics/normal";
import { InputError } from "@/lib/statistics/result";
import { studentCdf } from "@/lib/statistics/student";
import { expectClose } from "./close-to";
import { integrate } from "./integrate";

describe("noncentralTQuantile", () => {
  // Computed with mpmath 1.3 at 25 digits from the definition; each agrees with scipy 1.17 stats.nct to 14 digits.
  it.each([
    [0.975, 16, 8.081138530665102, 12.98065568384033],
    [0.025, 16, 8.081138530665102, 5.422004997786389],
    [0.975, 2, 3.3, 21.62664247259815],
    [0.025, 2, 3.3, 1.167238600427968],
    [0.975, 99, 19.6, 23.4191162216156],
    [0.025, 9999, 195.9963984540054, 192.6856665675455],
    [0.975, 9999, 195.9963984540054, 199.38613712246],
    [0.9, 5.5, -1.5, -0.2255943628479436],
    [0.5, 1, 0.7, 0.9036386620594726],
    [0.001, 3, 1, -4.863931983612051],
  ])("is right at p %f with %f degrees of freedom and noncentrality %f", (p, df, noncentrality, expected) => {
    expectClose(noncentralTQuantile(p, df, noncentrality), expected, 1e-11, 0);
  });

  it("gives Carkeet's one-sided factor from its definition", () => {
    // Odeh & Owen, one-sided 95/95 tolerance factor at n = 10: 2.911 (from memory, recomputed here).
    expect(noncentralTQuantile(0.95, 9, 1.6448536269514722 * Math.sqrt(10)) / Math.sqrt(10)).toBeCloseTo(2.911, 3);
  });

  it("undoes noncentralTCdf", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.001, max: 0.999, noNaN: true }),
        fc.double({ min: 1, max: 2000, noNaN: true }),
        fc.double({ min: -5, max: 90, noNaN: true }),
        (p, df, noncentrality) => {
          const t = noncentralTQuantile(p, df, noncentrality);
          expectClose(noncentralTCdf(t, df, noncentrality), p, 1e-9, 1e-10);
        },
      ),
      { numRuns: 40 },
    );
  });

  it("gives the ends of its range and throws on impossible arguments", () => {
    expect(noncentralTQuantile(0, 5, 1)).toBe(Number.NEGATIVE_INFINITY);
    expect(noncentralTQuantile(1, 5, 1)).toBe(Number.POSITIVE_INFINITY);
    expect(() => noncentralTQuantile(1.1, 5, 1)).toThrow(InputError);
    expect(() => noncentralTQuantile(0.5, 0, 1)).toThrow(InputError);
    expect(() => noncentralTCdf(0.5, 5, Number.NaN)).toThrow(InputError);
  });
});

describe("noncentralTCdf", () => {
  it("is Student's t without noncentrality", () => {
    for (const df of [1, 2.5, 30]) {
      for (const t of [-4, -1, 0, 0.7, 3]) expectClose(noncentralTCdf(t, df, 0), studentCdf(t, df), 1e-12, 1e-13);
    }
  });

  it("agrees with an integral over the scale, normalised by its own integral", () => {
    for (const [df, noncentrality, t] of [
      [4, 2, 3],
      [16, 8.08, 9],
      [60, -3, -2.4],
    ] as const) {
      const weight = (s: number) => (s * Math.exp((1 - s * s) / 2)) ** df / Math.max(s, 1e-300);
      const whole = integrate(weight, 0, 6);
      const part = integrate((s) => weight(s) * normalCdf(t * s - noncentrality), 0, 6);
      expectClose(noncentralTCdf(t, df, noncentrality), part / whole, 1e-9, 1e-10);
    }
  });

  it("mirrors when the signs of value and noncentrality change", () => {
    expectClose(noncentralTCdf(3, 8, 2), 1 - noncentralTCdf(-3, 8, -2), 1e-13);
  });
});
