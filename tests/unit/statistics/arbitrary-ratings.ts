import fc from "fast-check";

/** Small tables of subjects × raters over a few numbers, gaps among them, always the same width. */
export function arbitraryRatings({ raters = 4, missing = true }: { raters?: number; missing?: boolean } = {}) {
  const value = fc.integer({ min: 1, max: 4 });
  const rating = missing ? fc.option(value, { freq: 4 }) : value;
  return fc.array(fc.array(rating, { minLength: raters, maxLength: raters }), { minLength: 1, maxLength: 12 });
}

/** The same table with every number under another name; the names' order is not the numbers'. */
export function rename(ratings: (number | null)[][]): (string | null)[][] {
  const names = ["quince", "fig", "medlar", "sloe"];
  return ratings.map((row) => row.map((rating) => (rating === null ? null : (names[rating - 1] ?? null))));
}

/** Ratings of two raters from their table of counts: a subject for each count. */
export function ratingsOfTable<Category>(table: number[][], categories: readonly Category[]): Category[][] {
  return table
    .flatMap((row, i) => row.flatMap((count, j) => Array.from({ length: count }, () => [categories[i], categories[j]])))
    .map((pair) => pair.filter((category) => category !== undefined));
}

/** Freezes a table and its rows, so that a statistic that wrote into its input would throw. */
export function freeze<Row extends object>(table: Row[]): readonly Row[] {
  return Object.freeze(table.map((row) => Object.freeze(row)));
}
