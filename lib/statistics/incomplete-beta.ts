import type { Tails } from "./incomplete-gamma";
import { deviance, stirlingError } from "./log-gamma";

const ITERATIONS_MAX = 100_000;
const TINY = 1e-300;

/**
 * Regularised incomplete beta functions I_x(a, b) and 1 − I_x(a, b), for a, b > 0.
 *
 * Takes x and its complement y = 1 − x apart, because a caller knows the small one of the two with all its digits.
 * Source: continued fraction of Abramowitz & Stegun 26.5.8 (modified Lentz), with Loader's form of the leading factor.
 */
export function incompleteBeta(x: number, y: number, a: number, b: number): Tails {
  if (x <= 0) return { lower: 0, upper: 1 };
  if (y <= 0) return { lower: 1, upper: 0 };
  if (x > (a + 1) / (a + b + 2)) {
    const swapped = lowerTail(y, x, b, a);
    return { lower: 1 - swapped, upper: swapped };
  }
  const lower = lowerTail(x, y, a, b);
  return { lower, upper: 1 - lower };
}

function lowerTail(x: number, y: number, a: number, b: number): number {
  const n = a + b;
  // x^a y^b / (a B(a, b)), as a binomial probability with real counts a and b.
  const exponent = stirlingError(n) - stirlingError(a) - stirlingError(b) - deviance(a, n * x) - deviance(b, n * y);
  return Math.exp(exponent) * Math.sqrt(b / (2 * Math.PI * a * n)) * continuedFraction(x, a, b);
}

function continuedFraction(x: number, a: number, b: number): number {
  const step = (numerator: number) => {
    d = 1 / awayFromZero(1 + numerator * d);
    c = awayFromZero(1 + numerator / c);
    value *= c * d;
  };
  let c = 1;
  let d = 1 / awayFromZero(1 - ((a + b) * x) / (a + 1));
  let value = d;
  for (let k = 1; k < ITERATIONS_MAX; k += 1) {
    const before = value;
    step((k * (b - k) * x) / ((a + 2 * k - 1) * (a + 2 * k)));
    step((-(a + k) * (a + b + k) * x) / ((a + 2 * k) * (a + 2 * k + 1)));
    if (Math.abs(value - before) < 1e-16 * Math.abs(value)) break;
  }
  return value;
}

function awayFromZero(value: number): number {
  return Math.abs(value) < TINY ? TINY : value;
}
