/** Indices of the categories that occur on at least one side; the rest would be empty rows and columns. */
export function usedCategories(counts: readonly (readonly number[])[]): number[] {
  return counts
    .map((row, i) => ({ i, used: row.some((n) => n > 0) || counts.some((other) => (other[i] ?? 0) > 0) }))
    .filter(({ used }) => used)
    .map(({ i }) => i);
}

/**
 * How strongly a cell is coloured, as the percentage of its colour in the mix with the sheet. It grows with the share
 * of the row. Between the two bands the mix would leave neither ink nor its reverse readable in one of the themes, so
 * it jumps: up to 40 % the text is ink, from 86 % it is reversed.
 */
export function cellMix(share: number, isAgreement: boolean): { percent: number; isReversed: boolean } {
  if (share >= 0.5) return { percent: Math.round(86 + 16 * (share - 0.5)), isReversed: true };
  const percent = isAgreement ? 16 + 48 * share : Math.min(40, 14 + 120 * share);
  return { percent: Math.round(percent), isReversed: false };
}
