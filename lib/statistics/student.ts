import { incompleteBeta } from "./incomplete-beta";
import { positiveQuantile, requireDegreesOfFreedom, requireProbability } from "./quantile";

/** P(T > t) for t ≥ 0 (one-sided), accurate far into the tail. */
function upperTail(t: number, df: number): number {
  const square = t * t;
  const { lower } = incompleteBeta(df / (df + square), square / (df + square), df / 2, 0.5);
  return lower / 2;
}

/** P(T ≤ t) for Student's t with `df` degrees of freedom (real). Source: Abramowitz & Stegun 26.7.1. */
export function studentCdf(t: number, df: number): number {
  requireDegreesOfFreedom(df);
  if (Math.abs(t) === Number.POSITIVE_INFINITY) return t < 0 ? 0 : 1;
  return t < 0 ? upperTail(-t, df) : 1 - upperTail(t, df);
}

/** The value below which Student's t falls with probability p; ±Infinity at 0 and 1. */
export function studentQuantile(p: number, df: number): number {
  requireProbability(p);
  requireDegreesOfFreedom(df);
  if (p === 0.5) return 0;
  const size = magnitudeQuantile(2 * Math.min(p, 1 - p), df);
  return p < 0.5 ? -size : size;
}

/** The value that |T| passes with probability `outside`. */
function magnitudeQuantile(outside: number, df: number): number {
  const tails = (t: number) => {
    const square = t * t;
    return incompleteBeta(square / (df + square), df / (df + square), 0.5, df / 2);
  };
  return positiveQuantile(tails, { lower: 1 - outside, upper: outside }, 1);
}

/** Two-sided p-value: P(|T| ≥ |t|). */
export function studentTwoSided(t: number, df: number): number {
  requireDegreesOfFreedom(df);
  return 2 * upperTail(Math.abs(t), df);
}
