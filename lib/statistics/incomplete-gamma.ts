import { deviance, stirlingError } from "./log-gamma";

/** Both tails of a distribution at one point, each computed without subtracting the larger from 1 where it is small. */
export type Tails = { lower: number; upper: number };

const ITERATIONS_MAX = 100_000;

/**
 * Regularised incomplete gamma functions P(a, x) and Q(a, x), for a > 0 and x ≥ 0.
 * Source: power series below x = a + 1, continued fraction (modified Lentz) above; Abramowitz & Stegun 6.5.29, 6.5.31.
 */
export function incompleteGamma(a: number, x: number): Tails {
  if (x <= 0) return { lower: 0, upper: 1 };
  if (x === Number.POSITIVE_INFINITY) return { lower: 1, upper: 0 };
  // x^a e^−x / Γ(a + 1), as a Poisson probability with real count a and mean x.
  const mass = Math.exp(-stirlingError(a) - deviance(a, x)) / Math.sqrt(2 * Math.PI * a);
  if (x < a + 1) {
    const lower = mass * powerSeries(a, x);
    return { lower, upper: 1 - lower };
  }
  const upper = mass * a * continuedFraction(a, x);
  return { lower: 1 - upper, upper };
}

function powerSeries(a: number, x: number): number {
  let sum = 1;
  let term = 1;
  for (let k = 1; k < ITERATIONS_MAX && term > sum * 1e-17; k += 1) {
    term *= x / (a + k);
    sum += term;
  }
  return sum;
}

function continuedFraction(a: number, x: number): number {
  let b = x + 1 - a;
  let c = Number.MAX_VALUE;
  let d = 1 / b;
  let value = d;
  for (let k = 1; k < ITERATIONS_MAX; k += 1) {
    const numerator = -k * (k - a);
    b += 2;
    d = 1 / (numerator * d + b);
    c = b + numerator / c;
    const factor = c * d;
    value *= factor;
    if (Math.abs(factor - 1) < 1e-16) break;
  }
  return value;
}
