import { findRoot } from "./find-root";
import type { Tails } from "./incomplete-gamma";
import { InputError } from "./result";

export function requireProbability(p: number): void {
  if (!(p >= 0 && p <= 1)) throw new InputError(`A probability lies from 0 to 1; got ${p}.`);
}

export function requireDegreesOfFreedom(df: number): void {
  if (!(df > 0 && Number.isFinite(df))) throw new InputError(`Degrees of freedom are positive and finite; got ${df}.`);
}

/**
 * The quantile of a distribution on the positive half line, from both its tails and the wished size of both.
 *
 * Solved for the logarithm of the value against the logarithm of the smaller tail: nearly a straight line, so that far
 * tails keep their relative accuracy and the search takes about ten steps.
 */
export function positiveQuantile(tails: (x: number) => Tails, wished: Tails, start: number): number {
  if (wished.lower === 0) return 0;
  if (wished.upper === 0) return Number.POSITIVE_INFINITY;
  const gap =
    wished.lower <= wished.upper
      ? (u: number) => Math.log(tails(Math.exp(u)).lower / wished.lower)
      : (u: number) => Math.log(wished.upper / tails(Math.exp(u)).upper);
  return Math.exp(findRoot(gap, Math.log(start), 0.5));
}
