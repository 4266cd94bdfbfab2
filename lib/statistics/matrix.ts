/** Rows of a matrix; the numbers of a row lie together, which is what makes the loops below fast. */
export type Matrix = readonly Float64Array[];

export function zeroMatrix(size: number): Matrix {
  return Array.from({ length: size }, () => new Float64Array(size));
}

/** Reads a place that is known to exist. */
export function at(values: Float64Array | undefined, index: number): number {
  return values?.[index] ?? 0;
}

export function addAt(values: Float64Array | undefined, index: number, amount: number): void {
  if (values) values[index] = at(values, index) + amount;
}

/** Adds factor·v to `target`, in place. */
function addMultiple(target: Float64Array, v: Float64Array, factor: number): void {
  for (let i = 0; i < target.length; i += 1) target[i] = (target[i] ?? 0) + factor * (v[i] ?? 0);
}

/** Adds weight·v·vᵀ to a matrix, in place. */
export function addOuter(matrix: Matrix, v: Float64Array, weight: number): void {
  matrix.forEach((row, i) => {
    const factor = weight * at(v, i);
    if (factor !== 0) addMultiple(row, v, factor);
  });
}

export function dotProduct(first: Float64Array, second: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < first.length; i += 1) sum += (first[i] ?? 0) * (second[i] ?? 0);
  return sum;
}

export function multiply(matrix: Matrix, v: Float64Array): Float64Array {
  const product = new Float64Array(matrix.length);
  matrix.forEach((row, i) => {
    product[i] = dotProduct(row, v);
  });
  return product;
}

/**
 * Inverse of a symmetric positive definite matrix; undefined when it is singular to rounding.
 *
 * Gauss-Jordan elimination down the diagonal, whose pivots are positive exactly for such a matrix, so that no rows need
 * to change places. Takes time cubic in the size; the input is not changed.
 */
export function invertPositive(matrix: Matrix): Matrix | undefined {
  const inverse = matrix.map((row) => Float64Array.from(row));
  for (const [k, pivotRow] of inverse.entries()) {
    const pivot = at(pivotRow, k);
    if (!(pivot > 1e-10 * at(matrix[k], k))) return undefined;
    pivotRow[k] = 1;
    for (let j = 0; j < pivotRow.length; j += 1) pivotRow[j] = at(pivotRow, j) / pivot;
    for (const row of inverse) {
      if (row === pivotRow) continue;
      const factor = at(row, k);
      row[k] = 0;
      if (factor !== 0) addMultiple(row, pivotRow, -factor);
    }
  }
  return inverse;
}
