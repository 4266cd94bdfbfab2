import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { casesForLimits } from "@/lib/statistics/cases-for-limits";
import { planLimits } from "@/lib/statistics/plan-limits";
import { InputError } from "@/lib/statistics/result";
import planning from "../../reference/planning-limits-of-agreement.json"; // Carkeet 2015, computed with R
import { expectOk } from "./close-to";

describe("casesForLimits", () => {
  it.each(planning.expected.sampleSize)("takes $nExactHalfWidth cases for ± $halfWidthInSd SD", (expected) => {
    const { halfWidthInSd, nExactHalfWidth } = expected;
    expect(casesForLimits({ halfWidth: halfWidthInSd, sd: 1 })).toEqual({ ok: true, n: nExactHalfWidth });
    expect(casesForLimits({ halfWidth: 4.5 * halfWidthInSd, sd: 4.5 }).n).toBe(nExactHalfWidth);
  });

  it("is the smallest number that suffices", () => {
    const share = fc.double({ min: 0.02, max: 5, noNaN: true });
    fc.assert(
      fc.property(
        share,
        fc.constantFrom(0.8, 0.95, 0.99),
        fc.constantFrom(0.9, 0.95),
        (halfWidth, confidence, coverage) => {
          const { n } = casesForLimits({ halfWidth, sd: 1, confidence, coverage });
          const plan = (count: number) =>
            expectOk(planLimits({ n: count, sd: 1, confidence, coverage })).exact.halfWidth;
          expect(plan(n)).toBeLessThanOrEqual(halfWidth);
          if (n > 3) expect(plan(n - 1)).toBeGreaterThan(halfWidth);
        },
      ),
      { numRuns: 30 },
    );
  });

  it("never falls below three, and reaches very many", () => {
    expect(casesForLimits({ halfWidth: 1000, sd: 1 }).n).toBe(3);
    expect(casesForLimits({ halfWidth: 0.001, sd: 1 }).n).toBeGreaterThan(1e7);
  });

  it("throws on sizes that are not positive or out of reach", () => {
    expect(() => casesForLimits({ halfWidth: 0, sd: 1 })).toThrow(InputError);
    expect(() => casesForLimits({ halfWidth: 1, sd: -1 })).toThrow(InputError);
    expect(() => casesForLimits({ halfWidth: 1e-9, sd: 1 })).toThrow(InputError);
    expect(() => casesForLimits({ halfWidth: 1, sd: 1, confidence: 2 })).toThrow(InputError);
  });
});
