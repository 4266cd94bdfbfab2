import { disagreementsFor, type Weighting } from "./agreement-weights";
import { beyondChance } from "./beyond-chance";
import { type CountTable, requireSquareCounts } from "./count-tables";
import { requireConfidence } from "./input";
import { normalInterval } from "./intervals";
import { type FlatTable, flatten, type KappaMoments, kappaMoments, kappaVariances } from "./kappa-moments";
import { type Estimate, type Result, refuse } from "./result";

export type CohenKappaOptions = { weights?: Weighting; confidence?: number };

export type CohenKappa = {
  /** Its standard error does not assume that kappa is 0; the interval is kappa ± z standard errors. */
  kappa: Estimate;
  /** The standard error that kappa has when it is 0: for a test of that alone. */
  standardErrorNull: number;
  /** Agreement seen, and agreement expected by chance; weighted when kappa is. */
  observed: number;
  expected: number;
  /** The largest kappa that these margins allow; unweighted kappa only. */
  maximum?: number;
  /** Kappa with prevalence and bias taken out, (q·observed − 1)/(q − 1); unweighted kappa only. */
  pabak?: number;
  /** (a − d)/n of a 2 × 2 table: positive when the first category is the common one. */
  prevalenceIndex?: number;
  /** (b − c)/n of a 2 × 2 table: positive when the rater of the rows uses the first category more. */
  biasIndex?: number;
};

/**
 * Cohen's kappa: agreement of two raters beyond what their own habits would give by chance.
 *
 * Shape: a square table of counts, rows = first rater, columns = second, the same categories in the same order.
 * Refuses a table without counts, and one where both raters used one and the same category (0/0). Throws InputError for
 * a table that is not square, counts that are not whole or are negative, unknown weights, confidence outside (0, 1).
 * Source: Cohen 1960 and 1968; standard errors Fleiss, Cohen & Everitt, Psychological Bulletin 1969; 72: 323-327;
 * pabak and indices Byrt, Bishop & Carlin, Journal of Clinical Epidemiology 1993; 46: 423-429.
 */
export function cohenKappa(table: CountTable, options: CohenKappaOptions = {}): Result<CohenKappa> {
  const { weights = "none", confidence = 0.95 } = options;
  requireSquareCounts(table, "the table");
  requireConfidence(confidence);
  return kappaOfTable(flatten(table), disagreementsFor(weights, table.length), confidence, weights === "none");
}

/** The same of a table known to be sound, for callers with many tables of one size: the weights are worked out once. */
export function kappaOfTable(
  table: FlatTable,
  disagreements: Float64Array,
  confidence: number,
  unweighted: boolean,
): Result<CohenKappa> {
  const moments = kappaMoments(table, disagreements);
  const estimate = kappaOrReason(moments);
  const { n } = moments;
  if (typeof estimate === "string") return refuse(n, estimate);
  const { variance, varianceNull } = kappaVariances(table, disagreements, moments);
  const standardError = Math.sqrt(variance / n);
  const result: { ok: true; n: number } & CohenKappa = {
    ok: true,
    n,
    // One case says nothing of how kappa would vary, though the formula has a standard error of 0 for it.
    kappa: n > 1 ? normalInterval(estimate, standardError, confidence) : { estimate, standardError },
    standardErrorNull: Math.sqrt(varianceNull / n),
    observed: 1 - moments.observed,
    expected: 1 - moments.expected,
  };
  if (unweighted) {
    result.maximum = 1 - forcedDisagreement(moments) / moments.expected;
    result.pabak = (table.size * result.observed - 1) / (table.size - 1);
  }
  if (table.size === 2) {
    const [a = 0, b = 0, c = 0, d = 0] = table.cells;
    result.prevalenceIndex = (a - d) / n;
    result.biasIndex = (b - c) / n;
  }
  return result;
}

/** The figure alone, or why there is none. */
export function kappaOrReason({ n, observed, expected }: KappaMoments): number | string {
  if (n === 0) return "no case was read by both";
  return expected === 0 ? "one category only" : beyondChance(expected - observed, expected);
}

/** Margins that differ force this much disagreement even on raters who agree wherever they can. */
function forcedDisagreement({ n, rows, columns }: KappaMoments): number {
  let apart = 0;
  for (let category = 0; category < rows.length; category += 1) {
    apart += Math.abs((rows[category] ?? 0) - (columns[category] ?? 0));
  }
  return apart / (2 * n);
}
