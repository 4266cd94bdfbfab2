import { normalQuantile } from "./normal";
import type { Estimate } from "./result";
import { studentQuantile } from "./student";

/** estimate ± z·SE; without an interval when the standard error is not finite. */
export function normalInterval(estimate: number, standardError: number, confidence: number): Estimate {
  return symmetricInterval(estimate, standardError, normalQuantile(0.5 + confidence / 2));
}

/** estimate ± t·SE; without an interval below one degree of freedom or when the standard error is not finite. */
export function studentInterval(estimate: number, standardError: number, df: number, confidence: number): Estimate {
  if (!Number.isFinite(standardError)) return { estimate };
  if (!(df >= 1)) return { estimate, standardError };
  return symmetricInterval(estimate, standardError, studentQuantile(0.5 + confidence / 2, df));
}

/** estimate ± factor·SE, for many estimates that share a factor; without an interval when the SE is not finite. */
export function symmetricInterval(estimate: number, standardError: number, factor: number): Estimate {
  if (!Number.isFinite(standardError)) return { estimate };
  const reach = factor * standardError;
  return { estimate, standardError, low: estimate - reach, high: estimate + reach };
}
