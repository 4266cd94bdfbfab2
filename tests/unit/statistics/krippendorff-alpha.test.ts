import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { krippendorffAlpha } from "@/lib/statistics/krippendorff-alpha";
import { InputError } from "@/lib/statistics/result";
// Constructed; computed with R from the formulas.
import edgeCases from "../../reference/edge-cases.json";
// Fleiss 1971; alpha recomputed with R.
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
// Gwet 2014: alpha printed in the documentation of irrCAC for the first, recomputed with R for the others.
import fifteen from "../../reference/gwet-counts-6raters-15subjects.json";
import fourRaters from "../../reference/gwet-raw-4raters-missing.json";
import fiveObservers from "../../reference/gwet-raw-5observers-missing.json";
import tenByFour from "../../reference/gwet-raw-10x4.json";
// R package irr, artificial data; computed with R.
import anxiety from "../../reference/irr-anxiety.json";
import video from "../../reference/irr-video.json";
// Krippendorff 2011, sections C and D: 4 observers, 12 units, missing values.
import krippendorff from "../../reference/krippendorff-4x12.json";
import { arbitraryRatings, freeze, rename } from "./arbitrary-ratings";
import { ratings } from "./grid";
import { near } from "./near";

type Expected = { units: number; pairableValues: number; Do: number; De: number; alpha: number };

function alphaLike(expected: Expected) {
  return {
    ok: true,
    n: expected.units,
    alpha: { estimate: near(expected.alpha) },
    observedDisagreement: near(expected.Do),
    expectedDisagreement: near(expected.De),
    pairable: expected.pairableValues,
  };
}

const metrics = ["nominal", "ordinal", "interval"] as const;
const nominal = { metric: "nominal" } as const;

describe("krippendorffAlpha against published values", () => {
  it.each(metrics)("reproduces Krippendorff's example, %s", (metric) => {
    const result = krippendorffAlpha(krippendorff.data.ratings, { metric });
    expect(result).toMatchObject(alphaLike(krippendorff.expected[metric]));
    expect(result).toMatchObject({ alpha: { estimate: near(krippendorff.published[metric], 0, 5e-4) } });
  });

  it.each(metrics)("reproduces the recomputed tables, complete and with gaps, %s", (metric) => {
    for (const { data, expected } of [tenByFour, fourRaters, fiveObservers]) {
      expect(krippendorffAlpha(data.ratings, { metric })).toMatchObject(alphaLike(expected.krippendorff[metric]));
    }
    expect(krippendorffAlpha(anxiety.data.ratings, { metric })).toMatchObject(
      alphaLike(anxiety.expected.krippendorff[metric]),
    );
    expect(krippendorffAlpha(video.data.ratings, { metric })).toMatchObject(
      alphaLike(video.expected.krippendorff[metric]),
    );
  });

  it("reproduces nominal alpha of Fleiss 1971, whole and its first 15 patients as irrCAC prints it", () => {
    const six = krippendorffAlpha(psychiatric.data.ratings, nominal);
    expect(six).toMatchObject(alphaLike(psychiatric.expected.krippendorff.nominal));
    const laidOut = fifteen.data.counts.map((row) => row.flatMap((count, i) => new Array<number>(count).fill(i)));
    const result = krippendorffAlpha(laidOut, nominal);
    expect(result).toMatchObject(alphaLike(fifteen.expected.krippendorff.nominal));
    expect(result).toMatchObject({ alpha: { estimate: near(fifteen.published.alpha, 0, 5e-8) } });
  });
});

describe("krippendorffAlpha at the edges", () => {
  it("says why it has no alpha", () => {
    const alike = edgeCases.data.cases.find(({ id }) => id === "alphaOneValue")?.ratings ?? [];
    for (const metric of metrics) {
      expect(krippendorffAlpha(alike, { metric })).toEqual({ ok: false, n: 4, reason: "one category only" });
      // A tenth has no exact binary form: the refusal must not hang on rounding.
      expect(
        krippendorffAlpha(
          [
            [0.1, 0.1, 0.1],
            [0.1, 0.1],
          ],
          { metric },
        ),
      ).toMatchObject({ ok: false, n: 2 });
      const noPair = { ok: false, n: 0, reason: "no unit was rated twice" };
      expect(krippendorffAlpha([], { metric })).toEqual(noPair);
      expect(krippendorffAlpha(ratings("1 . | . 2 | . ."), { metric })).toEqual(noPair);
    }
  });

  it("takes numbers that differ by rounding alone for the same measurement", () => {
    const noisy = [
      [0.3, 0.1 + 0.2],
      [0.1 + 0.2, 0.3],
    ];
    expect(krippendorffAlpha(noisy, { metric: "interval" })).toEqual({ ok: false, n: 2, reason: "one category only" });
  });

  it("is not moved by a label that only lone ratings have", () => {
    // The lone 9 stands in no pair; with it in the margins alpha would differ.
    expect(krippendorffAlpha(ratings("1 2 | 2 2 | 9 ."), nominal)).toEqual(
      krippendorffAlpha(ratings("1 2 | 2 2"), nominal),
    );
  });

  it("can be below 0, as when two raters always differ", () => {
    // By hand: every pair differs, Do 1; margins 2 and 2, De 8/12; alpha 1 − 1/(2/3).
    expect(krippendorffAlpha(ratings("1 2 | 2 1"), nominal)).toMatchObject({ n: 2, alpha: { estimate: near(-0.5) } });
  });

  it("is exactly 1 on perfect agreement, for numbers without an exact binary form too", () => {
    for (const metric of metrics) {
      expect(krippendorffAlpha([[0.1, 0.1, 0.1], [0.7, 0.7], [0.3]], { metric })).toMatchObject({
        n: 2,
        alpha: { estimate: 1 },
        observedDisagreement: 0,
      });
    }
  });

  it("takes words and ragged rows", () => {
    expect(krippendorffAlpha([["a", "b"], ["b", "b", "b"], ["a"]], nominal)).toEqual(
      krippendorffAlpha(ratings("1 2 . | 2 2 2 | 1 . ."), nominal),
    );
  });
});

describe("krippendorffAlpha with resampled units", () => {
  const { ratings: example } = krippendorff.data;
  const bootstrap = { resamples: 400, seed: 7 };

  it("has no interval unless one is asked for", () => {
    const plain = krippendorffAlpha(example, nominal);
    expect(plain).not.toHaveProperty("alpha.low");
    expect(plain).not.toHaveProperty("leftOut");
  });

  it("gives the same interval for the same seed and another one for another", () => {
    const options = { metric: "ordinal", bootstrap } as const;
    const first = krippendorffAlpha(example, options);
    expect(first).toMatchObject(alphaLike(krippendorff.expected.ordinal));
    expect(krippendorffAlpha(example, options)).toEqual(first);
    const other = krippendorffAlpha(example, { metric: "ordinal", bootstrap: { resamples: 400, seed: 8 } });
    expect(other).not.toEqual(first);
  });

  it("narrows with less confidence and holds the estimate of these data", () => {
    const wide = expectOk(krippendorffAlpha(example, { metric: "interval", bootstrap })).alpha;
    const narrow = expectOk(krippendorffAlpha(example, { metric: "interval", bootstrap, confidence: 0.5 })).alpha;
    const [low = Number.NaN, high = Number.NaN] = [narrow.low, narrow.high];
    expect(wide.low).toBeLessThan(low);
    expect(low).toBeLessThan(wide.estimate);
    expect(wide.estimate).toBeLessThan(high);
    expect(high).toBeLessThan(wide.high ?? Number.NaN);
  });

  it("takes the interval from alpha of each resample: three units give all 27 of them", () => {
    // By enumeration of A = (1,1), B = (2,2), C = (1,2): AAA and BBB have no alpha; of the other 25, CCC has -2/3,
    // the 6 with two Cs -1/4, the 6 of A and B alone 1. So 5% lies within -1/4 and 95% within 1.
    const result = krippendorffAlpha(ratings("1 1 | 2 2 | 1 2"), {
      metric: "nominal",
      bootstrap: { resamples: 5000, seed: 3 },
      confidence: 0.9,
    });
    expect(result).toMatchObject({ alpha: { high: 1 } });
    const { alpha, leftOut } = expectOk(result);
    expect(alpha.low).toEqual(near(-0.25));
    expect((leftOut ?? 0) / 5000).toBeGreaterThan(0.06);
    expect((leftOut ?? 0) / 5000).toBeLessThan(0.09);
  });

  it("leaves the interval out for one unit", () => {
    const single = krippendorffAlpha(ratings("1 2 2"), { metric: "nominal", bootstrap });
    expect(single).toMatchObject({ n: 1, alpha: { estimate: near(0) } });
    expect(single).not.toHaveProperty("alpha.low");
  });
});

describe("krippendorffAlpha always", () => {
  it.each(metrics)("is what the coincidences of all pairs, counted one by one, give: %s", (metric) => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const result = krippendorffAlpha(freeze(rows), { metric });
        const expected = alphaByPairs(rows, metric);
        if (expected === null) expect(result.ok).toBe(false);
        else expect(result).toMatchObject(alphaLike(expected));
      }),
    );
  });

  it("is not changed by who rated, by unpaired units, or by other names or distances that fit the metric", () => {
    fc.assert(
      fc.property(arbitraryRatings(), (rows) => {
        const alphaOf = (table: Parameters<typeof krippendorffAlpha>[0], metric: (typeof metrics)[number]) => {
          const result = krippendorffAlpha(table, { metric });
          return result.ok ? near(result.alpha.estimate) : result.reason;
        };
        const same = (result: ReturnType<typeof krippendorffAlpha>) =>
          result.ok ? result.alpha.estimate : result.reason;
        const turned = [...rows.map((row) => row.toReversed()), [null, 3, null], []];
        const apply = (change: (rating: number) => number) =>
          rows.map((row) => row.map((rating) => (rating === null ? null : change(rating))));
        expect(same(krippendorffAlpha(rename(rows), nominal))).toEqual(alphaOf(rows, "nominal"));
        expect(same(krippendorffAlpha(apply(Math.exp), { metric: "ordinal" }))).toEqual(alphaOf(rows, "ordinal"));
        expect(
          same(
            krippendorffAlpha(
              apply((x) => 5 - 0.1 * x),
              { metric: "interval" },
            ),
          ),
        ).toEqual(alphaOf(rows, "interval"));
        for (const metric of metrics)
          expect(same(krippendorffAlpha(turned, { metric }))).toEqual(alphaOf(rows, metric));
      }),
    );
  });
});

describe("krippendorffAlpha refuses the caller's mistakes", () => {
  it("labels and options that cannot be meant", () => {
    const metric = JSON.parse('"ratio"'); // what comes from outside has no type to stop it
    expect(() => krippendorffAlpha([[1, 2]], { metric })).toThrow(InputError);
    expect(() => krippendorffAlpha([["a", "b"]], { metric: "ordinal" })).toThrow(InputError);
    expect(() => krippendorffAlpha([[1, 2], ["3"]], { metric: "interval" })).toThrow(InputError);
    expect(() => krippendorffAlpha([[1, Number.NaN]], nominal)).toThrow(InputError);
    expect(() => krippendorffAlpha([[1, Number.POSITIVE_INFINITY]], { metric: "interval" })).toThrow(InputError);
    expect(() => krippendorffAlpha([[1, 2]], { metric: "nominal", confidence: 0 })).toThrow(InputError);
    const bootstrap = (resamples: number, seed: number) =>
      ({ metric: "nominal", bootstrap: { resamples, seed } }) as const;
    expect(() => krippendorffAlpha([[1, 2]], bootstrap(0, 1))).toThrow(InputError);
    expect(() =>
      krippendorffAlpha(
        [
          [1, 2],
          [1, 1],
        ],
        bootstrap(100, 0.5),
      ),
    ).toThrow(InputError);
  });
});

function expectOk(result: ReturnType<typeof krippendorffAlpha>) {
  if (!result.ok) throw new Error(result.reason);
  return result;
}

/** Alpha straight from Krippendorff's definition; written apart from the code under test. Null: 0/0. */
function alphaByPairs(rows: (number | null)[][], metric: (typeof metrics)[number]): Expected | null {
  const units = rows.map((row) => row.filter((rating) => rating !== null)).filter((row) => row.length > 1);
  const values = units.flat();
  const countOf = (value: number) => values.filter((other) => other === value).length;
  const distance = (a: number, b: number) => {
    if (metric === "nominal") return a === b ? 0 : 1;
    if (metric === "interval") return (a - b) ** 2;
    const between = values.filter((value) => value >= Math.min(a, b) && value <= Math.max(a, b)).length;
    return (between - (countOf(a) + countOf(b)) / 2) ** 2;
  };
  const overPairs = (row: number[]) =>
    row.reduce((total, a, i) => row.reduce((sum, b, j) => (i === j ? sum : sum + distance(a, b)), total), 0);
  const pairableValues = values.length;
  const De = overPairs(values) / (pairableValues * (pairableValues - 1));
  if (new Set(values).size < 2) return null;
  const Do = units.reduce((total, row) => total + overPairs(row) / (row.length - 1), 0) / pairableValues;
  return { units: units.length, pairableValues, Do, De, alpha: 1 - Do / De };
}
