import { chiSquareTails } from "./chi-square";
import type { CohenKappa } from "./cohen-kappa";
import { sum } from "./count-tables";
import { requireConfidence } from "./input";
import { normalInterval } from "./intervals";
import { type Estimate, InputError, type Result, refuse } from "./result";

/** A kappa with its standard error (not the one that assumes kappa 0), or a whole result of `cohenKappa`. */
export type KappaToCompare = Pick<Estimate, "estimate" | "standardError"> | Result<Pick<CohenKappa, "kappa">>;

export type KappaComparison = {
  /** The common kappa if all are estimates of one, by inverse variance. */
  pooled: Estimate;
  /** Whether they are: χ² of homogeneity on one degree of freedom less than there are kappas; no p for a single one. */
  chiSquare: number;
  df: number;
  p?: number;
};

/**
 * Compares kappas of independent sets of cases: one examiner over rounds, or two groups of examiners on different cases.
 *
 * `n` counts the kappas compared; results that were refused are left out and not counted. Refuses when none is left, and
 * when a standard error is missing or 0, for such a kappa has no finite weight. Throws InputError for figures that are
 * not finite, negative standard errors, confidence outside (0, 1).
 * Source: Fleiss, Statistical Methods for Rates and Proportions, 2nd ed. 1981, section 13.1 (from memory).
 */
export function compareKappas(
  list: readonly KappaToCompare[],
  options: { confidence?: number } = {},
): Result<KappaComparison> {
  const { confidence = 0.95 } = options;
  requireConfidence(confidence);
  const kappas = list.map(toEstimate).filter((kappa) => kappa !== null);
  const n = kappas.length;
  if (n === 0) return refuse(0, "no kappa to compare");
  const weights = kappas.map(({ standardError = 0 }) => 1 / standardError ** 2);
  if (!weights.every(Number.isFinite)) return refuse(n, "a kappa without a standard error above 0");

  const total = sum(weights);
  const estimate = sum(kappas.map((kappa, index) => kappa.estimate * (weights[index] ?? 0))) / total;
  const deviations = kappas.map((kappa, index) => (weights[index] ?? 0) * (kappa.estimate - estimate) ** 2);
  const chiSquare = sum(deviations);
  return {
    ok: true,
    n,
    pooled: normalInterval(estimate, 1 / Math.sqrt(total), confidence),
    chiSquare,
    df: n - 1,
    ...(n > 1 ? { p: chiSquareTails(chiSquare, n - 1).upper } : {}),
  };
}

function toEstimate(kappa: KappaToCompare): Pick<Estimate, "estimate" | "standardError"> | null {
  if ("ok" in kappa) return kappa.ok ? kappa.kappa : null;
  const { estimate, standardError = 0 } = kappa;
  if (Number.isFinite(estimate) && Number.isFinite(standardError) && standardError >= 0) return kappa;
  throw new InputError(
    `A kappa needs a finite estimate and a standard error from 0; got ${estimate}, ${standardError}.`,
  );
}
