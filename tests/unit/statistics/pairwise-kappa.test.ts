import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { lightKappa } from "@/lib/statistics/light-kappa";
import { pairwiseKappa } from "@/lib/statistics/pairwise-kappa";
import { InputError } from "@/lib/statistics/result";
// Fleiss 1971, as arranged per rater in the R package irr.
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
// R package irrCAC, data x.raw10x4; computed with R.
import tenByFour from "../../reference/gwet-raw-10x4.json";
// R package irr, artificial data; computed with R.
import anxiety from "../../reference/irr-anxiety.json";
import { arbitraryRatings, freeze, rename } from "./arbitrary-ratings";
import { ratings } from "./grid";
import { near, nearEstimate } from "./near";

const references = [
  { name: "Fleiss 1971", ratings: psychiatric.data.ratings, light: psychiatric.expected.light },
  { name: "ten subjects and four raters", ratings: tenByFour.data.ratings, light: tenByFour.expected.light },
  { name: "the anxiety ratings", ratings: anxiety.data.ratings, light: anxiety.expected.light },
];

describe("pairwiseKappa", () => {
  it.each(references)("reproduces every pair's kappa in $name", ({ ratings, light }) => {
    const { matrix, n } = expectOk(pairwiseKappa(ratings));
    expect(n).toBe(ratings.length);
    light.pairs.forEach((pair, index) => {
      const [first = 0, second = 0] = pair.split("-").map((rater) => Number(rater) - 1);
      const kappa = { kappa: { estimate: near(light.pairwiseKappa[index] ?? Number.NaN) } };
      expect(matrix[first]?.[second]).toMatchObject(kappa);
      expect(matrix[second]?.[first]).toMatchObject(kappa);
      expect(matrix[first]?.[first]).toMatchObject({ kappa: { estimate: 1, standardError: 0 } });
    });
  });

  it("reproduces whole results: the anxiety ratings with their errors and intervals", () => {
    const { matrix } = expectOk(pairwiseKappa(anxiety.data.ratings));
    const { unweighted } = anxiety.expected.kappa13;
    expect(matrix[0]?.[2]).toMatchObject({
      n: unweighted.n,
      kappa: { standardError: near(unweighted.se), low: near(unweighted.ciLow), high: near(unweighted.ciHigh) },
      standardErrorNull: near(unweighted.se0),
    });
  });

  it("compares each pair over the subjects that both rated, each entry as the pair alone would give", () => {
    fc.assert(
      fc.property(arbitraryRatings({ raters: 3 }), (rows) => {
        const result = pairwiseKappa(freeze(rows));
        const used = [...new Set(rows.flat().filter((rating) => rating !== null))].sort((a, b) => a - b);
        const paired = rows.filter((row) => row.filter((rating) => rating !== null).length > 1).length;
        if (!result.ok) {
          expect(paired).toBe(0);
          return;
        }
        expect(result.n).toBe(paired);
        for (const first of [0, 1, 2]) {
          for (const second of [0, 1, 2]) {
            const column = (rater: number) => rows.map((row) => row[rater] ?? null);
            const table = crossTable(column(first), column(second), used);
            const alone = table.ok ? cohenKappa(table.counts) : table;
            const entry = result.matrix[first]?.[second];
            if (!alone.ok || !entry?.ok) {
              expect(entry).toMatchObject({ ok: false, n: alone.n });
              continue;
            }
            expect(entry).toMatchObject({
              n: alone.n,
              kappa: nearEstimate(alone.kappa),
              observed: near(alone.observed),
              pabak: near(alone.pabak ?? Number.NaN),
            });
            expect(entry.biasIndex).toEqual(alone.biasIndex);
          }
        }
      }),
    );
  });

  it("keeps the reason of a pair that cannot answer beside the pairs that can", () => {
    const { matrix } = expectOk(pairwiseKappa(ratings("1 1 . | 2 1 . | 2 2 1 | 1 . 1")));
    expect(matrix[0]?.[1]).toMatchObject({ ok: true, n: 3 });
    expect(matrix[1]?.[2]).toMatchObject({ ok: true, n: 1, kappa: { estimate: 0 } });
    expect(matrix[2]?.[2]).toEqual({ ok: false, n: 2, reason: "one category only" });
    const apart = expectOk(pairwiseKappa(ratings("1 2 . | . . 1"))).matrix;
    expect(apart[0]?.[2]).toEqual({ ok: false, n: 0, reason: "no case was read by both" });
  });

  it("takes the interval at the confidence asked for", () => {
    const table = [
      ["a", "a"],
      ["b", "b"],
      ["a", "b"],
      ["b", "b"],
    ];
    const alone = cohenKappa(
      [
        [1, 1],
        [0, 2],
      ],
      { confidence: 0.5 },
    );
    expect(expectOk(pairwiseKappa(table, { confidence: 0.5 })).matrix[0]?.[1]).toEqual(alone);
  });

  it("says that nothing was rated twice", () => {
    const refusal = { ok: false, n: 0, reason: "no subject was rated twice" };
    for (const nothing of [[], [[1], [2]], ratings("1 . | . 2"), ratings(". . | . .")]) {
      expect(pairwiseKappa(nothing)).toEqual(refusal);
      expect(lightKappa(nothing)).toEqual(refusal);
    }
  });

  it("refuses the caller's mistakes", () => {
    expect(() => pairwiseKappa([[1, Number.NaN]])).toThrow(InputError);
    expect(() => pairwiseKappa([[1, 2]], { confidence: 1 })).toThrow(InputError);
    expect(() => lightKappa([[1, Number.POSITIVE_INFINITY]])).toThrow(InputError);
  });
});

describe("lightKappa", () => {
  it.each(references)("reproduces the mean over all pairs in $name", ({ ratings, light }) => {
    expect(lightKappa(ratings)).toEqual({ ok: true, n: ratings.length, kappa: { estimate: near(light.kappa) } });
  });

  it("gives 0.459 for Fleiss 1971, as irr prints it", () => {
    expect(lightKappa(psychiatric.data.ratings)).toMatchObject({
      kappa: { estimate: near(psychiatric.published.light, 0, 5e-4) },
    });
  });

  it("is Cohen's kappa for two raters, and averages 66 pairs of twelve", () => {
    expect(lightKappa(ratings("1 1 | 1 2 | 2 2 | 2 2"))).toEqual({ ok: true, n: 4, kappa: { estimate: near(0.5) } });
    // Eleven raters alike and one the other way round: 55 pairs at 1 and 11 at -1.
    const twelve = [
      [...new Array<number>(11).fill(1), 2],
      [...new Array<number>(11).fill(2), 1],
    ];
    expect(lightKappa(twelve)).toMatchObject({ n: 2, kappa: { estimate: near(44 / 66) } });
  });

  it("is refused, and names the pair, where one pair has no kappa", () => {
    expect(lightKappa(ratings("1 1 1 | 2 1 1 | 1 1 1"))).toEqual({
      ok: false,
      n: 3,
      reason: "raters 2 and 3: one category only",
    });
    expect(lightKappa(ratings("1 2 . | 2 1 . | . . 1"))).toMatchObject({ ok: false, n: 2 });
  });

  it("is not changed by the order of raters, by names, or by subjects with one rating", () => {
    fc.assert(
      fc.property(arbitraryRatings({ missing: false }), (rows) => {
        const plain = lightKappa(rows);
        const turned = lightKappa([...rows.map((row) => row.toReversed()), [null, 1]]);
        const renamed = lightKappa(rename(rows));
        if (plain.ok) {
          const same = { ok: true, n: plain.n, kappa: { estimate: near(plain.kappa.estimate) } };
          expect([turned, renamed]).toEqual([same, same]);
        } else {
          expect([turned.ok, renamed.ok]).toEqual([false, false]);
        }
      }),
    );
  });
});

function expectOk(result: ReturnType<typeof pairwiseKappa>) {
  if (!result.ok) throw new Error(result.reason);
  return result;
}
