import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { limitsOfAgreement } from "@/lib/statistics/limits-of-agreement";
import { limitsWithReplicates } from "@/lib/statistics/limits-with-replicates";
import { InputError } from "@/lib/statistics/result";
import cardiac from "../../reference/ba-cardiac-output-1999.json"; // Bland & Altman 1999, table 4, sections 5.2 and 5.3
import pefr from "../../reference/ba-pefr-1986.json"; // Bland & Altman 1986, two readings each
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, table 1, section 5.1
import { expectOk } from "./close-to";
import { near } from "./near";

const zip = (a: number[], b: number[]) => a.map((value, i) => [value, b[i] ?? null]);

describe("limitsWithReplicates with a constant true value", () => {
  it.each([
    ["pressure, S − J", sbp.data.S, sbp.data.J, sbp.expected.replicates_S_minus_J],
    ["pressure, J − R", sbp.data.J, sbp.data.R, sbp.expected.replicates_J_minus_R],
    ["cardiac output", cardiac.data.RV, cardiac.data.IC, cardiac.expected.unequalReplicates],
    ["peak flow", zip(pefr.data.x, pefr.data.x2), zip(pefr.data.y, pefr.data.y2), pefr.expected.replicates],
  ])("gives the limits of %s", (_, first, second, expected) => {
    expect(limitsWithReplicates(first, second)).toMatchObject({
      ok: true,
      n: expected.n,
      bias: { estimate: near(expected.bias), standardError: near(expected.seBias) },
      sd: near(expected.correctedSd),
      lower: {
        estimate: near(expected.lower),
        standardError: near(expected.seLimit),
        low: near(expected.lowerCiZ.low),
        high: near(expected.lowerCiZ.high),
      },
      upper: {
        estimate: near(expected.upper),
        standardError: near(expected.seLimit),
        low: near(expected.upperCiZ.low),
        high: near(expected.upperCiZ.high),
      },
    });
  });

  it("reproduces what the paper prints", () => {
    // Section 5.1: 15.62, SD 20.95, limits -25.4 and 56.7. Section 5.2: 0.7092, limits -1.35 and 2.77.
    expect(limitsWithReplicates(sbp.data.S, sbp.data.J)).toMatchObject({
      bias: { estimate: near(15.62, 0, 0.005) },
      sd: near(20.95, 0, 0.005),
      lower: { estimate: near(-25.4, 0, 0.05) },
      upper: { estimate: near(56.7, 0, 0.05) },
    });
    expect(limitsWithReplicates(cardiac.data.RV, cardiac.data.IC)).toMatchObject({
      bias: { estimate: near(0.7092, 0, 0.00005) },
      lower: { estimate: near(-1.35, 0, 0.005) },
      upper: { estimate: near(2.77, 0, 0.005) },
    });
  });

  it("is plain limits of agreement when each case was read once", () => {
    const first = pefr.data.x.map((value) => [value]);
    const second = pefr.data.y.map((value) => [value, null]);
    const plain = expectOk(limitsOfAgreement(pefr.data.x, pefr.data.y));
    for (const trueValue of ["constant", "varying"] as const) {
      const rows = trueValue === "varying" ? pefr.data.y.map((value) => [value]) : second;
      expect(limitsWithReplicates(first, rows, { trueValue })).toMatchObject({
        n: 17,
        sd: near(plain.sd),
        bias: { estimate: near(plain.bias.estimate), standardError: near(plain.bias.standardError ?? 0) },
        lower: { estimate: near(plain.lower.estimate), standardError: near(plain.lower.standardError ?? 0) },
      });
    }
  });
});

describe("limitsWithReplicates with a varying true value", () => {
  it("gives the limits of cardiac output, section 5.3", () => {
    const expected = cardiac.expected.pairedReplicates;
    expect(limitsWithReplicates(cardiac.data.RV, cardiac.data.IC, { trueValue: "varying" })).toMatchObject({
      ok: true,
      n: expected.subjects,
      bias: { estimate: near(expected.bias) },
      sd: near(expected.totalSd),
      lower: { estimate: near(expected.lower) },
      upper: { estimate: near(expected.upper) },
    });
    // Printed: bias 0.60, SD 0.99.
    expect(expected.bias).toBeCloseTo(cardiac.published.pairedBias, 2);
    expect(expected.totalSd).toBeCloseTo(cardiac.published.pairedSd, 2);
  });

  it("gives the standard errors of the two mean squares when cases have equally many pairs", () => {
    // Differences 1, 3 | 2, 6 | 9, 9: mean squares 52/2 between cases and 10/3 within.
    const zeros = [
      [0, 0],
      [0, 0],
      [0, 0],
    ];
    const rows = [
      [1, 3],
      [2, 6],
      [9, 9],
    ];
    expect(limitsWithReplicates(rows, zeros, { trueValue: "varying" })).toMatchObject({
      bias: { estimate: 5, standardError: near(Math.sqrt(26 / 6)) },
      sd: near(Math.sqrt(44 / 3)),
      // Variance of the variance: 2(26/2)²/2 + 2((10/3)/2)²/3.
      lower: { standardError: near(Math.sqrt(26 / 6 + (1.96 ** 2 * (169 + 50 / 27)) / (4 * (44 / 3)))) },
    });
  });

  it("pairs replicates in order: a gap drops its pair and shifts no other", () => {
    const varying = { trueValue: "varying" } as const;
    const withGaps = limitsWithReplicates([[1, null, 3], [5, 6, 9], []], [[1, 2, 5], [null, 7, 8], [3]], varying);
    expect(withGaps).toEqual(
      limitsWithReplicates(
        [
          [1, 3],
          [6, 9],
        ],
        [
          [1, 5],
          [7, 8],
        ],
        varying,
      ),
    );
    expect(withGaps).toMatchObject({ ok: true, n: 2 });
  });

  it("throws on a case whose replicates cannot be paired", () => {
    const uneven = () =>
      limitsWithReplicates(
        [
          [1, 2],
          [3, 4],
        ],
        [[1], [3, 5]],
        { trueValue: "varying" },
      );
    expect(uneven).toThrow(InputError);
  });
});

describe("limitsWithReplicates", () => {
  it("refuses fewer than two cases read by both", () => {
    const reason = "fewer than two cases read by both";
    for (const trueValue of ["constant", "varying"] as const) {
      expect(limitsWithReplicates([], [], { trueValue })).toEqual({ ok: false, n: 0, reason });
      expect(limitsWithReplicates([[1, 2], [3], [null]], [[1, 2], [], [4]], { trueValue })).toEqual({
        ok: false,
        n: 1,
        reason,
      });
    }
  });

  it("gives a width of 0 for the same difference everywhere", () => {
    const point = { estimate: 1, standardError: 0, low: 1, high: 1 };
    for (const trueValue of ["constant", "varying"] as const) {
      expect(
        limitsWithReplicates(
          [
            [2, 2],
            [5, 5],
            [6, 6],
          ],
          [
            [1, 1],
            [4, 4],
            [5, 5],
          ],
          { trueValue },
        ),
      ).toEqual({
        ok: true,
        n: 3,
        bias: point,
        sd: 0,
        lower: point,
        upper: point,
      });
    }
  });

  it("throws on unequal numbers of cases, bad numbers and unknown options", () => {
    expect(() => limitsWithReplicates([[1]], [])).toThrow(InputError);
    expect(() => limitsWithReplicates([[Number.NaN], [1]], [[1], [2]])).toThrow(InputError);
    expect(() => limitsWithReplicates([[1], [2]], [[1], [3]], { coverage: 2 })).toThrow(InputError);
    // @ts-expect-error: from JavaScript, or from a form
    expect(() => limitsWithReplicates([[1], [2]], [[1], [3]], { trueValue: "linked" })).toThrow(InputError);
  });

  it("moves with a shift, mirrors when the two change places, and leaves its input alone", () => {
    const row = fc.array(fc.option(fc.integer({ min: -45, max: 45 }), { freq: 5 }), { minLength: 2, maxLength: 2 });
    const rows = fc.array(fc.tuple(row, row), { minLength: 4, maxLength: 20 });
    fc.assert(
      fc.property(
        rows,
        fc.integer({ min: -30, max: 30 }),
        fc.constantFrom("constant" as const, "varying" as const),
        (cases, shift, trueValue) => {
          const first = cases.map(([a]) => Object.freeze(a));
          const second = cases.map(([, b]) => Object.freeze(b));
          const shifted = first.map((values) => values.map((value) => (value === null ? null : value + shift)));
          const before = limitsWithReplicates(Object.freeze(first), Object.freeze(second), { trueValue });
          const mirrored = limitsWithReplicates(second, first, { trueValue });
          const after = limitsWithReplicates(shifted, second, { trueValue });
          if (!before.ok) return;
          expect(expectOk(mirrored).lower.estimate).toEqual(near(-before.upper.estimate));
          expect(expectOk(after).lower.estimate).toEqual(near(before.lower.estimate + shift));
          expect(expectOk(after).sd).toEqual(near(before.sd));
        },
      ),
    );
  });
});
