import { coverageFactor } from "./coverage-factor";
import { exactLimitFactors } from "./exact-limit-factors";
import { requireConfidence, requirePositive, requireWhole } from "./input";
import type { LimitOptions } from "./limits-of-agreement";
import { normalQuantile } from "./normal";
import { type Result, refuse } from "./result";
import { studentQuantile } from "./student";

/** `inwards`, `outwards`: from the expected limit to the two ends of its exact interval; `halfWidth` half their sum. */
export type LimitPlan = { halfWidth: number; exact: { inwards: number; outwards: number; halfWidth: number } };

/**
 * How precisely `n` cases will place a limit of agreement, for differences of the expected `sd`.
 *
 * Units: those of `sd`. `halfWidth` is that of the large-sample interval. Refuses fewer than three cases; throws
 * InputError on a count that is not whole and an SD that is not positive.
 * Source: Bland & Altman (1999), standard error of a limit, with t; exact: Carkeet (2015) Optom Vis Sci 92: e71-e80.
 */
export function planLimits({ n, sd, coverage = 0.95, confidence = 0.95 }: PlanOptions): Result<LimitPlan> {
  requireWhole(n, "n", 0);
  requirePositive(sd, "sd");
  requireConfidence(coverage, "coverage");
  requireConfidence(confidence);
  if (n < 3) return refuse(n, "fewer than three pairs");
  const factor = coverageFactor(coverage);
  const limitError = sd * Math.sqrt(1 / n + factor ** 2 / (2 * (n - 1)));
  const halfWidth = studentQuantile(0.5 + confidence / 2, n - 1) * limitError;
  const { inner, outer } = exactLimitFactors(n, coverage, confidence);
  const z = normalQuantile(0.5 + coverage / 2);
  const exact = { inwards: sd * (z - inner), outwards: sd * (outer - z), halfWidth: (sd * (outer - inner)) / 2 };
  return { ok: true, n, halfWidth, exact };
}

type PlanOptions = LimitOptions & { n: number; sd: number };
