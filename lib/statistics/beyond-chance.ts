/**
 * A chance-corrected figure: the part of `room`, what agreement could gain over chance, that it did gain.
 *
 * Exactly 0 where seen and expected differ by rounding alone, so that no figure shows as −0.00. NaN where both are 0.
 */
export function beyondChance(gain: number, room: number): number {
  return Math.abs(gain) < 1e-12 * room ? 0 : gain / room;
}
