import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { repeatability } from "@/lib/statistics/repeatability";
import { InputError } from "@/lib/statistics/result";
import pefr from "../../reference/ba-pefr-1986.json"; // Bland & Altman 1986: two readings each by two meters
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, section 2: three readings each by J, R and S
import { expectOk } from "./close-to";
import { near } from "./near";

const zip = (a: number[], b: number[]) => a.map((value, i) => [value, b[i] ?? null]);

describe("repeatability", () => {
  it.each([
    ["J", 85, sbp.data.J, sbp.expected.repeatabilityJ],
    ["R", 85, sbp.data.R, sbp.expected.repeatabilityR],
    ["S", 85, sbp.data.S, sbp.expected.repeatabilityS],
    ["Wright meter", 17, zip(pefr.data.x, pefr.data.x2), pefr.expected.repeatabilityX],
    ["mini meter", 17, zip(pefr.data.y, pefr.data.y2), pefr.expected.repeatabilityY],
  ])("gives the within-subject SD and coefficient of %s", (_, n, replicates, expected) => {
    const scale = 1.96 * Math.SQRT2;
    expect(repeatability(replicates)).toMatchObject({
      ok: true,
      n,
      withinSd: {
        estimate: near(expected.sw),
        standardError: near(expected.sw / Math.sqrt(2 * expected.df)),
        low: near(expected.swCiLow),
        high: near(expected.swCiHigh),
      },
      coefficient: {
        estimate: near(expected.repeatabilityCoefficient),
        low: near(scale * expected.swCiLow),
        high: near(scale * expected.swCiHigh),
      },
    });
  });

  it("reproduces the printed within-subject SDs of 6.116 and 9.118", () => {
    expect(expectOk(repeatability(sbp.data.J)).withinSd.estimate).toBeCloseTo(6.116, 3);
    expect(expectOk(repeatability(sbp.data.S)).withinSd.estimate).toBeCloseTo(9.118, 3);
  });

  it("pools unequal numbers of repeats by their degrees of freedom", () => {
    // Within: 2 + 0.5 over 2 + 1 degrees of freedom; the single reading adds nothing.
    expect(repeatability([[1, 2, 3], [4, null, 5], [9], [], [null]])).toMatchObject({
      ok: true,
      n: 2,
      withinSd: { estimate: near(Math.sqrt(2.5 / 3)) },
    });
  });

  it("gives a true 0 for identical repeats, and refuses when nothing was repeated", () => {
    const zero = { estimate: 0, standardError: 0, low: 0, high: 0 };
    expect(repeatability([[0.1, 0.1, 0.1]])).toEqual({ ok: true, n: 1, withinSd: zero, coefficient: zero });
    expect(repeatability([])).toEqual({ ok: false, n: 0, reason: "no case was read twice" });
    expect(repeatability([[1], [2, null]])).toEqual({ ok: false, n: 0, reason: "no case was read twice" });
  });

  it("throws on NaN and on a confidence that is no share", () => {
    expect(() => repeatability([[1, Number.NaN]])).toThrow(InputError);
    expect(() => repeatability([[1, 2]], { confidence: 0 })).toThrow(InputError);
  });

  it("does not change when a case moves as a whole, and leaves its input alone", () => {
    const row = fc.array(fc.option(fc.integer({ min: -45, max: 45 })), { maxLength: 5 });
    fc.assert(
      fc.property(
        fc.array(row, { maxLength: 12 }),
        fc.array(fc.integer({ min: -20, max: 20 }), { minLength: 12 }),
        (rows, by) => {
          for (const values of rows) Object.freeze(values);
          const moved = rows.map((values, i) => values.map((value) => (value === null ? null : value + (by[i] ?? 0))));
          const before = repeatability(Object.freeze(rows));
          const after = repeatability(moved);
          expect(after.ok).toBe(before.ok);
          if (before.ok && after.ok) expect(after.withinSd.high).toEqual(near(before.withinSd.high ?? Number.NaN));
        },
      ),
    );
  });
});
