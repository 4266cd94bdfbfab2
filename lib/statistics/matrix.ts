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

/** Adds weight·v·vᵀ to a matrix, in place. */
export function addOuter(matrix: Matrix, v: Float64Array, weight: number): void {
  matrix.forEach((row, i) => {
    const factor = weight * at(v, i);
    if (factor !== 0) for (let j = 0; j < v.length; j += 1) addAt(row, j, factor * at(v, j));
  });
}

/** Sum of products over the first `end` places. */
export function dotProduct(first: Float64Array, second: Float64Array, end = first.length): number {
  let sum = 0;
  for (let i = 0; i < end; i += 1) sum += at(first, i) * at(second, i);
  return sum;
}

export function multiply(matrix: Matrix, v: Float64Array): Float64Array {
  return Float64Array.from(matrix, (row) => dotProduct(row, v));
}

/** vᵀ·matrix·v. */
export function quadraticForm(matrix: Matrix, v: Float64Array): number {
  return dotProduct(multiply(matrix, v), v);
}

/**
 * Inverse of a symmetric positive definite matrix by Cholesky's factors; undefined when it is singular to rounding.
 * Takes time cubic in the size; the input is not changed.
 */
export function invertPositive(matrix: Matrix): Matrix | undefined {
  const factor: Float64Array[] = [];
  for (const [i, source] of matrix.entries()) {
    const row = new Float64Array(matrix.length);
    factor.forEach((above, j) => {
      row[j] = (at(source, j) - dotProduct(row, above, j)) / at(above, j);
    });
    const pivot = at(source, i) - dotProduct(row, row, i);
    if (!(pivot > 1e-10 * at(source, i))) return undefined;
    row[i] = Math.sqrt(pivot);
    factor.push(row);
  }
  return matrix.map((_, column) => solveUnit(factor, column));
}

/** One column of the inverse: forwards through the factor from a unit vector, then backwards. */
function solveUnit(factor: Matrix, column: number): Float64Array {
  const solution = new Float64Array(factor.length);
  factor.forEach((row, i) => {
    solution[i] = ((i === column ? 1 : 0) - dotProduct(row, solution, i)) / at(row, i);
  });
  for (let i = factor.length - 1; i >= 0; i -= 1) {
    const row = factor[i];
    const value = at(solution, i) / at(row, i);
    solution[i] = value;
    for (let j = 0; j < i; j += 1) addAt(solution, j, -value * at(row, j));
  }
  return solution;
}
