import { beyondChance } from "./beyond-chance";
import { type CountTable, columnSums, dot, sum } from "./count-tables";
import { studentInterval } from "./intervals";
import { type Estimate, type Result, refuse } from "./result";
import { sumOfSquares, withoutRounding } from "./rounding";

export type ChanceCorrected = { coefficient: Estimate; observed: number; expected: number };

/**
 * Agreement expected by chance of two sets of category shares. Linear in each, so that it serves the panel with itself
 * and one subject with the panel.
 */
export type ChanceAgreement = (first: readonly number[], second: readonly number[]) => number;

/**
 * The frame that Fleiss' kappa and Gwet's AC share: observed agreement over the subjects rated twice or more, chance
 * agreement from the shares of all subjects, and a standard error by linearisation over subjects.
 *
 * Shape: subjects × categories counts, rows of any total; `weights` between categories, 1 on the diagonal.
 * Subjects without a rating do not count. Refuses without a subject rated twice, and where chance agreement is complete.
 * Source: Gwet, Handbook of Inter-Rater Reliability, 4th ed. 2014; variance also Gwet, British Journal of Mathematical
 * and Statistical Psychology 2008; 61: 29-48. Interval by t with n − 1 degrees of freedom.
 */
export function chanceCorrected(
  counts: CountTable,
  weights: CountTable,
  chanceAgreement: ChanceAgreement,
  confidence: number,
): Result<ChanceCorrected> {
  const subjects = counts.filter((row) => sum(row) > 0);
  const n = subjects.length;
  if (n === 0) return refuse(0, "no ratings");
  const agreements = subjects.map((row) => subjectAgreement(row, weights));
  const paired = agreements.filter((agreement) => agreement !== null);
  if (paired.length === 0) return refuse(n, "no subject was rated twice");

  const ownShares = subjects.map(toShares);
  const panelShares = columnSums(ownShares).map((total) => total / n);
  const observed = sum(paired) / paired.length;
  const expected = chanceAgreement(panelShares, panelShares);
  if (expected === 1) return refuse(n, "one category only");
  const estimate = beyondChance(observed - expected, 1 - expected);

  // What each subject adds to the coefficient: these average to the estimate, and their spread is its variance.
  const contributions = agreements.map((agreement, subject) => {
    const ownChance = chanceAgreement(ownShares[subject] ?? [], panelShares);
    const gain = agreement === null ? 0 : ((n / paired.length) * (agreement - expected)) / (1 - expected);
    return gain - (2 * (1 - estimate) * (ownChance - expected)) / (1 - expected);
  });
  const squares = sumOfSquares(contributions.map((contribution) => contribution - estimate));
  // Subjects who all say the same of agreement have no spread, but for rounding (full agreement contributes 1); a single
  // one has 0/0, and no interval.
  const spread = withoutRounding(squares, n);
  const standardError = Math.sqrt(spread / (n * (n - 1)));
  return {
    ok: true,
    n,
    coefficient: studentInterval(estimate, standardError, n - 1, confidence),
    observed,
    expected,
  };
}

/** Share of the pairs of a subject's ratings that agree, near misses by their weight; null below two ratings. */
export function subjectAgreement(counts: readonly number[], weights: CountTable): number | null {
  const total = sum(counts);
  if (total < 2) return null;
  let agreeing = 0;
  counts.forEach((count, category) => {
    if (count > 0) agreeing += count * (dot(weights[category] ?? [], counts) - 1);
  });
  return agreeing / (total * (total - 1));
}

function toShares(counts: readonly number[]): number[] {
  const total = sum(counts);
  return counts.map((count) => count / total);
}
