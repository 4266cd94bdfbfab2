import { disagreementWeights, type Weighting } from "./agreement-weights";
import { type CountTable, columnSums, requireSquareCounts, sum } from "./count-tables";
import { requireConfidence } from "./input";
import { normalInterval } from "./intervals";
import { kappaMoments } from "./kappa-moments";
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
  return kappaOfTable(table, disagreementWeights(weights, table.length), weights === "none", confidence);
}

/** The same of a table known to be sound, for callers with many tables of one size: the weights are worked out once. */
export function kappaOfTable(
  table: CountTable,
  disagreements: CountTable,
  unweighted: boolean,
  confidence: number,
): Result<CohenKappa> {
  const n = sum(table.map(sum));
  if (n === 0) return refuse(0, "no case was read by both");
  const moments = kappaMoments(table, n, disagreements);
  if (!moments) return refuse(n, "one category only");
  const estimate = 1 - moments.observed / moments.expected;
  const standardError = Math.sqrt(moments.variance / n);
  return {
    ok: true,
    n,
    // One case says nothing of how kappa would vary, though the formula has a standard error of 0 for it.
    kappa: n > 1 ? normalInterval(estimate, standardError, confidence) : { estimate, standardError },
    standardErrorNull: Math.sqrt(moments.varianceNull / n),
    observed: 1 - moments.observed,
    expected: 1 - moments.expected,
    ...(unweighted ? unweightedIndices(table, n, moments.expected) : {}),
    ...(table.length === 2 ? twoByTwoIndices(table, n) : {}),
  };
}

function unweightedIndices(table: CountTable, n: number, expectedDisagreement: number) {
  const columns = columnSums(table);
  // Margins that differ force this much disagreement even on raters who agree wherever they can.
  const forced = sum(table.map((row, i) => Math.abs(sum(row) - (columns[i] ?? 0)))) / (2 * n);
  const size = table.length;
  const observed = sum(table.map((row, i) => row[i] ?? 0)) / n;
  return { maximum: 1 - forced / expectedDisagreement, pabak: (size * observed - 1) / (size - 1) };
}

function twoByTwoIndices([[a = 0, b = 0] = [], [c = 0, d = 0] = []]: CountTable, n: number) {
  return { prevalenceIndex: (a - d) / n, biasIndex: (b - c) / n };
}
