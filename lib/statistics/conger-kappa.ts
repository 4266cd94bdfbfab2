import { agreementWeights } from "./agreement-weights";
import { beyondChance } from "./beyond-chance";
import { subjectAgreement } from "./chance-corrected";
import { columnSums, sum } from "./count-tables";
import { type CodedRatings, codeRatings, countByCategory, type LabelRatings } from "./labels";
import { type Estimate, type Result, refuse } from "./result";

/**
 * Conger's kappa for several raters who are the same throughout: chance agreement from each rater's own habits, as in
 * Cohen's kappa (which it is for two raters), where Fleiss' kappa takes it from the panel's. Without an interval.
 *
 * Shape: subjects × raters, `null` = missing. A rater's shares are of the rater's own readings; a rater without any
 * takes no part. `n` counts the subjects with a rating. Refuses below two raters, without a subject rated twice, and
 * where all used one and the same category. Throws InputError for labels that are neither strings nor finite numbers.
 * Source: Conger, Psychological Bulletin 1980; 88: 322-328; with missing ratings Gwet 2014.
 */
export function congerKappa(ratings: LabelRatings): Result<{ kappa: Estimate }> {
  const coded = codeRatings(ratings);
  const counts = countByCategory(coded).filter((row) => sum(row) > 0);
  const n = counts.length;
  if (n === 0) return refuse(0, "no ratings");
  const weights = agreementWeights("none", coded.categories.length);
  const agreements = counts.map((row) => subjectAgreement(row, weights)).filter((agreement) => agreement !== null);
  if (agreements.length === 0) return refuse(n, "no subject was rated twice");
  const observed = sum(agreements) / agreements.length;
  const expected = chanceOfOwnHabits(raterShares(coded));
  if (expected === 1) return refuse(n, "one category only");
  return { ok: true, n, kappa: { estimate: beyondChance(observed - expected, 1 - expected) } };
}

/** Raters × categories: which part of a rater's own readings each category is. */
function raterShares({ categories, codes, raterCount }: CodedRatings): number[][] {
  const counts = Array.from({ length: raterCount }, () => new Array<number>(categories.length).fill(0));
  for (const row of codes) {
    row.forEach((code, rater) => {
      const own = counts[rater];
      if (own && code >= 0) own[code] = (own[code] ?? 0) + 1;
    });
  }
  return counts.filter((row) => sum(row) > 0).map((row) => row.map((count) => count / sum(row)));
}

/** Chance agreement averaged over all pairs of raters: Σ p̄² less the spread between raters. */
function chanceOfOwnHabits(shares: number[][]): number {
  const raters = shares.length;
  const means = columnSums(shares).map((total) => total / raters);
  const spread = sum(shares.map((row) => sum(row.map((share, category) => (share - (means[category] ?? 0)) ** 2))));
  return sum(means.map((mean) => mean ** 2)) - spread / (raters * (raters - 1));
}
