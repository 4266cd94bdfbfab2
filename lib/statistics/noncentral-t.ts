import { findRoot } from "./find-root";
import { stirlingError } from "./log-gamma";
import { normalCdf, normalDensity, normalQuantile } from "./normal";
import { requireDegreesOfFreedom, requireProbability } from "./quantile";
import { InputError } from "./result";

const STEPS_MAX = 12;

/**
 * P(T ≤ t) and the density at t, for a noncentral T = (Z + δ) / √(χ²/df).
 *
 * The average of Φ(t·s − δ) over s = √(χ²/df), as a trapezium sum over u = log s. The integrand is analytic and falls off
 * at both ends, so the sum converges geometrically; the step follows the narrower of the two factors, which keeps it exact
 * where series in Poisson weights underflow (δ of 200 at 10,000 cases). Terms below e⁻⁴² of the largest are left out.
 * Source: the definition; trapezium rule on the real line, Trefethen & Weideman (2014) SIAM Rev 56: 385-458.
 */
function distribution(t: number, df: number, noncentrality: number): { lower: number; density: number } {
  const step = Math.min(0.13, 0.4 / Math.sqrt(2 * df + noncentrality * noncentrality + 1));
  let lower = 0;
  let density = 0;
  const addTerm = (u: number): boolean => {
    const logWeight = df * (u - 0.5 * Math.expm1(2 * u));
    if (logWeight < -42) return false;
    const weight = Math.exp(logWeight);
    const scale = Math.exp(u);
    const z = t * scale - noncentrality;
    lower += weight * normalCdf(z);
    density += weight * scale * normalDensity(z);
    return true;
  };
  addTerm(0);
  for (let u = step; addTerm(u); u += step);
  for (let u = -step; addTerm(u); u -= step);
  const norm = step * Math.sqrt(df / Math.PI) * Math.exp(-stirlingError(df / 2));
  return { lower: lower * norm, density: density * norm };
}

/** P(T ≤ t) for noncentral t with real `df` > 0. */
export function noncentralTCdf(t: number, df: number, noncentrality: number): number {
  requireDegreesOfFreedom(df);
  requireFiniteNoncentrality(noncentrality);
  return distribution(t, df, noncentrality).lower;
}

/** The value below which noncentral t falls with probability p; ±Infinity at 0 and 1. */
export function noncentralTQuantile(p: number, df: number, noncentrality: number): number {
  requireProbability(p);
  requireDegreesOfFreedom(df);
  requireFiniteNoncentrality(noncentrality);
  if (p === 0) return Number.NEGATIVE_INFINITY;
  // The lower tail keeps its digits, so the upper half is solved in its mirror image.
  return p > 0.5 ? -lowerQuantile(1 - p, df, -noncentrality) : lowerQuantile(p, df, noncentrality);
}

/** Newton's steps on normal-probability scale, where the distribution is nearly a straight line. */
function lowerQuantile(p: number, df: number, noncentrality: number): number {
  if (p === 0) return Number.NEGATIVE_INFINITY;
  const target = normalQuantile(p);
  const spread = Math.sqrt(1 + (noncentrality * noncentrality) / (2 * df));
  let t = noncentrality + target * spread;
  for (let count = 0; count < STEPS_MAX; count += 1) {
    const { lower, density } = distribution(t, df, noncentrality);
    const reached = normalQuantile(Math.min(1, lower));
    const step = ((reached - target) * normalDensity(reached)) / density;
    if (!Number.isFinite(step)) break; // overshot to where the probability rounds to 0 or 1
    t -= step;
    if (Math.abs(step) < 1e-7 * spread) return t; // the next step would be of the order of its square
  }
  return findRoot((x) => distribution(x, df, noncentrality).lower - p, noncentrality + target * spread, spread);
}

function requireFiniteNoncentrality(noncentrality: number): void {
  if (!Number.isFinite(noncentrality)) throw new InputError(`The noncentrality is finite; got ${noncentrality}.`);
}
