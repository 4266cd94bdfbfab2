export type SortValue = string | number | null;
export type Sort = { key: string; direction: "ascending" | "descending" };

type Sortable = { sortValues?: Readonly<Record<string, SortValue>> };

/**
 * Rows in the order asked for; the given array is left alone. Text is compared as people write it ("Case 9" before
 * "Case 10"). A row without a value comes last in both directions, because "too few to say" is not a low number.
 * Equal rows keep the order they came in.
 */
export function sortRows<Row extends Sortable>(rows: readonly Row[], sort: Sort | null): Row[] {
  if (!sort) return [...rows];
  const valueIn = (row: Row): SortValue => row.sortValues?.[sort.key] ?? null;
  const sign = sort.direction === "ascending" ? 1 : -1;
  return [...rows].sort((left, right) => {
    const a = valueIn(left);
    const b = valueIn(right);
    if (a === null || b === null) return Number(a === null) - Number(b === null);
    return sign * compare(a, b);
  });
}

function compare(a: string | number, b: string | number): number {
  if (typeof a === "number" && typeof b === "number") return a - b;
  return String(a).localeCompare(String(b), "en", { numeric: true, sensitivity: "base" });
}

/** What pressing a column's head asks for: rising first, then falling, and so on. */
export function nextSort(current: Sort | null, key: string): Sort {
  const isRising = current?.key === key && current.direction === "ascending";
  return { key, direction: isRising ? "descending" : "ascending" };
}
