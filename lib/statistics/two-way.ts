import { mean } from "simple-statistics";
import { sumOfSquares, withoutCancellation, withoutRounding } from "./rounding";

/** Two-way analysis of variance of a full table: sums of squares, and the columns' offsets from the mean of all. */
export type TwoWay = { rows: number; columns: number; residual: number; columnOffsets: number[] };

/** Shape: `table` has one row for each subject and one column for each rater, no gaps, at least one of each. */
export function analyseTwoWay(table: readonly (readonly number[])[]): TwoWay {
  const rowMeans = table.map((row) => mean(row));
  const center = mean(rowMeans);
  const columnOffsets = (table[0] ?? []).map(() => 0);
  for (const row of table) addTo(columnOffsets, row);
  columnOffsets.forEach((total, column) => {
    columnOffsets[column] = total / table.length - center;
  });
  let residual = 0;
  let size = 0;
  table.forEach((row, i) => {
    const rowMean = rowMeans[i] ?? center;
    row.forEach((value, j) => {
      residual += (value - rowMean - (columnOffsets[j] ?? 0)) ** 2;
      size += value ** 2;
    });
  });
  const rows = columnOffsets.length * sumOfSquares(rowMeans.map((rowMean) => rowMean - center));
  const columns = table.length * sumOfSquares(columnOffsets);
  const total = withoutCancellation(rows + columns + residual, size);
  const part = (sum: number) => (total === 0 ? 0 : withoutRounding(sum, total));
  return { rows: part(rows), columns: part(columns), residual: part(residual), columnOffsets };
}

function addTo(sums: number[], row: readonly number[]): void {
  row.forEach((value, column) => {
    sums[column] = (sums[column] ?? 0) + value;
  });
}
