import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fleissKappa } from "@/lib/statistics/fleiss-kappa";
import { codeRatings, countByCategory, type Label } from "@/lib/statistics/labels";
import { InputError } from "@/lib/statistics/result";
// Fleiss 1971, table 1: 30 patients, 6 raters, 5 diagnoses.
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
// Gwet 2014: its first 15 patients; values printed in the documentation of irrCAC.
import fifteen from "../../reference/gwet-counts-6raters-15subjects.json";
// Gwet 2014, 4 raters with missing ratings; values printed in the documentation of irrCAC.
import missing from "../../reference/gwet-raw-4raters-missing.json";
// Gwet 2014, 5 observers with many missing ratings; recomputed with R.
import fiveObservers from "../../reference/gwet-raw-5observers-missing.json";
// R package irrCAC, data x.raw10x4; computed with R, confirmed by brute force.
import tenByFour from "../../reference/gwet-raw-10x4.json";
// R package irr, artificial data; computed with R.
import anxiety from "../../reference/irr-anxiety.json";
import video from "../../reference/irr-video.json";
import { freeze } from "./arbitrary-ratings";
import { counts } from "./grid";
import { near, nearEstimate } from "./near";

type Expected = {
  observedAgreement: number;
  expectedAgreement: number;
  kappa: number;
  se0: number;
  categoryKappa: (number | null)[];
  categorySe0: number;
};
type ExpectedGwet = { subjects: number; value: number; se: number; ciLowT: number; ciHighT: number };

const countsOf = ({ ratings, categories }: { ratings: (Label | null)[][]; categories: Label[] }) =>
  countByCategory(codeRatings(ratings, categories));

const equalTotals: [string, number[][], Expected][] = [
  ["Fleiss 1971", psychiatric.data.counts, psychiatric.expected.fleiss],
  ["the first 15 patients of it", fifteen.data.counts, fifteen.expected.fleiss],
  ["ten subjects and four raters", countsOf(tenByFour.data), tenByFour.expected.fleissComplete],
  ["the anxiety ratings", countsOf(anxiety.data), anxiety.expected.fleiss],
  ["the video ratings, two categories unused", countsOf(video.data), video.expected.fleiss],
];

const linearised: [string, number[][], ExpectedGwet][] = [
  ["Fleiss 1971", psychiatric.data.counts, psychiatric.expected.fleissGwetSe],
  ["the first 15 patients of it", fifteen.data.counts, fifteen.expected.fleissGwetSe],
  ["ten subjects and four raters", countsOf(tenByFour.data), tenByFour.expected.unweighted.fleiss],
  ["four raters with missing ratings", countsOf(missing.data), missing.expected.unweighted.fleiss],
  ["five observers with many missing", countsOf(fiveObservers.data), fiveObservers.expected.unweighted.fleiss],
];

describe("fleissKappa against published values", () => {
  it.each(equalTotals)("reproduces kappa, its null error and the category kappas of %s", (_, table, expected) => {
    expect(fleissKappa(table)).toMatchObject({
      ok: true,
      n: table.length,
      kappa: { estimate: near(expected.kappa) },
      observed: near(expected.observedAgreement),
      expected: near(expected.expectedAgreement),
      standardErrorNull: near(expected.se0),
      perCategory: expected.categoryKappa.map((kappa) => ({
        ...(kappa === null ? {} : { kappa: near(kappa) }),
        standardErrorNull: near(expected.categorySe0),
      })),
    });
  });

  it.each(linearised)("reproduces the standard error and t interval of %s", (_, table, expected) => {
    expect(fleissKappa(table)).toMatchObject({
      ok: true,
      n: expected.subjects,
      kappa: {
        estimate: near(expected.value),
        standardError: near(expected.se),
        low: near(expected.ciLowT),
        high: near(expected.ciHighT),
      },
    });
  });

  it("gives the figures printed for Fleiss 1971", () => {
    const result = expectOk(fleissKappa(psychiatric.data.counts));
    expect(result.kappa.estimate).toBeCloseTo(psychiatric.published.fleissKappa, 2);
    expect(result.kappa.estimate / (result.standardErrorNull ?? Number.NaN)).toBeCloseTo(psychiatric.published.z, 1);
    const printed = psychiatric.published.categoryKappa.map((kappa) => near(kappa, 0, 5e-4));
    expect(result.perCategory?.map(({ kappa }) => kappa)).toEqual(printed);
  });

  it("gives the figures printed by irrCAC", () => {
    const { fleiss, fleissSe } = fifteen.published;
    expect(fleissKappa(fifteen.data.counts)).toMatchObject({
      kappa: { estimate: near(fleiss, 0, 5e-8), standardError: near(fleissSe, 0, 5e-9) },
    });
    expect(fleissKappa(countsOf(missing.data))).toMatchObject({
      kappa: {
        estimate: near(missing.published.fleiss, 0, 5e-6),
        standardError: near(missing.published.fleissSe, 0, 5e-6),
      },
    });
  });
});

describe("fleissKappa at the edges", () => {
  it("says why it has no kappa", () => {
    expect(fleissKappa(counts("3 0 | 3 0 | 3 0 | 3 0"))).toEqual({ ok: false, n: 4, reason: "one category only" });
    expect(fleissKappa([[3], [3]])).toEqual({ ok: false, n: 2, reason: "one category only" });
    expect(fleissKappa(counts("1 0 | 0 1 | 0 0"))).toEqual({ ok: false, n: 2, reason: "no subject was rated twice" });
    expect(fleissKappa([])).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(fleissKappa(counts("0 0 | 0 0"))).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(fleissKappa([[]])).toEqual({ ok: false, n: 0, reason: "no ratings" });
  });

  it("leaves the error and interval out for a single subject, and answers for two", () => {
    const one = expectOk(fleissKappa(counts("2 1")));
    // By hand: a third of the pairs agree, chance 4/9 + 1/9, kappa (1/3 − 5/9)/(4/9) = −1/2.
    expect(one.kappa).toEqual({ estimate: near(-0.5) });
    // By hand: both subjects contribute 1.
    expect(fleissKappa(counts("2 0 | 0 2"))).toMatchObject({
      n: 2,
      kappa: { estimate: 1, standardError: 0, low: 1, high: 1 },
    });
  });

  it("leaves out what needs equal totals when they differ, and does not mind a subject without ratings", () => {
    const unequal = expectOk(fleissKappa(counts("2 1 | 1 1 | 0 3")));
    expect(unequal).not.toHaveProperty("standardErrorNull");
    expect(unequal).not.toHaveProperty("perCategory");
    expect(fleissKappa(counts("2 1 | 0 0 | 0 3"))).toEqual(fleissKappa(counts("2 1 | 0 3")));
  });

  it("keeps the place of a category that nobody used, without a kappa", () => {
    const result = expectOk(fleissKappa(counts("2 0 1 | 0 0 3")));
    expect(result.perCategory).toHaveLength(3);
    expect(result.perCategory?.[1]).toEqual({ standardErrorNull: near(Math.sqrt(2 / 12)) });
  });
});

const table = fc
  .integer({ min: 2, max: 5 })
  .chain((size) =>
    fc.array(fc.array(fc.nat(4), { minLength: size, maxLength: size }), { minLength: 2, maxLength: 12 }),
  );

describe("fleissKappa always", () => {
  it("is 1 without spread when everybody agrees and two categories are used", () => {
    fc.assert(
      fc.property(
        fc.array(fc.nat(3), { minLength: 1, maxLength: 10 }),
        fc.integer({ min: 2, max: 12 }),
        (chosen, raters) => {
          const agreed = [0, 1, ...chosen].map((choice) =>
            [0, 1, 2, 3].map((category) => (category === choice ? raters : 0)),
          );
          expect(fleissKappa(agreed)).toMatchObject({ kappa: { estimate: 1, standardError: 0, low: 1, high: 1 } });
        },
      ),
    );
  });

  it("is not changed by the order of the subjects or of the categories", () => {
    fc.assert(
      fc.property(table, (rows) => {
        const turned = rows.map((row) => row.toReversed()).reverse();
        const [first, second] = [fleissKappa(freeze(rows)), fleissKappa(turned)];
        if (!first.ok || !second.ok) {
          expect(second).toEqual(first);
          return;
        }
        expect(second.kappa).toEqual(nearEstimate(first.kappa));
      }),
    );
  });

  it("is what counting all pairs of ratings one by one gives", () => {
    fc.assert(
      fc.property(table, (rows) => {
        const result = fleissKappa(rows);
        const subjects = rows.map(listRatings).filter((ratings) => ratings.length > 0);
        const paired = subjects.filter((ratings) => ratings.length > 1);
        const observed = mean(paired.map((ratings) => shareOfPairs(ratings, (a, b) => a === b)));
        const shares = (rows[0] ?? []).map((_, category) =>
          mean(subjects.map((ratings) => ratings.filter((rating) => rating === category).length / ratings.length)),
        );
        const expected = shares.reduce((total, share) => total + share * share, 0);
        if (!result.ok) {
          expect(paired.length === 0 || Math.abs(expected - 1) < 1e-12).toBe(true);
          return;
        }
        expect(result).toMatchObject({ n: subjects.length, observed: near(observed), expected: near(expected) });
        expect(result.kappa.estimate).toEqual(near((observed - expected) / (1 - expected)));
      }),
    );
  });
});

describe("fleissKappa refuses the caller's mistakes", () => {
  it.each([
    ["ragged rows", counts("1 2 | 3")],
    ["a negative count", counts("1 -1 | 1 1")],
    ["a count that is not whole", counts("1 0.5 | 1 1")],
    ["a count that is no number", counts("1 NaN | 1 1")],
  ])("%s", (_, rows) => {
    expect(() => fleissKappa(rows)).toThrow(InputError);
  });

  it.each([0, 1, Number.NaN])("confidence %s", (confidence) => {
    expect(() => fleissKappa(counts("1 1 | 2 0"), { confidence })).toThrow(InputError);
  });
});

function expectOk(result: ReturnType<typeof fleissKappa>) {
  if (!result.ok) throw new Error(result.reason);
  return result;
}

function listRatings(row: number[]): number[] {
  return row.flatMap((count, category) => Array.from({ length: count }, () => category));
}

function shareOfPairs(ratings: number[], agrees: (a: number, b: number) => boolean): number {
  const pairs = ratings.flatMap((a, i) => ratings.filter((_, j) => j !== i).map((b) => agrees(a, b)));
  return pairs.filter(Boolean).length / pairs.length;
}

function mean(values: number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}
