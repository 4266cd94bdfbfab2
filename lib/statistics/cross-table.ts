import { type Label, labelsUsed, positionIn } from "./labels";
import { InputError, type Result, refuse } from "./result";

export type CrossTable = {
  /** `counts[row][column]`: rows are the first readings, columns the second, both in the order of the categories. */
  counts: number[][];
};

/**
 * Counts how often each pair of labels occurs when two examiners (or one examiner twice) read the same cases.
 *
 * Shape: equal-length arrays; index i is the same case in both. A pair with a `null` on either side is dropped.
 * `categories` are all categories offered, in order; left out, they are the labels of the pairs kept, ascending.
 * Throws InputError for unequal lengths and for a label that was not offered, in a dropped pair too.
 */
export function crossTable(
  first: readonly (Label | null)[],
  second: readonly (Label | null)[],
  categories?: readonly Label[],
): Result<CrossTable> {
  if (first.length !== second.length) {
    throw new InputError(`Paired readings need equal lengths; got ${first.length} and ${second.length}.`);
  }
  const bothRead = (_: Label | null, index: number) => first[index] !== null && second[index] !== null;
  const rows = first.filter(bothRead);
  const columns = second.filter(bothRead);
  const offered = categories ?? labelsUsed([...rows, ...columns]);
  const position = positionIn(offered);
  if (categories) for (const label of [...first, ...second]) position(label);

  const counts = offered.map(() => new Array<number>(offered.length).fill(0));
  rows.forEach((label, index) => {
    const row = counts[position(label)];
    const column = position(columns[index] ?? null);
    if (row) row[column] = (row[column] ?? 0) + 1;
  });
  return rows.length > 0 ? { ok: true, n: rows.length, counts } : refuse(0, "no case was read both times");
}
