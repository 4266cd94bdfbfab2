import { InputError } from "./result";

/**
 * The value with a `share` (0 to 1) of the others below it: rank share·(n + 1), linear between neighbours, and never
 * beyond the smallest and largest. `sorted` is ascending and not empty; throws InputError if it is empty.
 * Source: Bland & Altman, Statistical Methods in Medical Research 1999; 8: 135-160, section 6.1.
 */
export function percentileSorted(sorted: readonly number[], share: number): number {
  const rank = Math.min(Math.max(share * (sorted.length + 1), 1), sorted.length);
  const below = Math.floor(rank);
  const lower = sorted[below - 1];
  if (lower === undefined) throw new InputError("A percentile needs at least one value.");
  const upper = sorted[below] ?? lower;
  return lower + (rank - below) * (upper - lower);
}
