import { sum } from "simple-statistics";
import { addAt, addOuter, type Matrix, zeroMatrix } from "./matrix";

/** A factor of the model: how many levels it has, and the level of each value by number from 0. */
export type Factor = { count: number; codes: readonly number[] };

/** What the values of a level of the first factor share: their number, mean, and mix of the other factors' levels. */
export type FirstLevel = { count: number; mean: number; mix: Float64Array };

export type ReducedEquations = {
  levels: FirstLevel[];
  /** For each other factor, the column of each value's level. */
  columns: number[][];
  matrix: Matrix;
  right: Float64Array;
};

/** Normal equations of an additive model for the effects of the other factors, with the first factor eliminated. */
export function reduceEquations(values: readonly number[], first: Factor, others: readonly Factor[]): ReducedEquations {
  const size = startOf(others, others.length);
  const columns = others.map(({ codes }, factor) => {
    const start = startOf(others, factor);
    return codes.map((code) => start + code);
  });
  const levels = levelsOf(values, first, columns, size);
  const matrix = zeroMatrix(size);
  const right = new Float64Array(size);
  values.forEach((value, i) => {
    const apart = value - (levels[first.codes[i] ?? 0]?.mean ?? 0);
    for (const column of columns) {
      const row = column[i] ?? 0;
      addAt(right, row, apart);
      for (const other of columns) addAt(matrix[row], other[i] ?? 0, 1);
    }
  });
  for (const { count, mix } of levels) addOuter(matrix, mix, -count);
  return { levels, columns, matrix, right };
}

/** Where a factor's block begins among the columns of all. */
export function startOf(factors: readonly Factor[], index: number): number {
  return sum(factors.slice(0, index).map(({ count }) => count));
}

function levelsOf(values: readonly number[], first: Factor, columns: number[][], size: number): FirstLevel[] {
  const levels = Array.from({ length: first.count }, () => ({ count: 0, mean: 0, mix: new Float64Array(size) }));
  values.forEach((value, i) => {
    const level = levels[first.codes[i] ?? 0];
    if (!level) return;
    level.count += 1;
    level.mean += (value - level.mean) / level.count;
    for (const column of columns) addAt(level.mix, column[i] ?? 0, 1);
  });
  for (const level of levels) level.mix = level.mix.map((count) => count / level.count);
  return levels;
}
