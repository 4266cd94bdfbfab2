import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { intraclassCorrelation } from "@/lib/statistics/intraclass-correlation";
import { InputError } from "@/lib/statistics/result";
import sbp from "../../reference/ba-sbp-1999.json"; // Bland & Altman 1999, table 1: first readings of J, R, S
import edges from "../../reference/edge-cases.json"; // constructed, computed with R
import shroutFleiss from "../../reference/icc-shrout-fleiss-1979.json"; // Shrout & Fleiss 1979, table 2: 6 targets, 4 judges
import anxiety from "../../reference/irr-anxiety.json"; // R package irr 0.84, artificial data
import video from "../../reference/irr-video.json"; // R package irr 0.84, artificial data; rater 1 is constant
import lesions from "../../reference/loam-ct-lesions-woo-2020.json"; // Woo et al. 2020: 10 lesions, 13 observers
import dentists from "../../reference/loam-icc-dmfs-dentists.json"; // Fleiss 1986: 10 patients, 4 dentists
import { arbitraryRatings } from "./arbitrary-ratings";
import { expectOk } from "./close-to";
import { near } from "./near";

const firstReadings = sbp.data.J.map((row, i) => [
  row[0] ?? null,
  sbp.data.R[i]?.[0] ?? null,
  sbp.data.S[i]?.[0] ?? null,
]);

describe("intraclassCorrelation on published data", () => {
  // The values were confirmed with R psych 2.2.9 ICC().
  it.each([
    ["Shrout & Fleiss 1979", shroutFleiss.data.ratings, shroutFleiss.expected],
    ["blood pressure", firstReadings, sbp.expected.iccFirstReadings_J_R_S],
    ["anxiety", anxiety.data.ratings, anxiety.expected.icc],
    ["video, one rater constant", video.data.ratings, video.expected.icc],
    ["lesions, 13 observers", lesions.data.ratings, lesions.expected.icc],
    ["dentists", dentists.data.ratings, dentists.expected.icc],
  ])("gives the six coefficients of %s with tests and intervals", (_, ratings, expected) => {
    const { n, k, F1, F3 } = expected;
    const withTest = (
      { value, ciLow, ciHigh }: { value: number; ciLow: number; ciHigh: number },
      f: number,
      df2: number,
    ) => ({
      estimate: near(value),
      low: near(ciLow),
      high: near(ciHigh),
      f: near(f),
      df1: n - 1,
      df2,
      p: expect.any(Number),
    });
    expect(intraclassCorrelation(ratings)).toEqual({
      ok: true,
      n,
      icc11: withTest(expected.ICC11, F1, n * (k - 1)),
      icc21: withTest(expected.ICC21, F3, (n - 1) * (k - 1)),
      icc31: withTest(expected.ICC31, F3, (n - 1) * (k - 1)),
      icc1k: withTest(expected.ICC1k, F1, n * (k - 1)),
      icc2k: withTest(expected.ICC2k, F3, (n - 1) * (k - 1)),
      icc3k: withTest(expected.ICC3k, F3, (n - 1) * (k - 1)),
    });
  });

  it("reproduces what Shrout & Fleiss 1979 and the documentation of irr print", () => {
    const { icc11, icc21, icc31, icc1k, icc2k, icc3k } = expectOk(intraclassCorrelation(shroutFleiss.data.ratings));
    const printed = [icc11, icc21, icc31, icc1k, icc2k, icc3k].map((coefficient) => coefficient?.estimate.toFixed(2));
    expect(printed).toEqual(["0.17", "0.29", "0.71", "0.44", "0.62", "0.91"]);
    // irr prints 0.198 (-0.039 to 0.494) for agreement on anxiety, F(19, 39.7) = 1.83, p = 0.0543 (from memory: another df2).
    expect(expectOk(intraclassCorrelation(anxiety.data.ratings)).icc21).toMatchObject({
      estimate: near(0.198, 0, 0.0005),
      low: near(-0.039, 0, 0.0005),
      high: near(0.494, 0, 0.0005),
    });
  });

  it("gives p as the upper tail of F", () => {
    // F(5, 18) = 1.7947 has a probability of 0.1648: scipy 1.17, stats.f.sf.
    expect(expectOk(intraclassCorrelation(shroutFleiss.data.ratings)).icc11?.p).toEqual(near(0.1647688083446395));
  });
});

describe("intraclassCorrelation", () => {
  it("says that perfect agreement is 1, without a test or an interval", () => {
    const perfect = edges.data.cases.find(({ id }) => id === "iccPerfect")?.ratings ?? [];
    const one = (df2: number) => ({ estimate: 1, df1: 2, df2 });
    expect(intraclassCorrelation(perfect)).toEqual({
      ok: true,
      n: 3,
      icc11: one(3),
      icc21: one(2),
      icc31: one(2),
      icc1k: one(3),
      icc2k: one(2),
      icc3k: one(2),
    });
  });

  it("leaves out the test of a ratio over 0 and keeps the rest when raters differ by a constant only", () => {
    const { icc21, icc31 } = expectOk(
      intraclassCorrelation([
        [0.1, 0.2],
        [0.4, 0.5],
        [0.9, 1.0],
      ]),
    );
    expect(icc31).toEqual({ estimate: 1, df1: 2, df2: 2 });
    expect(icc21).toMatchObject({
      estimate: near(0.97029702970297),
      low: expect.any(Number),
      high: expect.any(Number),
    });
    expect(icc21).not.toHaveProperty("f");
  });

  it("leaves out coefficients that would divide by 0", () => {
    const result = expectOk(
      intraclassCorrelation([
        [1, 2],
        [1, 2],
        [1, 2],
      ]),
    );
    expect(result.icc31).toBeUndefined();
    expect(result.icc3k).toBeUndefined();
    expect(result.icc21).toEqual({ estimate: 0, df1: 2, df2: 2 });
    expect(result.icc11).toMatchObject({ estimate: -1, f: 0, p: 1 });
  });

  it("leaves out a coefficient whose denominator is 0 but for rounding", () => {
    // Mean squares 16, 4 and 36 = 2·16 + 4, so that the denominator of icc2k is 0; in tenths and thirds it rounds to it.
    const square = [
      [6, -2],
      [-4, 0],
    ];
    for (const scale of [1, 1 / 3, 0.1, 0.7, 1 / 7]) {
      const { icc2k, icc21 } = expectOk(intraclassCorrelation(square.map((row) => row.map((value) => value * scale))));
      expect(icc2k).toBeUndefined();
      expect(icc21).toMatchObject({ estimate: near(-1) });
    }
  });

  it("does not clip what is negative", () => {
    const { icc11, icc1k, icc31 } = expectOk(
      intraclassCorrelation([
        [1, 9, 4],
        [8, 2, 5],
        [5, 5, 6],
      ]),
    );
    expect(icc11?.estimate).toBeLessThan(0);
    expect(icc1k?.estimate).toBeLessThan(-1);
    expect(icc31?.low).toBeLessThan(0);
  });

  it("answers for two subjects and for twelve raters", () => {
    expect(
      intraclassCorrelation([
        [1, 2],
        [4, 6],
      ]),
    ).toMatchObject({ ok: true, n: 2, icc11: { df1: 1, df2: 2 } });
    const twelve = [3, 9, 4].map((level) => Array.from({ length: 12 }, (_, rater) => level + (rater % 3)));
    expect(intraclassCorrelation(twelve)).toMatchObject({ ok: true, n: 3, icc31: { df1: 2, df2: 22, estimate: 1 } });
  });

  it("uses complete rows only, and refuses when they do not suffice", () => {
    const rows = [
      [1, 2],
      [4, 6],
      [7, 7],
    ];
    expect(intraclassCorrelation([[1, 2], [3, null], [4, 6], [5], [7, 7], []])).toEqual(intraclassCorrelation(rows));
    expect(intraclassCorrelation([])).toEqual({ ok: false, n: 0, reason: "no row is complete" });
    expect(
      intraclassCorrelation([
        [1, null],
        [null, 2],
      ]),
    ).toEqual({ ok: false, n: 0, reason: "no row is complete" });
    expect(
      intraclassCorrelation([
        [1, 2],
        [null, 2],
      ]),
    ).toEqual({ ok: false, n: 1, reason: "fewer than two complete rows" });
    expect(intraclassCorrelation([[1], [2], [3]])).toEqual({ ok: false, n: 3, reason: "fewer than two raters" });
    const same = edges.data.cases.find(({ id }) => id === "iccNoVariance")?.ratings ?? [];
    expect(intraclassCorrelation(same)).toEqual({ ok: false, n: 3, reason: "all readings are the same" });
    // The same but for rounding.
    const rounded = [
      [0.3, 0.1 + 0.2],
      [0.1 + 0.2, 0.3],
    ];
    expect(intraclassCorrelation(rounded)).toEqual({ ok: false, n: 2, reason: "all readings are the same" });
  });

  it("throws on bad numbers and a confidence that is no share", () => {
    expect(() =>
      intraclassCorrelation([
        [1, Number.NaN],
        [2, 3],
      ]),
    ).toThrow(InputError);
    expect(() =>
      intraclassCorrelation(
        [
          [1, 2],
          [2, 3],
        ],
        { confidence: 1 },
      ),
    ).toThrow(InputError);
  });

  it("does not change with unit, origin or the order of raters, gives no NaN, and leaves its input alone", () => {
    fc.assert(
      fc.property(arbitraryRatings(), fc.integer({ min: -50, max: 50 }), (ratings, shift) => {
        for (const row of ratings) Object.freeze(row);
        const before = intraclassCorrelation(Object.freeze(ratings));
        const moved = ratings.map((row) => row.map((value) => (value === null ? null : 3 * value + shift)).reverse());
        const after = intraclassCorrelation(moved);
        expect(after.ok).toBe(before.ok);
        if (!before.ok || !after.ok) return;
        expect(JSON.stringify(before)).not.toContain("null"); // how JSON writes NaN and Infinity
        for (const key of ["icc11", "icc21", "icc31", "icc1k", "icc2k", "icc3k"] as const) {
          const [one, other] = [before[key], after[key]];
          expect(other === undefined).toBe(one === undefined);
          if (one && other) expect(other.estimate).toEqual(near(one.estimate, 1e-8, 1e-8));
        }
      }),
    );
  });
});
