/** A sum of squares below 1e-12 of the total it is a part of is rounding error, and 0. */
export function withoutRounding(sumOfSquares: number, total: number): number {
  return sumOfSquares < 1e-12 * total ? 0 : sumOfSquares;
}

/**
 * Squared deviations about a mean are 0 when they are rounding error of the numbers they came from: below 1e-24 of the
 * sum of the squared numbers, which is a spread below 1e-12 of their size.
 */
export function withoutCancellation(squaredDeviations: number, sumOfSquaredNumbers: number): number {
  return squaredDeviations < 1e-24 * sumOfSquaredNumbers ? 0 : squaredDeviations;
}

export function sumOfSquares(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value * value, 0);
}
