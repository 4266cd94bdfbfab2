import { withoutRounding } from "./rounding";

/** A square table row after row: the cell of row i and column j is `cells[i * size + j]`. */
export type FlatTable = { size: number; cells: Float64Array };

export function flatten(table: readonly (readonly number[])[]): FlatTable {
  return { size: table.length, cells: Float64Array.from(table.flat()) };
}

/** The disagreements that kappa = 1 − observed/expected compares. */
export type KappaMoments = {
  /** The sum of the cells, of each row and of each column. */
  n: number;
  rows: Float64Array;
  columns: Float64Array;
  /** Weighted disagreement seen, and expected of raters who agree by chance alone: 1 less the usual agreements. */
  observed: number;
  expected: number;
};

/**
 * What kappa is made of, plain or weighted.
 *
 * Shape: counts or proportions; `disagreements` is a table of the same size, symmetric, 0 on the diagonal (1 less the
 * agreement weight). In these terms no digits are lost as agreement nears 1, and `expected` is exactly 0 where both
 * raters used one and the same category. Plain loops over flat tables: a panel of 500 has 125,000 pairs of raters.
 */
export function kappaMoments(table: FlatTable, disagreements: Float64Array): KappaMoments {
  const { n, rows, columns } = margins(table);
  const observed = dot(table.cells, disagreements) / n;
  const expected = dot(rows, disagreementsWith(disagreements, columns)) / (n * n);
  return { n, rows, columns, observed, expected };
}

/**
 * n times the variance of kappa by the delta method: `variance` without assuming that kappa is 0, for intervals, and
 * `varianceNull` when it is, for tests. Only where `expected` is above 0.
 * Source: Fleiss, Cohen & Everitt, Psychological Bulletin 1969; 72: 323-327.
 */
export function kappaVariances(table: FlatTable, disagreements: Float64Array, moments: KappaMoments) {
  const { size, cells } = table;
  const { n, rows, columns, observed, expected } = moments;
  const rowCosts = disagreementsWith(disagreements, columns);
  const columnCosts = disagreementsWith(disagreements, rows);
  // A cell's influence on kappa is a·(row cost + column cost)/n − b·disagreement, with a = observed and b = expected
  // (both 1 under chance), and has a known mean over the table: one pass gives both variances.
  let squares = 0;
  let squaresNull = 0;
  for (let i = 0; i < size; i += 1) {
    const inRow = rows[i] ?? 0;
    if (inRow === 0) continue;
    const rowPart = (rowCosts[i] ?? 0) / n - expected;
    for (let j = 0; j < size; j += 1) {
      const part = rowPart + (columnCosts[j] ?? 0) / n;
      const disagreement = disagreements[i * size + j] ?? 0;
      const influence = observed * part - expected * disagreement;
      squares += (cells[i * size + j] ?? 0) * influence * influence;
      squaresNull += inRow * (columns[j] ?? 0) * (part - disagreement) * (part - disagreement);
    }
  }
  // Raters who are both constant have no spread, but for rounding, around the known means.
  const spread = withoutRounding(squares / n, (observed * expected) ** 2);
  const spreadNull = withoutRounding(squaresNull / (n * n), expected ** 2);
  return { variance: spread / expected ** 4, varianceNull: spreadNull / expected ** 2 };
}

function margins({ size, cells }: FlatTable): Pick<KappaMoments, "n" | "rows" | "columns"> {
  const rows = new Float64Array(size);
  const columns = new Float64Array(size);
  let n = 0;
  for (let i = 0; i < size; i += 1) {
    for (let j = 0; j < size; j += 1) {
      const count = cells[i * size + j] ?? 0;
      n += count;
      rows[i] = (rows[i] ?? 0) + count;
      columns[j] = (columns[j] ?? 0) + count;
    }
  }
  return { n, rows, columns };
}

/** What each category costs against all the counts of the other rater; over n, the 1969 paper's w̄. */
function disagreementsWith(disagreements: Float64Array, counts: Float64Array): Float64Array {
  const size = counts.length;
  const costs = new Float64Array(size);
  for (let i = 0; i < size; i += 1) {
    let cost = 0;
    for (let j = 0; j < size; j += 1) cost += (disagreements[i * size + j] ?? 0) * (counts[j] ?? 0);
    costs[i] = cost;
  }
  return costs;
}

function dot(first: Float64Array, second: Float64Array): number {
  let total = 0;
  for (let index = 0; index < first.length; index += 1) total += (first[index] ?? 0) * (second[index] ?? 0);
  return total;
}
