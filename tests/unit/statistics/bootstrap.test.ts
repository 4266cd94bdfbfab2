import fc from "fast-check";
import { mean, sampleStandardDeviation } from "simple-statistics";
import { describe, expect, it } from "vitest";
import { bootstrapInterval } from "@/lib/statistics/bootstrap";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { InputError } from "@/lib/statistics/result";
// Efron & Tibshirani 1993, chapters 13 and 14, 200,000 resamples in R: differences of Bland & Altman 1986 (Wright minus
// Mini Wright) and the table of Fleiss, Cohen & Everitt 1969; compared there with boot.ci of the R package boot.
import reference from "../../reference/bootstrap-intervals.json";

const { differences, kappaTable } = reference.data;
const drawnDifferences = (indices: readonly number[]) => indices.map((index) => differences[index] ?? Number.NaN);

const kappaPairs = kappaTable.flatMap((row, i) =>
  row.flatMap((count, j) => new Array<[number, number]>(count).fill([i, j])),
);
function kappaOf(indices: readonly number[]): number {
  const counts = kappaTable.map((row) => row.map(() => 0));
  for (const index of indices) {
    const [i, j] = kappaPairs[index] ?? [0, 0];
    const row = counts[i] ?? [];
    row[j] = (row[j] ?? 0) + 1;
  }
  const result = cohenKappa(counts);
  return result.ok ? result.kappa.estimate : Number.NaN;
}

const PUBLISHED = [
  ["meanDifference", differences.length, (indices: readonly number[]) => mean(drawnDifferences(indices))],
  [
    "sdDifference",
    differences.length,
    (indices: readonly number[]) => sampleStandardDeviation(drawnDifferences(indices)),
  ],
  [
    "upperLimit",
    differences.length,
    (indices: readonly number[]) => {
      const drawn = drawnDifferences(indices);
      return mean(drawn) + 1.96 * sampleStandardDeviation(drawn);
    },
  ],
  ["kappaUnweighted", kappaPairs.length, kappaOf],
] as const;

describe("bootstrapInterval", () => {
  it.each(PUBLISHED)(
    "gives both intervals of the reference for %s, within its Monte Carlo error",
    (id, n, statistic) => {
      const resamples = 10_000;
      const expected = reference.expected.cases[id];
      const allowed = (end: keyof typeof expected.monteCarloSeAtB2000) =>
        5 * expected.monteCarloSeAtB2000[end] * Math.sqrt(2000 / resamples);
      const percentile = bootstrapInterval(n, statistic, { resamples, seed: 1986, method: "percentile" });
      const bca = bootstrapInterval(n, statistic, { resamples, seed: 1986, method: "bca" });
      if (!percentile.ok || !bca.ok) throw new Error("refused");
      expect(percentile.estimate).toBeCloseTo(expected.estimate, 10);
      expect(Math.abs((percentile.standardError ?? 0) / expected.bootstrapSe - 1)).toBeLessThan(0.05);
      expect(Math.abs((percentile.low ?? Number.NaN) - expected.percentileLow)).toBeLessThan(allowed("percentileLow"));
      expect(Math.abs((percentile.high ?? Number.NaN) - expected.percentileHigh)).toBeLessThan(
        allowed("percentileHigh"),
      );
      expect(Math.abs((bca.low ?? Number.NaN) - expected.bcaLow)).toBeLessThan(allowed("bcaLow"));
      expect(Math.abs((bca.high ?? Number.NaN) - expected.bcaHigh)).toBeLessThan(allowed("bcaHigh"));
    },
  );

  it("gives the percentiles of a binomial share, which are known exactly", () => {
    const [successes = 0, n = 0] = reference.data.successes;
    const share = (indices: readonly number[]) => indices.filter((index) => index < successes).length / n;
    const { percentileLow, percentileHigh } = reference.expected.cases.proportionExact;
    expect(bootstrapInterval(n, share, { resamples: 5000, seed: 7, method: "percentile" })).toMatchObject({
      estimate: 0.35,
      low: expect.closeTo(percentileLow, 10),
      high: expect.closeTo(percentileHigh, 10),
    });
  });

  it("repeats with the same seed, and not with another", () => {
    const run = (seed: number) => bootstrapInterval(17, PUBLISHED[0][2], { resamples: 200, seed, method: "bca" });
    expect(run(4)).toEqual(run(4));
    expect(run(4)).not.toEqual(run(5));
  });

  it("moves with the values and mirrors with their sign", () => {
    const values = fc.array(fc.integer({ min: -40, max: 40 }), { minLength: 4, maxLength: 12 });
    fc.assert(
      fc.property(
        values,
        fc.integer({ min: -100, max: 100 }),
        fc.constantFrom("percentile", "bca"),
        (data, shift, method) => {
          const meanOf = (change: (value: number) => number) =>
            bootstrapInterval(data.length, (indices) => mean(indices.map((index) => change(data[index] ?? 0))), {
              resamples: 99,
              seed: 3,
              method,
            });
          const [plain, moved, mirrored] = [meanOf((x) => x), meanOf((x) => x + shift), meanOf((x) => -x)];
          if (!plain.ok || !moved.ok || !mirrored.ok) throw new Error("refused");
          expect(moved.low === undefined).toBe(plain.low === undefined);
          if (plain.low === undefined || plain.high === undefined) return;
          expect(moved.low).toBeCloseTo(plain.low + shift, 8);
          expect(moved.high).toBeCloseTo(plain.high + shift, 8);
          expect(mirrored.low).toBeCloseTo(-plain.high, 8);
          expect(mirrored.high).toBeCloseTo(-plain.low, 8);
        },
      ),
    );
  });

  it("is wider at a higher confidence", () => {
    const at = (confidence: number) => {
      const result = bootstrapInterval(17, PUBLISHED[0][2], { resamples: 500, seed: 1, method: "bca", confidence });
      return result.ok ? (result.high ?? 0) - (result.low ?? 0) : Number.NaN;
    };
    expect(at(0.8)).toBeLessThan(at(0.95));
    expect(at(0.95)).toBeLessThan(at(0.99));
  });

  it("counts the resamples that cannot give the statistic instead of dropping them in silence", () => {
    // The share of the first case among the first two: not computable where neither was drawn.
    const shareOfFirst = (indices: readonly number[]) => {
      const early = indices.filter((index) => index < 2);
      return early.filter((index) => index === 0).length / early.length;
    };
    const result = bootstrapInterval(3, shareOfFirst, { resamples: 8000, seed: 2, method: "percentile" });
    if (!result.ok) throw new Error("refused");
    expect(result).toMatchObject({ estimate: 0.5, low: 0, high: 1 });
    expect(result.leftOut / 8000).toBeCloseTo(1 / 27, 2); // (1/3)³: the third case three times
  });

  it.each(["percentile", "bca"] as const)("gives a constant no spread (%s)", (method) => {
    const thirds = (indices: readonly number[]) => mean(indices.map((index) => [0.1, 0.1, 0.1, 0.1][index] ?? 0));
    expect(bootstrapInterval(4, thirds, { resamples: 100, seed: 1, method })).toMatchObject({
      estimate: 0.1,
      standardError: expect.closeTo(0, 12),
      low: expect.closeTo(0.1, 12),
      high: expect.closeTo(0.1, 12),
    });
  });

  it("leaves the bca interval out where no correction exists", () => {
    const options = { resamples: 100, seed: 1, method: "bca" } as const;
    const isComplete = (indices: readonly number[]) => (new Set(indices).size === 40 ? 1 : 0); // no resample ever is
    expect(bootstrapInterval(40, isComplete, options)).not.toHaveProperty("low");
    const needsAll = (indices: readonly number[]) => (indices.length < 5 ? Number.NaN : mean([...indices]));
    const withoutJackknife = bootstrapInterval(5, needsAll, options);
    expect(withoutJackknife).toMatchObject({ ok: true, estimate: 2 });
    expect(withoutJackknife).not.toHaveProperty("low");
  });

  it("refuses no cases, and a statistic that all cases cannot give", () => {
    const options = { resamples: 10, seed: 1, method: "percentile" } as const;
    expect(bootstrapInterval(0, () => 1, options)).toEqual({ ok: false, n: 0, reason: "no cases" });
    expect(bootstrapInterval(3, () => Number.NaN, options)).toMatchObject({ ok: false, n: 3 });
    expect(bootstrapInterval(1, () => 5, options)).toEqual({ ok: true, n: 1, estimate: 5, leftOut: 0 });
  });

  it.each([
    ["no resamples", 3, { resamples: 0, seed: 1, method: "bca" }],
    ["half a resample", 3, { resamples: 1.5, seed: 1, method: "bca" }],
    ["a seed below 0", 3, { resamples: 10, seed: -1, method: "bca" }],
    ["half a case", 2.5, { resamples: 10, seed: 1, method: "bca" }],
    ["a confidence of 95", 3, { resamples: 10, seed: 1, method: "bca", confidence: 95 }],
  ] as const)("throws on %s", (_, n, options) => {
    expect(() => bootstrapInterval(n, () => 1, options)).toThrow(InputError);
  });

  it("throws on an unknown method", () => {
    const options = { resamples: 10, seed: 1, method: "bca" as const };
    expect(() => bootstrapInterval(3, () => 1, Object.assign(options, { method: "normal" }))).toThrow(InputError);
  });
});
