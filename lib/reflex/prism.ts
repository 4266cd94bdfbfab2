/**
 * Prism dioptres of an angle in degrees: 100·tan θ, odd in θ. Throws RangeError at or beyond ±90°, which no prism gives.
 * Source: the definition, a shift of 1 unit in 100 units.
 */
export function prismDioptres(degrees: number): number {
  if (!(Math.abs(degrees) < 90)) throw new RangeError(`Prism dioptres need an angle within ±90°: got ${degrees}.`);
  return 100 * Math.tan((degrees * Math.PI) / 180);
}

/**
 * The rule of thumb, 1° is about 2 prism dioptres: common practice, no source. 13% too high at 1°, right near 35°, too
 * low above. Shown as a rough figure, never used to convert what was typed.
 */
export function prismDioptresByRule(degrees: number): number {
  return 2 * degrees;
}

/** The angle in degrees of so many prism dioptres; undoes `prismDioptres`. Throws RangeError for what is no number. */
export function degreesFromPrismDioptres(dioptres: number): number {
  if (Number.isNaN(dioptres)) throw new RangeError("Prism dioptres must be a number.");
  return (Math.atan(dioptres / 100) * 180) / Math.PI;
}
