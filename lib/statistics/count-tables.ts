import { InputError } from "./result";

/** Counts by row and column: of two raters' categories, or of subjects and categories. */
export type CountTable = readonly (readonly number[])[];

/** Throws InputError unless every row has as many columns as the first, and every entry is a whole number from 0. */
export function requireCounts(table: CountTable, name: string): void {
  const width = table[0]?.length ?? 0;
  for (const row of table) {
    if (!Array.isArray(row) || row.length !== width) throw new InputError(`Each row of ${name} has the same columns.`);
    for (const count of row) {
      if (!Number.isInteger(count) || count < 0) {
        throw new InputError(`The counts in ${name} are whole numbers from 0; got ${count}.`);
      }
    }
  }
}

/** Throws InputError unless the table is square as well: the same categories for both raters. */
export function requireSquareCounts(table: CountTable, name: string): void {
  requireCounts(table, name);
  const columns = table[0]?.length ?? 0;
  if (columns !== table.length) {
    throw new InputError(`There is a row and a column in ${name} for each category; got ${table.length} × ${columns}.`);
  }
}

export function sum(values: readonly number[]): number {
  let running = 0;
  for (const value of values) running += value;
  return running;
}

export function columnSums(table: CountTable): number[] {
  const sums = new Array<number>(table[0]?.length ?? 0).fill(0);
  for (const row of table) {
    for (let column = 0; column < sums.length; column += 1) sums[column] = (sums[column] ?? 0) + (row[column] ?? 0);
  }
  return sums;
}

/** Sum of products, position by position: the mean of one row of weights over shares, among others. */
export function dot(first: readonly number[], second: readonly number[]): number {
  let running = 0;
  for (let index = 0; index < first.length; index += 1) running += (first[index] ?? 0) * (second[index] ?? 0);
  return running;
}
