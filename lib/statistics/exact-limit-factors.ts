import { noncentralTQuantile } from "./noncentral-t";
import { normalQuantile } from "./normal";

/**
 * The exact interval of one limit of agreement, as distances from the bias in standard deviations: { inner, outer }.
 *
 * Each limit by itself: t′/√n with t′ noncentral on n − 1 degrees of freedom, noncentrality z√n, z not rounded.
 * Source: Carkeet (2015) Optom Vis Sci 92: e71-e80.
 */
export function exactLimitFactors(n: number, coverage: number, confidence: number): { inner: number; outer: number } {
  const noncentrality = normalQuantile(0.5 + coverage / 2) * Math.sqrt(n);
  const factor = (p: number) => noncentralTQuantile(p, n - 1, noncentrality) / Math.sqrt(n);
  return { inner: factor(0.5 - confidence / 2), outer: factor(0.5 + confidence / 2) };
}
