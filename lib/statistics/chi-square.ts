import { incompleteGamma, type Tails } from "./incomplete-gamma";
import { positiveQuantile, requireDegreesOfFreedom, requireProbability } from "./quantile";
import { InputError } from "./result";

/** Both tails of χ² with real degrees of freedom. Source: Abramowitz & Stegun 26.4.19. */
export function chiSquareTails(x: number, df: number): Tails {
  requireDegreesOfFreedom(df);
  if (Number.isNaN(x)) throw new InputError("χ² is not a number.");
  return incompleteGamma(df / 2, x / 2);
}

/** P(χ² ≤ x). */
export function chiSquareCdf(x: number, df: number): number {
  return chiSquareTails(x, df).lower;
}

/** The value below which χ² falls with probability p; 0 at 0 and Infinity at 1. */
export function chiSquareQuantile(p: number, df: number): number {
  requireProbability(p);
  requireDegreesOfFreedom(df);
  return positiveQuantile((x) => chiSquareTails(x, df), { lower: p, upper: 1 - p }, df);
}
