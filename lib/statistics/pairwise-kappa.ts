import { disagreementsFor } from "./agreement-weights";
import { type CohenKappa, kappaOfTable } from "./cohen-kappa";
import { requireConfidence } from "./input";
import { codeRatings, type LabelRatings } from "./labels";
import { countPaired, pairCounter } from "./rater-pairs";
import { type Result, refuse } from "./result";

export type PairwiseKappa = {
  /** `matrix[i][j]`: kappa of rater i (rows of the pair's table) with rater j, over the subjects that both rated. */
  matrix: Result<CohenKappa>[][];
};

/**
 * Cohen's kappa of every rater with every other (and on the diagonal with themselves).
 *
 * Shape: subjects × raters, `null` = missing. The categories of every pair are the labels used in the whole table, so
 * that pairs can be compared. A pair that cannot answer has its reason in the matrix and does not hide the others.
 * `n` counts the subjects rated by two or more. Refuses where no subject was rated twice.
 * Throws InputError for labels that are neither strings nor finite numbers and for confidence outside (0, 1).
 */
export function pairwiseKappa(ratings: LabelRatings, options: { confidence?: number } = {}): Result<PairwiseKappa> {
  const { confidence = 0.95 } = options;
  requireConfidence(confidence);
  const coded = codeRatings(ratings);
  const n = countPaired(coded);
  if (n === 0) return refuse(0, "no subject was rated twice");

  const disagreements = disagreementsFor("none", coded.categories.length);
  const countPair = pairCounter(coded);
  const kappaOf = (first: number, second: number) =>
    kappaOfTable(countPair(first, second), disagreements, confidence, true);
  const matrix: Result<CohenKappa>[][] = Array.from({ length: coded.raterCount }, () => []);
  matrix.forEach((row, first) => {
    // The rows above have already put this rater's kappas with the earlier raters in place.
    row.push(kappaOf(first, first));
    for (let second = first + 1; second < coded.raterCount; second += 1) {
      const kappa = kappaOf(first, second);
      row.push(kappa);
      matrix[second]?.push(swapRaters(kappa));
    }
  });
  return { ok: true, n, matrix };
}

/** Turning the table over changes nothing but the sign of the bias. */
function swapRaters(kappa: Result<CohenKappa>): Result<CohenKappa> {
  if (!kappa.ok || kappa.biasIndex === undefined) return kappa;
  return { ...kappa, biasIndex: 0 - kappa.biasIndex };
}
