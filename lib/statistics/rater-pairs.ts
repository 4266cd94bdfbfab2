import type { FlatTable } from "./kappa-moments";
import type { CodedRatings } from "./labels";

/** How many subjects two or more have rated. */
export function countPaired({ codes }: CodedRatings): number {
  return codes.filter((row) => row.filter((code) => code >= 0).length >= 2).length;
}

/** Counts the pairs of labels of two raters into one table, the same one each time: it is read before the next pair. */
export function pairCounter({
  categories,
  codes,
  raterCount,
}: CodedRatings): (first: number, second: number) => FlatTable {
  const size = categories.length;
  const cells = new Float64Array(size * size);
  const raters = Array.from({ length: raterCount }, (_, rater) => Int32Array.from(codes, (row) => row[rater] ?? -1));
  return (first, second) => {
    const rows = raters[first] ?? new Int32Array();
    const columns = raters[second] ?? new Int32Array();
    cells.fill(0);
    for (let subject = 0; subject < codes.length; subject += 1) {
      const row = rows[subject] ?? -1;
      const column = columns[subject] ?? -1;
      if (row >= 0 && column >= 0) cells[row * size + column] = (cells[row * size + column] ?? 0) + 1;
    }
    return { size, cells };
  };
}
