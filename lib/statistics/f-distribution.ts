import { incompleteBeta } from "./incomplete-beta";
import type { Tails } from "./incomplete-gamma";
import { positiveQuantile, requireDegreesOfFreedom, requireProbability } from "./quantile";
import { InputError } from "./result";

/** Both tails of F with real degrees of freedom. Source: Abramowitz & Stegun 26.6.2. */
export function fTails(x: number, df1: number, df2: number): Tails {
  requireDegreesOfFreedom(df1);
  requireDegreesOfFreedom(df2);
  if (Number.isNaN(x)) throw new InputError("F is not a number.");
  if (x === Number.POSITIVE_INFINITY) return { lower: 1, upper: 0 };
  const total = df1 * x + df2;
  return incompleteBeta((df1 * x) / total, df2 / total, df1 / 2, df2 / 2);
}

/** P(F ≤ x). */
export function fCdf(x: number, df1: number, df2: number): number {
  return fTails(x, df1, df2).lower;
}

/** The value below which F falls with probability p; 0 at 0 and Infinity at 1. */
export function fQuantile(p: number, df1: number, df2: number): number {
  requireProbability(p);
  requireDegreesOfFreedom(df1);
  requireDegreesOfFreedom(df2);
  return positiveQuantile((x) => fTails(x, df1, df2), { lower: p, upper: 1 - p }, 1);
}
