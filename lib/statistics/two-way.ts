import { mean } from "simple-statistics";
import { sumOfSquares, withoutCancellation, withoutRounding } from "./rounding";

/** Two-way analysis of variance of a full table: sums of squares, and the columns' offsets from the mean of all. */
export type TwoWay = { rows: number; columns: number; residual: number; columnOffsets: number[] };

/** Shape: `table` has one row for each subject and one column for each rater, no gaps, at least one of each. */
export function analyseTwoWay(table: readonly (readonly number[])[]): TwoWay {
  const width = table[0]?.length ?? 0;
  const center = mean(table.flat());
  const rowOffsets = table.map((row) => mean(row) - center);
  const columnOffsets = Array.from({ length: width }, (_, column) => {
    return mean(table.map((row) => row[column] ?? Number.NaN)) - center;
  });
  let residual = 0;
  table.forEach((row, i) => {
    row.forEach((value, j) => {
      residual += (value - center - (rowOffsets[i] ?? 0) - (columnOffsets[j] ?? 0)) ** 2;
    });
  });
  const rows = width * sumOfSquares(rowOffsets);
  const columns = table.length * sumOfSquares(columnOffsets);
  const total = withoutCancellation(rows + columns + residual, sumOfSquares(table.flat()));
  const part = (sum: number) => (total === 0 ? 0 : withoutRounding(sum, total));
  return { rows: part(rows), columns: part(columns), residual: part(residual), columnOffsets };
}
