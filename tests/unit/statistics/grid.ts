/** A table of counts in one line: rows apart by |, as in `counts("5 0 1 | 1 0 2 | 0 0 1")`. */
export function counts(text: string): number[][] {
  return text.split("|").map((row) => row.trim().split(/\s+/).map(Number));
}

/** Ratings in one line, subjects apart by |, a dot where a rating is missing: `ratings("1 1 . | 2 2 3")`. */
export function ratings(text: string): (number | null)[][] {
  return text.split("|").map((row) =>
    row
      .trim()
      .split(/\s+/)
      .map((cell) => (cell === "." ? null : Number(cell))),
  );
}
