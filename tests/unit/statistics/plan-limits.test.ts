import { describe, expect, it } from "vitest";
import { limitsOfAgreement } from "@/lib/statistics/limits-of-agreement";
import { planLimits } from "@/lib/statistics/plan-limits";
import { InputError } from "@/lib/statistics/result";
import pefr from "../../reference/ba-pefr-1986.json"; // Bland & Altman 1986, table I
import planning from "../../reference/planning-limits-of-agreement.json"; // Bland 2004; Carkeet 2015; computed with R
import { expectOk } from "./close-to";
import { near } from "./near";

describe("planLimits", () => {
  it.each(planning.expected.unitSd)("gives the half-widths of $n cases in units of the SD", (expected) => {
    expect(planLimits({ n: expected.n, sd: 1 })).toEqual({
      ok: true,
      n: expected.n,
      halfWidth: near(expected.halfWidth1999T),
      exact: {
        inwards: near(expected.exactInwards, 1e-6),
        outwards: near(expected.exactOutwards, 1e-6),
        halfWidth: near(expected.exactIndividualHalfWidth, 1e-6),
      },
    });
  });

  it("agrees with the rule that Bland prints: ± 0.34 SD at 100 cases, ± 0.24 at 200", () => {
    expect(expectOk(planLimits({ n: 100, sd: 1 })).halfWidth).toBeCloseTo(planning.published.n100, 2);
    expect(expectOk(planLimits({ n: 200, sd: 1 })).halfWidth).toBeCloseTo(planning.published.n200, 2);
  });

  it("gives, for the SD that was found, the widths that limits of agreement have", () => {
    const { sd, upper, exact } = expectOk(limitsOfAgreement(pefr.data.x, pefr.data.y));
    const plan = expectOk(planLimits({ n: 17, sd }));
    expect(plan.halfWidth).toEqual(near((upper.high ?? 0) - upper.estimate));
    expect(2 * plan.exact.halfWidth).toEqual(near(exact.upper.high - exact.upper.low));
    expect(plan.exact.inwards + plan.exact.outwards).toEqual(near(2 * plan.exact.halfWidth));
  });

  it("refuses what limits would refuse, and throws on what is no plan", () => {
    expect(planLimits({ n: 2, sd: 1 })).toEqual({ ok: false, n: 2, reason: "fewer than three pairs" });
    expect(() => planLimits({ n: 10.5, sd: 1 })).toThrow(InputError);
    expect(() => planLimits({ n: -1, sd: 1 })).toThrow(InputError);
    expect(() => planLimits({ n: 10, sd: 0 })).toThrow(InputError);
    expect(() => planLimits({ n: 10, sd: 1, coverage: 1 })).toThrow(InputError);
  });
});
