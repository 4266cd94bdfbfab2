import { requireProbability } from "./quantile";

/** Density of the standard normal distribution. */
export function normalDensity(x: number): number {
  return Math.exp(-0.5 * x * x) / Math.sqrt(2 * Math.PI);
}

/**
 * P(Z ≤ x) for a standard normal Z, with full relative accuracy in the lower tail.
 * Source: Abramowitz & Stegun 26.2.11 (series) within 2 of the middle, 26.2.14 (continued fraction) outside.
 */
export function normalCdf(x: number): number {
  const size = Math.abs(x);
  if (size < 2) return 0.5 + normalDensity(x) * oddSeries(x);
  const tail = normalDensity(x) / continuedFraction(size);
  return x < 0 ? tail : 1 - tail;
}

/** x + x³/3 + x⁵/(3·5) + … */
function oddSeries(x: number): number {
  const square = x * x;
  let term = x;
  let sum = x;
  for (let k = 3; Math.abs(term) > 1e-17 * Math.abs(sum); k += 2) {
    term *= square / k;
    sum += term;
  }
  return sum;
}

/** x + 1/(x + 2/(x + 3/(x + …))), taken deep enough for 1e-16 at the smallest x used. */
function continuedFraction(x: number): number {
  let value = x;
  for (let k = Math.ceil(15 + 360 / (x * x)); k > 0; k -= 1) value = x + k / value;
  return value;
}

/**
 * The value below which a standard normal falls with probability p; ±Infinity at 0 and 1.
 * Source: start of Abramowitz & Stegun 26.2.23, then Halley's steps on `normalCdf`.
 */
export function normalQuantile(p: number): number {
  requireProbability(p);
  if (p === 0) return Number.NEGATIVE_INFINITY;
  if (p > 0.5) return -normalQuantile(1 - p);
  const t = Math.sqrt(-2 * Math.log(p));
  let x = (2.515517 + t * (0.802853 + t * 0.010328)) / (1 + t * (1.432788 + t * (0.189269 + t * 0.001308))) - t;
  for (let step = 0; step < 3; step += 1) {
    const newton = (normalCdf(x) - p) / normalDensity(x);
    x -= newton / (1 + 0.5 * x * newton);
  }
  return x;
}
