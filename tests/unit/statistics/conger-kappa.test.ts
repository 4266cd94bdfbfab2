import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { congerKappa } from "@/lib/statistics/conger-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { InputError } from "@/lib/statistics/result";
// Fleiss 1971, as arranged per rater in the R package irr, which prints 0.442.
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
// Gwet 2014, missing ratings; 0.76282 printed in the documentation of irrCAC, the other recomputed with R.
import missing from "../../reference/gwet-raw-4raters-missing.json";
import fiveObservers from "../../reference/gwet-raw-5observers-missing.json";
// R package irrCAC, data x.raw10x4; computed with R.
import tenByFour from "../../reference/gwet-raw-10x4.json";
import { arbitraryRatings, freeze, rename } from "./arbitrary-ratings";
import { ratings } from "./grid";
import { near } from "./near";

describe("congerKappa", () => {
  it.each([
    ["Fleiss 1971", psychiatric.data.ratings, psychiatric.expected.conger.value],
    ["ten subjects and four raters", tenByFour.data.ratings, tenByFour.expected.unweighted.conger.value],
    ["four raters with missing ratings", missing.data.ratings, missing.expected.unweighted.conger.value],
    ["five observers with many missing", fiveObservers.data.ratings, fiveObservers.expected.unweighted.conger.value],
  ])("reproduces %s, without an interval", (_, rows, value) => {
    expect(congerKappa(rows)).toEqual({ ok: true, n: rows.length, kappa: { estimate: near(value) } });
  });

  it("gives the figures as printed", () => {
    expect(congerKappa(psychiatric.data.ratings)).toMatchObject({ kappa: { estimate: near(0.442, 0, 5e-4) } });
    expect(congerKappa(missing.data.ratings)).toMatchObject({
      kappa: { estimate: near(missing.published.conger, 0, 5e-6) },
    });
  });

  it("is Cohen's kappa for two raters without gaps", () => {
    fc.assert(
      fc.property(arbitraryRatings({ raters: 2, missing: false }), (rows) => {
        const conger = congerKappa(freeze(rows));
        const table = crossTable(
          rows.map(([a = null]) => a),
          rows.map(([, b = null]) => b),
        );
        const cohen = table.ok ? cohenKappa(table.counts) : table;
        if (!cohen.ok) expect(conger).toEqual(cohen);
        else expect(conger).toEqual({ ok: true, n: rows.length, kappa: { estimate: near(cohen.kappa.estimate) } });
      }),
    );
  });

  it("takes chance from the mean over all pairs of raters, each with the rater's own readings", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const result = congerKappa(rows);
        const paired = rows.map((row) => row.filter((rating) => rating !== null)).filter((row) => row.length > 1);
        const columns = [0, 1, 2, 3].map((rater) => rows.map((row) => row[rater] ?? null).filter((r) => r !== null));
        const present = columns.filter((column) => column.length > 0);
        const share = (column: number[], value: number) => column.filter((r) => r === value).length / column.length;
        const pairs = present.flatMap((a, i) => present.slice(i + 1).map((b) => [a, b] as const));
        const chances = pairs.map(([a, b]) =>
          [1, 2, 3, 4].reduce((sum, value) => sum + share(a, value) * share(b, value), 0),
        );
        const observed = mean(
          paired.map((row) => mean(row.flatMap((a, i) => row.toSpliced(i, 1).map((b) => (a === b ? 1 : 0))))),
        );
        const expected = mean(chances);
        if (!result.ok) expect(paired.length === 0 || Math.abs(expected - 1) < 1e-12).toBe(true);
        else expect(result.kappa.estimate).toEqual(near((observed - expected) / (1 - expected)));
      }),
    );
  });

  it("is not changed by the order of raters, by names, by an empty rater or by empty subjects", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const plain = congerKappa(rows);
        const others = [
          congerKappa(rows.map((row) => row.toReversed())),
          congerKappa(rename(rows)),
          congerKappa([...rows.map((row) => [null, ...row]), [], [null]]),
        ];
        const same = plain.ok ? { ok: true, n: plain.n, kappa: { estimate: near(plain.kappa.estimate) } } : plain;
        expect(others).toEqual([same, same, same]);
      }),
    );
  });

  it("is 1 on perfect agreement of twelve raters in two categories, 0 for constant raters who differ", () => {
    expect(congerKappa([new Array(12).fill("a"), new Array(12).fill("b")])).toMatchObject({ kappa: { estimate: 1 } });
    expect(
      congerKappa([
        ["a", "b"],
        ["a", "b"],
      ]),
    ).toEqual({ ok: true, n: 2, kappa: { estimate: 0 } });
  });

  it("says why it has no kappa", () => {
    expect(congerKappa([])).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(congerKappa(ratings(". . | . ."))).toEqual({ ok: false, n: 0, reason: "no ratings" });
    expect(congerKappa(ratings("1 . | . 2"))).toEqual({ ok: false, n: 2, reason: "no subject was rated twice" });
    expect(congerKappa(ratings("1 1 | 1 1 | 1 ."))).toEqual({ ok: false, n: 3, reason: "one category only" });
  });

  it("refuses labels that are no labels", () => {
    expect(() => congerKappa([[1, Number.NaN]])).toThrow(InputError);
    expect(() => congerKappa(JSON.parse("[[1, {}]]"))).toThrow(InputError);
  });
});

function mean(values: number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}
