import { type CountTable, columnSums, dot, sum } from "./count-tables";

/** What kappa and its two large-sample variances are made of, for one table. */
export type KappaMoments = {
  /** Weighted disagreement seen, and expected of raters who agree by chance alone: 1 less the usual agreements. */
  observed: number;
  expected: number;
  /** n times the variance of kappa, not assuming that kappa is 0: for intervals. */
  variance: number;
  /** n times the variance of kappa when it is 0: for tests. */
  varianceNull: number;
};

/**
 * The disagreements behind weighted kappa = 1 − observed/expected, and its variances by the delta method.
 *
 * Shape: `cells[row][column]` as counts with `total` their sum, or as proportions with total 1; `disagreements` is
 * symmetric, of the same size, 0 on the diagonal (1 less the agreement weight): in these terms no digits are lost as
 * agreement nears 1. Variances are null where chance agreement is complete, and kappa 0/0.
 * Source: Fleiss, Cohen & Everitt, Psychological Bulletin 1969; 72: 323-327.
 */
export function kappaMoments(cells: CountTable, total: number, disagreements: CountTable): KappaMoments | null {
  const shares = cells.map((row) => row.map((count) => count / total));
  const rows = shares.map(sum);
  const columns = columnSums(shares);
  const rowMeans = disagreements.map((row) => dot(row, columns));
  const columnMeans = disagreements.map((row) => dot(row, rows));
  const observed = sum(shares.map((row, i) => dot(row, disagreements[i] ?? [])));
  const expected = dot(rows, rowMeans);
  if (expected === 0) return null;

  const chance = rows.map((row) => columns.map((column) => row * column));
  const meanOf = (i: number, j: number) => (rowMeans[i] ?? 0) + (columnMeans[j] ?? 0);
  const weightOf = (i: number, j: number) => disagreements[i]?.[j] ?? 0;
  // Each cell's influence on kappa; the mean over the table is known, so one pass gives the variance.
  const variance = spread(shares, observed * expected, (i, j) => observed * meanOf(i, j) - expected * weightOf(i, j));
  const varianceNull = spread(chance, expected, (i, j) => meanOf(i, j) - weightOf(i, j));
  return { observed, expected, variance: variance / expected ** 4, varianceNull: varianceNull / expected ** 2 };
}

function spread(shares: number[][], mean: number, influence: (i: number, j: number) => number): number {
  let squares = 0;
  shares.forEach((row, i) => {
    row.forEach((share, j) => {
      if (share > 0) squares += share * (influence(i, j) - mean) ** 2;
    });
  });
  // Below this the spread is rounding: raters who are both constant have exactly none.
  return squares < 1e-12 * (squares + mean ** 2) ? 0 : squares;
}
