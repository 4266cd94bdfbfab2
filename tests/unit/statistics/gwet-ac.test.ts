import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { gwetAC } from "@/lib/statistics/gwet-ac";
import { InputError } from "@/lib/statistics/result";
// Constructed; computed with R from the formulas.
import edgeCases from "../../reference/edge-cases.json";
// Fleiss 1971; AC1 recomputed with R.
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
// Gwet 2014, data and values printed in the documentation of irrCAC.
import fifteen from "../../reference/gwet-counts-6raters-15subjects.json";
import missing from "../../reference/gwet-raw-4raters-missing.json";
import fiveObservers from "../../reference/gwet-raw-5observers-missing.json";
import tenByFour from "../../reference/gwet-raw-10x4.json";
import abstractors from "../../reference/gwet-table-3x3-abstractors.json";
import diagnosis from "../../reference/gwet-table-4x4-diagnosis.json";
// R package irr, artificial data; computed with R: categories 1 and 6 are never used.
import video from "../../reference/irr-video.json";
// Gerstman, and constructed tables; AC1 recomputed with R.
import twoByTwo from "../../reference/kappa-2x2-indices.json";
// Feinstein & Cicchetti 1990; AC1 recomputed with R.
import paradox from "../../reference/kappa-paradox-feinstein-cicchetti-1990.json";
import { arbitraryRatings, freeze, ratingsOfTable, rename } from "./arbitrary-ratings";
import { ratings } from "./grid";
import { near, nearEstimate } from "./near";

type Expected = {
  subjects: number;
  observedAgreement: number;
  expectedAgreement: number;
  value: number;
  se: number;
  ciLowT: number;
  ciHighT: number;
};

function acLike(expected: Expected) {
  return {
    ok: true,
    n: expected.subjects,
    coefficient: {
      estimate: near(expected.value),
      standardError: near(expected.se),
      low: near(expected.ciLowT),
      high: near(expected.ciHighT),
    },
    observed: near(expected.observedAgreement),
    expected: near(expected.expectedAgreement),
  };
}

/** Ratings whose raters are of no interest: each subject's counts laid out one after the other. */
function ratingsOfCounts(counts: number[][], categories: number[]): number[][] {
  return counts.map((row) => row.flatMap((count, i) => Array.from({ length: count }, () => categories[i] ?? 0)));
}

const names = ["unweighted", "linear", "quadratic"] as const;
const weightsOf = (name: (typeof names)[number]) => (name === "unweighted" ? "none" : name);

describe("gwetAC against published values", () => {
  it.each(names)("reproduces AC of several raters, also with missing ratings: %s", (name) => {
    const weights = weightsOf(name);
    for (const { data, expected } of [tenByFour, missing, fiveObservers]) {
      const { categories } = data;
      expect(gwetAC(data.ratings, { weights, categories })).toMatchObject(acLike(expected[name].ac));
    }
  });

  it("reproduces AC1 from counts of raters", () => {
    const { categories } = fifteen.data;
    expect(gwetAC(ratingsOfCounts(fifteen.data.counts, categories))).toMatchObject(acLike(fifteen.expected.ac1));
    expect(gwetAC(psychiatric.data.ratings)).toMatchObject(acLike(psychiatric.expected.ac1));
  });

  it("counts the categories offered, used or not", () => {
    const { ratings, categories } = video.data;
    expect(gwetAC(ratings, { categories })).toMatchObject(acLike(video.expected.ac1));
    // Four categories are used, so π(1 − π), which sums to 5·0.0846875, is taken over 3 instead of 5.
    expect(gwetAC(ratings)).toMatchObject({ expected: near(0.4234375 / 3) });
  });

  it.each(names)("reproduces AC of two raters from Gwet's tables, %s", (name) => {
    for (const { data, expected } of [abstractors, diagnosis]) {
      const table = expected.gwet[name];
      const rows = ratingsOfTable(data.table, data.categories);
      const { value, se, observedAgreement, expectedAgreement } = table;
      expect(gwetAC(rows, { weights: weightsOf(name), categories: data.categories })).toMatchObject({
        n: table.n,
        // Gwet 2008 divides the variance by n², the frame for many raters by n(n − 1).
        coefficient: { estimate: near(value), standardError: near(se * Math.sqrt(table.n / (table.n - 1))) },
        observed: near(observedAgreement),
        expected: near(expectedAgreement),
      });
    }
  });

  it.each(twoByTwo.data.cases)("gives AC1 of the 2 × 2 table $id", ({ id, table }) => {
    const ac1 = Object.entries(twoByTwo.expected.cases).find(([name]) => name === id)?.[1].ac1;
    if (!ac1) throw new Error(`no expected values for ${id}`);
    const rows = ratingsOfTable(table, ["yes", "no"]);
    expect(gwetAC(rows, { categories: ["yes", "no"] })).toMatchObject({
      coefficient: {
        estimate: near(ac1.value),
        standardError: near(ac1.se * Math.sqrt(rows.length / (rows.length - 1))),
      },
    });
  });

  it.each(paradox.data.cases)("stays near the observed agreement in Feinstein & Cicchetti's $id", ({ id, table }) => {
    const expected = Object.entries(paradox.expected.cases).find(([name]) => name === id)?.[1];
    if (!expected) throw new Error(`no expected values for ${id}`);
    const rows = ratingsOfTable(table, ["yes", "no"]);
    expect(gwetAC(rows)).toMatchObject({ coefficient: { estimate: near(expected.ac1) } });
  });

  it("gives the figures printed by irrCAC", () => {
    const { categories } = missing.data;
    const printed = missing.published;
    expect(gwetAC(missing.data.ratings, { categories })).toMatchObject({
      coefficient: { estimate: near(printed.ac1, 0, 5e-6), standardError: near(printed.ac1Se, 0, 5e-6) },
      observed: near(printed.pa, 0, 5e-8),
      expected: near(printed.pe, 0, 5e-8),
    });
    expect(gwetAC(ratingsOfCounts(fifteen.data.counts, fifteen.data.categories))).toMatchObject({
      coefficient: { estimate: near(0.4448007, 0, 5e-8), standardError: near(0.08418757, 0, 5e-9) },
    });
  });
});

describe("gwetAC at the edges", () => {
  it("is 1 when all ratings fall in one of several categories offered", () => {
    const all = Array.from({ length: 12 }, () => ["a", "a"]);
    expect(gwetAC(all, { categories: ["a", "b"] })).toMatchObject({
      n: 12,
      coefficient: {
        estimate: edgeCases.expected.cases.kappaBothRatersConstant.ac1,
        standardError: 0,
        low: 1,
        high: 1,
      },
      expected: 0,
    });
    const three = Array.from({ length: 4 }, () => ["a", "a", "a"]);
    expect(gwetAC(three, { categories: ["a", "b"] })).toMatchObject({
      coefficient: { estimate: edgeCases.expected.cases.fleissOneCategory.ac1 },
    });
  });

  it("is -1 for two constant raters who differ", () => {
    expect(gwetAC(Array.from({ length: 9 }, () => ["a", "b"]))).toMatchObject({
      coefficient: { estimate: edgeCases.expected.cases.kappaConstantAndDifferent.ac1, standardError: 0 },
    });
  });

  it("has no spread, to the last digit, when the subjects are alike, and no last digit where it is 0", () => {
    for (const weights of ["none", "linear", "quadratic"] as const) {
      const alike = Array.from({ length: 7 }, () => [1, 1, 1, 1, 2, 3, 3]);
      expect(gwetAC(alike, { weights })).toMatchObject({ coefficient: { standardError: 0 } });
    }
    // In exact fractions, observed and expected are both 10/21.
    const alike = Array.from({ length: 6 }, () => [1, 1, 1, 1, 2, 3, 3]);
    expect(gwetAC(alike, { weights: "linear" })).toMatchObject({ coefficient: { estimate: 0, low: 0, high: 0 } });
  });

  it("says why it has no coefficient", () => {
    expect(gwetAC([["a", "a"]])).toEqual({ ok: false, n: 1, reason: "one category only" });
    expect(gwetAC(ratings("1 . | . 2 | . ."))).toEqual({ ok: false, n: 2, reason: "no subject was rated twice" });
    expect(gwetAC([])).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(gwetAC([], { categories: ["a", "b"] })).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(gwetAC(ratings(". . | . ."), { categories: [1, 2] })).toEqual({ ok: false, n: 0, reason: "no ratings" });
  });

  it("leaves the error and interval out for a single subject", () => {
    // By hand: shares 2/3 and 1/3, expected (2/9 + 2/9), observed 1/3, AC1 (1/3 − 4/9)/(5/9) = −1/5.
    expect(gwetAC(ratings("1 1 2"))).toMatchObject({ n: 1, coefficient: { estimate: near(-0.2) } });
    expect(gwetAC(ratings("1 1 2"))).not.toHaveProperty("coefficient.standardError");
  });

  it("takes rows that end early as missing ratings", () => {
    expect(gwetAC([[1, 1, 2], [2], [1, 2]])).toEqual(gwetAC(ratings("1 1 2 | 2 . . | 1 2 .")));
  });
});

describe("gwetAC always", () => {
  const weighting = fc.constantFrom("none", "linear", "quadratic");

  it("is not changed by who rated, by empty subjects, or by an unweighted category's name", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const whole = gwetAC(freeze(rows));
        const turned = gwetAC([...rows.map((row) => row.toReversed()), [null, null]]);
        const renamed = gwetAC(rename(rows));
        if (!whole.ok) {
          expect([turned, renamed]).toEqual([whole, whole]);
          return;
        }
        const same = {
          ok: true,
          n: whole.n,
          coefficient: nearEstimate(whole.coefficient),
          expected: near(whole.expected),
        };
        expect(turned).toMatchObject(same);
        expect(renamed).toMatchObject(same);
      }),
    );
  });

  it("has the definition's value, with all pairs of ratings weighed one by one", () => {
    fc.assert(
      fc.property(arbitraryRatings(), weighting, (rows, weights) => {
        const categories = [1, 2, 3, 4];
        const result = gwetAC(rows, { weights, categories });
        const subjects = rows.map((row) => row.filter((rating) => rating !== null)).filter((row) => row.length > 0);
        const weigh = (a: number, b: number) => {
          if (weights === "none") return a === b ? 1 : 0;
          return weights === "linear" ? 1 - Math.abs(a - b) / 3 : 1 - (a - b) ** 2 / 9;
        };
        const paired = subjects.filter((row) => row.length > 1);
        if (!result.ok) {
          expect(paired).toHaveLength(0);
          return;
        }
        const observed = mean(paired.map((row) => mean(otherPairs(row).map(([a, b]) => weigh(a, b)))));
        const shares = categories.map((category) =>
          mean(subjects.map((row) => row.filter((rating) => rating === category).length / row.length)),
        );
        const weightSum = categories.flatMap((a) => categories.map((b) => weigh(a, b))).reduce((x, y) => x + y);
        const expected = (weightSum / 12) * shares.reduce((total, share) => total + share * (1 - share), 0);
        expect(result).toMatchObject({ n: subjects.length, observed: near(observed), expected: near(expected) });
        expect(result.coefficient.estimate).toEqual(near((observed - expected) / (1 - expected)));
      }),
    );
  });

  it("is the same weighted as unweighted for two categories", () => {
    fc.assert(
      fc.property(arbitraryRatings(), weighting, (rows, weights) => {
        const halves = rows.map((row) => row.map((rating) => rating && (rating > 2 ? "b" : "a")));
        const plain = gwetAC(halves, { categories: ["a", "b"] });
        const weighted = gwetAC(halves, { categories: ["a", "b"], weights });
        if (!plain.ok) {
          expect(weighted).toEqual(plain);
          return;
        }
        expect(weighted).toMatchObject({ coefficient: nearEstimate(plain.coefficient) });
      }),
    );
  });
});

describe("gwetAC refuses the caller's mistakes", () => {
  it("labels and options that cannot be meant", () => {
    const weights = JSON.parse('"cubic"'); // what comes from outside has no type to stop it
    expect(() => gwetAC([["a", "b"]], { weights })).toThrow(InputError);
    expect(() => gwetAC([["a", "b"]], { categories: ["a"] })).toThrow(InputError);
    expect(() => gwetAC([["a", "b"]], { categories: [] })).toThrow(InputError);
    expect(() => gwetAC([["a", "b"]], { categories: ["a", "b", "a"] })).toThrow(InputError);
    expect(() => gwetAC([[Number.NaN, 1]])).toThrow(InputError);
    expect(() => gwetAC(JSON.parse('["a", "b"]'))).toThrow(InputError);
    expect(() => gwetAC(JSON.parse("[[true, false]]"))).toThrow(InputError);
    expect(() => gwetAC([["a", "b"]], { confidence: 95 })).toThrow(InputError);
  });
});

function otherPairs(row: number[]): [number, number][] {
  return row.flatMap((a, i) => row.filter((_, j) => j !== i).map((b): [number, number] => [a, b]));
}

function mean(values: number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}
