import { agreementWeights, type Weighting } from "./agreement-weights";
import { chanceCorrected } from "./chance-corrected";
import { sum } from "./count-tables";
import { requireConfidence } from "./input";
import { codeRatings, countByCategory, type Label, type LabelRatings } from "./labels";
import { type Estimate, type Result, refuse } from "./result";

export type GwetAC = {
  /** AC1, or AC2 with weights; interval by t with n − 1 degrees of freedom. */
  coefficient: Estimate;
  observed: number;
  expected: number;
};

/**
 * Gwet's agreement coefficient: AC1, and AC2 with weights. Unlike kappa it stays near the observed agreement when one
 * category is far more common than the others, so it shows whether a low kappa comes from prevalence alone.
 *
 * Shape: subjects × raters, `null` = missing; a subject with one rating still counts in the shares of the categories.
 * `categories` are all categories offered, in order: weights go by position and unused ones count. Left out, they are
 * the labels used, ascending. Refuses without a subject rated twice and with one category. Throws InputError for a label
 * that was not offered, unknown weights, confidence outside (0, 1).
 * Source: Gwet, British Journal of Mathematical and Statistical Psychology 2008; 61: 29-48 (two raters: its tables divide
 * the variance by n², here by n(n − 1)); Gwet, Handbook of Inter-Rater Reliability, 4th ed. 2014.
 */
export function gwetAC(
  ratings: LabelRatings,
  options: { weights?: Weighting; categories?: readonly Label[]; confidence?: number } = {},
): Result<GwetAC> {
  const { weights: weighting = "none", categories, confidence = 0.95 } = options;
  requireConfidence(confidence);
  const coded = codeRatings(ratings, categories);
  const counts = countByCategory(coded);
  const size = coded.categories.length;
  const weights = agreementWeights(weighting, size);
  if (size === 1) return refuse(counts.filter((row) => sum(row) > 0).length, "one category only");
  const scale = sum(weights.map(sum)) / (size * (size - 1));
  const chance = (first: readonly number[], second: readonly number[]) =>
    scale * sum(first.map((share, category) => share * (1 - (second[category] ?? 0))));
  return chanceCorrected(counts, weights, chance, confidence);
}
