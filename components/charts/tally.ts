/** Tally strokes in fives: 13 is [5, 5, 3]. Counts are whole and not negative. */
export function tallyGroups(count: number): number[] {
  const fives = Math.floor(count / 5);
  const rest = count % 5;
  return [...Array.from({ length: fives }, () => 5), ...(rest > 0 ? [rest] : [])];
}
