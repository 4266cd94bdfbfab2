import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { intraclassCorrelation } from "@/lib/statistics/intraclass-correlation";
import { freeze } from "./arbitrary-ratings";
import { near, nearEstimate } from "./near";

const weighting = fc.constantFrom("none", "linear", "quadratic");

/** Square tables of counts with something in two rows and two columns, so that kappa exists. */
const squareTable = fc
  .integer({ min: 2, max: 5 })
  .chain((size) =>
    fc
      .array(fc.array(fc.nat({ max: 20 }), { minLength: size, maxLength: size }), { minLength: size, maxLength: size })
      .map((table) => table.map((row, i) => row.map((count, j) => (i === j && i < 2 ? count + 1 : count)))),
  );

describe("cohenKappa always", () => {
  it("is 1 without spread on perfect agreement in two or more categories", () => {
    fc.assert(
      fc.property(
        fc.array(fc.integer({ min: 1, max: 50 }), { minLength: 2, maxLength: 12 }),
        weighting,
        (counts, weights) => {
          const table = counts.map((count, i) => counts.map((_, j) => (i === j ? count : 0)));
          expect(cohenKappa(table, { weights })).toMatchObject({
            kappa: { estimate: 1, standardError: 0, low: 1, high: 1 },
            observed: 1,
          });
        },
      ),
    );
  });

  it("is not changed by naming the categories in another order", () => {
    fc.assert(
      fc.property(squareTable, fc.infiniteStream(fc.nat()), (table, numbers) => {
        const order = table.map((_, index) => index).sort(() => (numbers.next().value % 2 === 0 ? 1 : -1));
        const renamed = order.map((i) => order.map((j) => table[i]?.[j] ?? 0));
        const { kappa, standardErrorNull, maximum } = expectOk(cohenKappa(table));
        expect(cohenKappa(renamed)).toMatchObject({
          kappa: nearEstimate(kappa),
          standardErrorNull: near(standardErrorNull),
          maximum: near(maximum ?? Number.NaN),
        });
      }),
    );
  });

  it("is the same weighted as unweighted for two categories", () => {
    fc.assert(
      fc.property(fc.tuple(fc.nat(30), fc.nat(30), fc.nat(30), fc.nat(30)), weighting, ([a, b, c, d], weights) => {
        const table = [
          [a + 1, b],
          [c, d + 1],
        ];
        const { kappa, standardErrorNull } = expectOk(cohenKappa(table));
        expect(cohenKappa(table, { weights })).toMatchObject({
          kappa: nearEstimate(kappa),
          standardErrorNull: near(standardErrorNull),
        });
      }),
    );
  });

  it("is the same whoever is called first, with the bias turned", () => {
    fc.assert(
      fc.property(squareTable, weighting, (table, weights) => {
        const turned = table.map((_, i) => table.map((row) => row[i] ?? 0));
        const { kappa, biasIndex } = expectOk(cohenKappa(table, { weights }));
        const other = expectOk(cohenKappa(turned, { weights }));
        expect(other.kappa).toMatchObject(nearEstimate(kappa));
        if (biasIndex !== undefined) expect(other.biasIndex).toEqual(near(-biasIndex));
      }),
    );
  });

  it("is never above its maximum, and four times the cases halve the standard error", () => {
    fc.assert(
      fc.property(squareTable, weighting, (table, weights) => {
        const small = expectOk(cohenKappa(freeze(table), { weights }));
        const large = expectOk(
          cohenKappa(
            table.map((row) => row.map((count) => 4 * count)),
            { weights },
          ),
        );
        expect(large.kappa.estimate).toEqual(near(small.kappa.estimate));
        expect(large.kappa.standardError).toEqual(near((small.kappa.standardError ?? Number.NaN) / 2));
        expect(large.standardErrorNull).toEqual(near(small.standardErrorNull / 2));
        if (small.maximum !== undefined) expect(small.kappa.estimate).toBeLessThanOrEqual(small.maximum + 1e-12);
      }),
    );
  });

  it("is, with quadratic weights, Lin's concordance of the category numbers, and nears the ICC as cases grow", () => {
    fc.assert(
      fc.property(squareTable, (table) => {
        const rows = table.flatMap((row, i) => row.flatMap((count, j) => new Array<number[]>(count).fill([i, j])));
        const [first, second] = [rows.map(([i = 0]) => i), rows.map(([, j = 0]) => j)];
        const kappa = expectOk(cohenKappa(table, { weights: "quadratic" })).kappa.estimate;
        const meanSquare = mean(rows.map(([i = 0, j = 0]) => (i - j) ** 2));
        const apart = (mean(first) - mean(second)) ** 2;
        // Fleiss & Cohen 1973: 1 less the mean squared difference over what chance would give.
        expect(kappa).toEqual(near(1 - meanSquare / (spread(first) + spread(second) + apart)));
        const icc = (ratings: number[][]) => {
          const result = intraclassCorrelation(ratings);
          if (!result.ok) throw new Error(result.reason);
          return result.icc21?.estimate ?? Number.NaN;
        };
        const copies = (times: number) => Array.from({ length: times }, () => rows).flat();
        expect(Math.abs(kappa - icc(copies(50)))).toBeLessThan(2 / (50 * rows.length));
      }),
      { numRuns: 20 },
    );
  });

  it("has the standard error of the delta method, with slopes taken numerically from the definition", () => {
    fc.assert(
      fc.property(squareTable, weighting, (table, weights) => {
        const n = table.flat().reduce((total, count) => total + count, 0);
        const shares = table.map((row) => row.map((count) => count / n));
        const slopes = shares.map((row, i) => row.map((_, j) => slopeAt(shares, i, j, weights)));
        const mean = sumCells(shares, (share, i, j) => share * at(slopes, i, j));
        const variance = sumCells(shares, (share, i, j) => share * (at(slopes, i, j) - mean) ** 2) / n;
        const { kappa } = expectOk(cohenKappa(table, { weights }));
        expect(kappa.estimate).toEqual(near(definition(shares, weights)));
        expect(kappa.standardError).toEqual(near(Math.sqrt(variance), 1e-5, 1e-6));
      }),
    );
  });
});

function expectOk(result: ReturnType<typeof cohenKappa>) {
  if (!result.ok) throw new Error(result.reason);
  return result;
}

type Weights = "none" | "linear" | "quadratic";

function mean(values: number[]): number {
  return values.reduce((total, value) => total + value, 0) / values.length;
}

function spread(values: number[]): number {
  const center = mean(values);
  return mean(values.map((value) => (value - center) ** 2));
}

/** Kappa straight from its definition, by sums over all cells; written apart from the code under test. */
function definition(cells: number[][], weights: Weights): number {
  const total = sumCells(cells, (share) => share);
  const steps = cells.length - 1;
  const weight = (i: number, j: number) => {
    const apart = Math.abs(i - j) / steps;
    if (weights === "none") return i === j ? 1 : 0;
    return weights === "linear" ? 1 - apart : 1 - apart * apart;
  };
  const row = (i: number) => sumCells(cells, (share, k) => (k === i ? share / total : 0));
  const column = (j: number) => sumCells(cells, (share, _, k) => (k === j ? share / total : 0));
  const observed = sumCells(cells, (share, i, j) => (weight(i, j) * share) / total);
  const expected = sumCells(cells, (_, i, j) => weight(i, j) * row(i) * column(j));
  return (observed - expected) / (1 - expected);
}

function slopeAt(shares: number[][], i: number, j: number, weights: Weights): number {
  const step = 1e-6;
  const moved = (by: number) =>
    shares.map((row, k) => row.map((share, l) => (k === i && l === j ? share + by : share)));
  return (definition(moved(step), weights) - definition(moved(-step), weights)) / (2 * step);
}

function sumCells(cells: number[][], value: (cell: number, i: number, j: number) => number): number {
  return cells.reduce((total, row, i) => row.reduce((running, cell, j) => running + value(cell, i, j), total), 0);
}

function at(cells: number[][], i: number, j: number): number {
  return cells[i]?.[j] ?? Number.NaN;
}
