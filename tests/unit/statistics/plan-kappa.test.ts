import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { casesForKappa, planKappa } from "@/lib/statistics/plan-kappa";
import { InputError } from "@/lib/statistics/result";
// Computed with R from the variance of Fleiss, Cohen & Everitt and from the common-correlation model (Donner & Eliasziw).
import planning from "../../reference/planning-kappa.json";
import { near } from "./near";

const z = 1.959963984540054; // R qnorm(0.975)

describe("planKappa", () => {
  it.each(planning.expected.grid)("has the variance of the grid at kappa $kappa, prevalence $prevalence", (row) => {
    const marginals = [row.prevalence, row.prevalence] as const;
    const standardError = Math.sqrt(row.varianceTimesN / 50);
    expect(planKappa({ n: 50, kappa: row.kappa, marginals })).toEqual({
      ok: true,
      n: 50,
      standardError: near(standardError),
      halfWidth: near(z * standardError),
    });
  });

  it("foresees the standard error of a table with these margins and this kappa, also when raters differ", () => {
    fc.assert(
      fc.property(fc.tuple(fc.nat(30), fc.nat(30), fc.nat(30), fc.nat(30)), ([a, b, c, d]) => {
        const table = [
          [a + 1, b],
          [c, d + 1],
        ];
        const n = a + b + c + d + 2;
        const result = cohenKappa(table);
        if (!result.ok) throw new Error(result.reason);
        const { estimate, standardError = Number.NaN } = result.kappa;
        const marginals = [(a + 1 + b) / n, (a + 1 + c) / n] as const;
        expect(planKappa({ n, kappa: estimate, marginals })).toMatchObject({
          standardError: near(standardError, 1e-7, 1e-7),
        });
      }),
    );
  });

  it("gives a wider half-width for more confidence", () => {
    const plan = { n: 100, kappa: 0.6, marginals: [0.5, 0.5] } as const;
    // Variance 0.64 (reference grid); R qnorm(0.995).
    expect(planKappa({ ...plan, confidence: 0.99 })).toMatchObject({ halfWidth: near(2.575829303548901 * 0.08) });
  });

  it("has a standard error of 0 where kappa cannot vary", () => {
    const none = { standardError: 0, halfWidth: 0 };
    expect(planKappa({ n: 40, kappa: 1, marginals: [0.3, 0.3] })).toMatchObject(none);
    expect(planKappa({ n: 40, kappa: 0, marginals: [1, 0.3] })).toMatchObject(none);
  });

  it.each([
    ["more kappa than unequal margins allow", 0.9, [0.2, 0.6]],
    ["less kappa than rare findings allow", -0.5, [0.1, 0.1]],
    ["kappa above 1", 1.1, [0.5, 0.5]],
    ["one category only", 0, [1, 1]],
    ["a margin above 1", 0.5, [1.2, 0.5]],
    ["a margin below 0", 0.5, [-0.2, 0.5]],
    ["a margin that is no number", 0.5, [Number.NaN, 0.5]],
    ["a kappa that is no number", Number.NaN, [0.5, 0.5]],
  ] as const)("refuses %s as the caller's mistake", (_, kappa, marginals) => {
    expect(() => planKappa({ n: 50, kappa, marginals })).toThrow(InputError);
    expect(() => casesForKappa({ halfWidth: 0.1, kappa, marginals })).toThrow(InputError);
  });

  it.each([0, -3, 1.5, Number.NaN])("refuses %s cases", (n) => {
    expect(() => planKappa({ n, kappa: 0.5, marginals: [0.5, 0.5] })).toThrow(InputError);
  });
});

describe("casesForKappa", () => {
  it.each(planning.expected.grid)("takes the cases of the grid at kappa $kappa, prevalence $prevalence", (row) => {
    const marginals = [row.prevalence, row.prevalence] as const;
    for (const { halfWidth, n } of row.n) {
      expect(casesForKappa({ halfWidth, kappa: row.kappa, marginals })).toEqual({ ok: true, n });
    }
  });

  it("takes the fewest cases that reach the half-width", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.02, max: 0.5, noNaN: true }),
        fc.constantFrom(0.1, 0.4, 0.7),
        (halfWidth, kappa) => {
          const plan = { kappa, marginals: [0.3, 0.35], confidence: 0.9 } as const;
          const cases = casesForKappa({ ...plan, halfWidth });
          const reached = planKappa({ ...plan, n: cases.n });
          const short = planKappa({ ...plan, n: Math.max(1, cases.n - 1) });
          if (!reached.ok || !short.ok) throw new Error("no plan");
          expect(reached.halfWidth).toBeLessThanOrEqual(halfWidth * (1 + 1e-12));
          if (cases.n > 1) expect(short.halfWidth).toBeGreaterThan(halfWidth);
        },
      ),
    );
  });

  it("says that no number of cases follows where kappa cannot vary", () => {
    expect(casesForKappa({ halfWidth: 0.1, kappa: 1, marginals: [0.3, 0.3] })).toMatchObject({ ok: false, n: 0 });
  });

  it.each([0, -0.1, Number.NaN, Number.POSITIVE_INFINITY])("refuses the half-width %s", (halfWidth) => {
    expect(() => casesForKappa({ halfWidth, kappa: 0.5, marginals: [0.5, 0.5] })).toThrow(InputError);
  });

  it("refuses a confidence outside (0, 1)", () => {
    const plan = { kappa: 0.5, marginals: [0.5, 0.5], confidence: 95 } as const;
    expect(() => casesForKappa({ ...plan, halfWidth: 0.1 })).toThrow(InputError);
    expect(() => planKappa({ ...plan, n: 10 })).toThrow(InputError);
  });
});
