import { normalQuantile } from "./normal";
import type { Estimate } from "./result";
import { studentQuantile } from "./student";

/** estimate ± z·SE; without an interval when the standard error is not finite. */
export function normalInterval(estimate: number, standardError: number, confidence: number): Estimate {
  if (!Number.isFinite(standardError)) return { estimate };
  return around(estimate, standardError, normalQuantile(0.5 + confidence / 2));
}

/** estimate ± t·SE; without an interval below one degree of freedom or when the standard error is not finite. */
export function studentInterval(estimate: number, standardError: number, df: number, confidence: number): Estimate {
  if (!Number.isFinite(standardError)) return { estimate };
  if (!(df >= 1)) return { estimate, standardError };
  return around(estimate, standardError, studentQuantile(0.5 + confidence / 2, df));
}

function around(estimate: number, standardError: number, factor: number): Estimate {
  return {
    estimate,
    standardError,
    low: estimate - factor * standardError,
    high: estimate + factor * standardError,
  };
}
