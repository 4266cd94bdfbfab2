import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { InputError } from "@/lib/statistics/result";
// Constructed; computed with R from the formulas.
import edgeCases from "../../reference/edge-cases.json";
// Gwet 2014, tables printed in the documentation of irrCAC; kappa recomputed with R.
import abstractors from "../../reference/gwet-table-3x3-abstractors.json";
import diagnosis from "../../reference/gwet-table-4x4-diagnosis.json";
// R package irr, artificial data; kappas recomputed with R.
import anxiety from "../../reference/irr-anxiety.json";
// xray: Gerstman, Epidemiology Kept Simple, table 10.3; others constructed, computed with R and confirmed with vcd.
import twoByTwo from "../../reference/kappa-2x2-indices.json";
// Cohen 1968, worked example.
import cohen1968 from "../../reference/kappa-cohen-1968.json";
// Fleiss, Cohen & Everitt 1969, worked example; confirmed with R vcd and psych.
import everitt from "../../reference/kappa-fleiss-cohen-everitt-1969.json";
// Feinstein & Cicchetti 1990.
import paradox from "../../reference/kappa-paradox-feinstein-cicchetti-1990.json";
// Stuart 1953; confirmed with R vcd.
import vision from "../../reference/kappa-vision-stuart-1953.json";
import { counts } from "./grid";
import { near, nearEstimate } from "./near";

type ExpectedKappa = (typeof everitt)["expected"]["unweighted"];

/** A reference file's names in ours. */
function kappaLike(expected: Omit<ExpectedKappa, "z" | "p">) {
  return {
    ok: true,
    n: expected.n,
    kappa: {
      estimate: near(expected.kappa),
      standardError: near(expected.se),
      low: near(expected.ciLow),
      high: near(expected.ciHigh),
    },
    standardErrorNull: near(expected.se0),
    observed: near(expected.observedAgreement),
    expected: near(expected.expectedAgreement),
  };
}

function indicesLike(expected: { kappaMax: number; pabak: number; prevalenceIndex: number; biasIndex: number }) {
  return {
    maximum: near(expected.kappaMax),
    pabak: near(expected.pabak),
    prevalenceIndex: near(expected.prevalenceIndex),
    biasIndex: near(expected.biasIndex),
  };
}

describe("cohenKappa against published values", () => {
  it.each(["unweighted", "linear", "quadratic"] as const)("reproduces Fleiss, Cohen & Everitt 1969, %s", (name) => {
    const weights = name === "unweighted" ? "none" : name;
    expect(cohenKappa(everitt.data.table, { weights })).toMatchObject(kappaLike(everitt.expected[name]));
    expect(cohenKappa(vision.data.table, { weights })).toMatchObject(kappaLike(vision.expected[name]));
    expect(cohenKappa(abstractors.data.table, { weights })).toMatchObject(kappaLike(abstractors.expected.kappa[name]));
    expect(cohenKappa(diagnosis.data.table, { weights })).toMatchObject(kappaLike(diagnosis.expected.kappa[name]));
  });

  it("gives the kappas printed in the papers", () => {
    // 0.429 Fleiss, Cohen & Everitt 1969 (from memory); 0.7964094 Gwet's table in irrCAC; 0.492 Cohen 1968.
    expect(cohenKappa(everitt.data.table)).toMatchObject({ kappa: { estimate: near(0.429, 0, 5e-4) } });
    expect(cohenKappa(abstractors.data.table)).toMatchObject({
      kappa: { estimate: near(0.7964094, 0, 5e-8), standardError: near(0.05891072, 0, 5e-9) },
    });
    expect(cohenKappa(countsOf(cohen1968.data))).toMatchObject({ kappa: { estimate: near(0.492, 0, 5e-4) } });
  });

  it("reproduces Cohen's example of 1968, unweighted", () => {
    expect(cohenKappa(countsOf(cohen1968.data))).toMatchObject(kappaLike(cohen1968.expected.unweighted));
  });

  it("gives the largest kappa that the margins allow", () => {
    expect(cohenKappa(everitt.data.table)).toMatchObject({ maximum: near(everitt.expected.kappaMax) });
    expect(cohenKappa(vision.data.table)).toMatchObject({ maximum: near(vision.expected.kappaMax) });
  });

  it.each(twoByTwo.data.cases)("gives kappa and its indices for the 2 × 2 table $id", ({ id, table }) => {
    const expected = Object.entries(twoByTwo.expected.cases).find(([name]) => name === id)?.[1];
    if (!expected) throw new Error(`no expected values for ${id}`);
    const result = cohenKappa(table);
    expect(result).toMatchObject({ ...kappaLike(expected.unweighted), ...indicesLike(expected) });
    // Byrt, Bishop & Carlin 1993: kappa follows from pabak, prevalence and bias.
    expect(result).toMatchObject({ kappa: { estimate: near(expected.kappaFromPabak) } });
  });

  it.each(paradox.data.cases)("reproduces Feinstein & Cicchetti's $id", ({ id, table }) => {
    const expected = Object.entries(paradox.expected.cases).find(([name]) => name === id)?.[1];
    const printed = Object.entries(paradox.published).find(([name]) => name === id)?.[1];
    if (!expected || !printed) throw new Error(`no expected values for ${id}`);
    const result = cohenKappa(table);
    expect(result).toMatchObject({ ...kappaLike(expected.unweighted), ...indicesLike(expected) });
    expect(result).toMatchObject({
      kappa: { estimate: near(printed.kappa, 0, 5e-3) },
      observed: near(printed.observedAgreement, 0, 5e-3),
    });
  });

  it.each([
    ["kappa12", 0, 1],
    ["kappa13", 0, 2],
    ["kappa23", 1, 2],
  ] as const)("reproduces %s of the anxiety ratings from the readings themselves", (pair, first, second) => {
    const { ratings, categories } = anxiety.data;
    const column = (rater: number) => ratings.map((row) => row[rater] ?? null);
    const table = crossTable(column(first), column(second), categories);
    if (!table.ok) throw new Error(table.reason);
    const expected = anxiety.expected[pair];
    expect(cohenKappa(table.counts)).toMatchObject({
      ...kappaLike(expected.unweighted),
      maximum: near(expected.kappaMax),
    });
    expect(cohenKappa(table.counts, { weights: "linear" })).toMatchObject(kappaLike(expected.linear));
    expect(cohenKappa(table.counts, { weights: "quadratic" })).toMatchObject(kappaLike(expected.quadratic));
  });

  it("keeps pabak and the maximum for unweighted kappa, and the indices for two categories", () => {
    const weighted = cohenKappa(everitt.data.table, { weights: "linear" });
    expect(weighted).not.toHaveProperty("maximum");
    expect(weighted).not.toHaveProperty("pabak");
    expect(cohenKappa(everitt.data.table)).not.toHaveProperty("biasIndex");
    // Byrt et al.'s pabak for more categories, (q·observed − 1)/(q − 1): observed 0.7, q 3.
    expect(cohenKappa(everitt.data.table)).toMatchObject({ pabak: near(0.55) });
  });

  it("widens the interval with the confidence asked for", () => {
    // Normal quantile 2.575829303548901 (0.995), from R qnorm.
    const { kappa, se } = everitt.expected.unweighted;
    expect(cohenKappa(everitt.data.table, { confidence: 0.99 })).toMatchObject({
      kappa: { low: near(kappa - 2.575829303548901 * se), high: near(kappa + 2.575829303548901 * se) },
    });
  });
});

describe("cohenKappa at the edges", () => {
  const tableOf = (id: string) => {
    const found = edgeCases.data.cases.find((entry) => entry.id === id);
    return found?.table ?? [];
  };

  it("says that one category only cannot give kappa", () => {
    const refusal = { ok: false, n: 12, reason: "one category only" };
    expect(cohenKappa(tableOf("kappaBothRatersConstant"))).toEqual(refusal);
    expect(cohenKappa([[12]])).toEqual(refusal);
    expect(cohenKappa([[12]], { weights: "quadratic" })).toEqual(refusal);
    expect(cohenKappa(counts("0 0 0 | 0 7 0 | 0 0 0"), { weights: "linear" })).toMatchObject({ ok: false, n: 7 });
  });

  it("gives 0 with standard error 0 for two constant raters who differ", () => {
    for (const weights of ["none", "linear", "quadratic"] as const) {
      expect(cohenKappa(tableOf("kappaConstantAndDifferent"), { weights })).toMatchObject({
        ok: true,
        n: 9,
        kappa: { estimate: 0, standardError: 0, low: 0, high: 0 },
        standardErrorNull: 0,
        observed: 0,
        expected: 0,
      });
    }
  });

  it("gives exactly 0 and no spread when one rater is constant", () => {
    expect(cohenKappa(counts("20 0 | 5 0"))).toMatchObject({ kappa: { estimate: 0, standardError: 0 }, maximum: 0 });
    expect(cohenKappa(counts("7 0 0 | 11 0 0 | 13 0 0"))).toMatchObject({
      kappa: { estimate: 0, standardError: 0 },
      standardErrorNull: 0,
    });
    // Here thirds and ninths of weights leave a last digit, which must be taken for rounding.
    for (const table of [
      counts("0 0 0 0 | 6 27 77 37 | 0 0 0 0 | 0 0 0 0"),
      counts("0 0 0 8 | 0 0 0 62 | 0 0 0 24 | 0 0 0 5"),
    ]) {
      for (const weights of ["linear", "quadratic"] as const) {
        expect(cohenKappa(table, { weights })).toMatchObject({
          kappa: { estimate: 0, standardError: 0, low: 0, high: 0 },
          standardErrorNull: 0,
        });
      }
    }
  });

  it("says that a table without counts has nothing to compare", () => {
    const refusal = { ok: false, n: 0, reason: "no case was read by both" };
    expect(cohenKappa([])).toEqual(refusal);
    expect(cohenKappa(counts("0 0 | 0 0"))).toEqual(refusal);
  });

  it("answers for two cases, and leaves the interval out for one", () => {
    expect(cohenKappa(counts("1 0 | 0 1"))).toMatchObject({
      n: 2,
      kappa: { estimate: 1, standardError: 0, low: 1, high: 1 },
    });
    expect(cohenKappa(counts("0 1 | 1 0"))).toMatchObject({ n: 2, kappa: { estimate: -1 }, pabak: -1 });
    expect(cohenKappa(counts("0 1 | 0 0"))).toMatchObject({ n: 1, kappa: { estimate: 0, standardError: 0 } });
    expect(cohenKappa(counts("0 1 | 0 0"))).not.toHaveProperty("kappa.low");
  });

  it("is not moved by a category that nobody used, unless weights count the steps", () => {
    const wide = counts("5 2 0 | 1 6 0 | 0 0 0");
    const narrow = counts("5 2 | 1 6");
    const { kappa, standardErrorNull } = expectOk(cohenKappa(narrow));
    expect(cohenKappa(wide)).toMatchObject({ kappa: nearEstimate(kappa), standardErrorNull: near(standardErrorNull) });
    // By hand: 3 of 14 are one step of two apart, which is half a disagreement each.
    expect(cohenKappa(wide, { weights: "linear" })).toMatchObject({
      kappa: nearEstimate(kappa),
      observed: near(12.5 / 14),
    });
  });

  it("takes a category that only one rater uses", () => {
    // By hand: 6 of 10 agree, chance 0.6·0.6 + 0.3·0 + 0.1·0.4 = 0.4, kappa 1/3.
    expect(cohenKappa(counts("5 0 1 | 1 0 2 | 0 0 1"))).toMatchObject({
      observed: near(0.6),
      expected: near(0.4),
      kappa: { estimate: near(1 / 3) },
    });
  });
});

describe("cohenKappa refuses the caller's mistakes", () => {
  it.each([
    ["a table that is not square", counts("1 2 3 | 4 5 6")],
    ["ragged rows", counts("1 2 | 3")],
    ["a row too few", [[1, 2]]],
    ["no columns", [[]]],
    ["a negative count", counts("1 -1 | 1 1")],
    ["a count that is not whole", counts("1 0.5 | 1 1")],
    ["a count that is no number", counts("1 NaN | 1 1")],
    ["an endless count", counts("1 Infinity | 1 1")],
  ])("%s", (_, table) => {
    expect(() => cohenKappa(table)).toThrow(InputError);
  });

  it("weights that do not exist", () => {
    const weights = JSON.parse('"cubic"'); // what comes from outside has no type to stop it
    expect(() => cohenKappa([[1]], { weights })).toThrow(InputError);
  });

  it.each([0, 1, -0.5, 95, Number.NaN])("confidence %s", (confidence) => {
    expect(() => cohenKappa([[1]], { confidence })).toThrow(InputError);
  });
});

function expectOk(result: ReturnType<typeof cohenKappa>) {
  if (!result.ok) throw new Error(result.reason);
  return result;
}

function countsOf({ proportions, n }: { proportions: number[][]; n: number }): number[][] {
  return proportions.map((row) => row.map((share) => Math.round(share * n)));
}
