import { disagreementsFor } from "./agreement-weights";
import { kappaOrReason } from "./cohen-kappa";
import { kappaMoments } from "./kappa-moments";
import { codeRatings, type LabelRatings } from "./labels";
import { countPaired, pairCounter } from "./rater-pairs";
import { type Estimate, type Result, refuse } from "./result";

/**
 * Light's kappa for several raters: the plain mean of Cohen's kappa over all pairs of raters, without an interval.
 *
 * Shape: subjects × raters, `null` = missing; each pair is compared over the subjects that both rated. `n` counts the
 * subjects rated by two or more. Refuses where any pair has no kappa, because leaving that pair out would change what
 * the mean is of. Throws InputError for labels that are neither strings nor finite numbers.
 * Source: Light, Psychological Bulletin 1971; 76: 365-377.
 */
export function lightKappa(ratings: LabelRatings): Result<{ kappa: Estimate }> {
  const coded = codeRatings(ratings);
  const { raterCount } = coded;
  const n = countPaired(coded);
  if (n === 0) return refuse(0, "no subject was rated twice");
  const disagreements = disagreementsFor("none", coded.categories.length);
  const countPair = pairCounter(coded);
  let total = 0;
  for (let first = 0; first < raterCount; first += 1) {
    for (let second = first + 1; second < raterCount; second += 1) {
      const kappa = kappaOrReason(kappaMoments(countPair(first, second), disagreements));
      if (typeof kappa === "string") return refuse(n, `raters ${first + 1} and ${second + 1}: ${kappa}`);
      total += kappa;
    }
  }
  return { ok: true, n, kappa: { estimate: total / ((raterCount * (raterCount - 1)) / 2) } };
}
