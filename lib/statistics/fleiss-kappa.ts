import { agreementWeights } from "./agreement-weights";
import { chanceCorrected } from "./chance-corrected";
import { type CountTable, columnSums, dot, requireCounts, sum } from "./count-tables";
import { requireConfidence } from "./input";
import type { Estimate, Result } from "./result";

export type FleissKappa = {
  /** Interval by t with n − 1 degrees of freedom; its standard error does not assume that kappa is 0. */
  kappa: Estimate;
  observed: number;
  expected: number;
  /** The standard error that kappa has when it is 0; only when every subject has the same number of ratings. */
  standardErrorNull?: number;
  /** One category against all others, in the order of the columns; under the same condition. */
  perCategory?: CategoryKappa[];
};

/** `kappa` is left out for a category that nobody used. */
export type CategoryKappa = { kappa?: number; standardErrorNull: number };

/**
 * Fleiss' kappa: agreement of many raters, not always the same ones, beyond chance.
 *
 * Shape: subjects × categories, each entry how many raters chose that category. Totals may differ; a subject without a
 * rating does not count. Refuses without a subject rated twice and where only one category was used (0/0). Throws
 * InputError for counts that are not whole, are negative or do not line up, and for confidence outside (0, 1).
 * Source: Fleiss, Psychological Bulletin 1971; 76: 378-382; standard errors at 0 Fleiss, Nee & Landis, Psychological
 * Bulletin 1979; 86: 974-977 (the 1971 paper's are wrong); the other one, and unequal totals, Gwet 2014.
 */
export function fleissKappa(counts: CountTable, options: { confidence?: number } = {}): Result<FleissKappa> {
  const { confidence = 0.95 } = options;
  requireCounts(counts, "the table");
  requireConfidence(confidence);
  const result = chanceCorrected(counts, agreementWeights("none", counts[0]?.length ?? 0), dot, confidence);
  if (!result.ok) return result;
  const { n, coefficient, observed, expected } = result;
  return { ok: true, n, kappa: coefficient, observed, expected, ...equalTotalsParts(counts) };
}

function equalTotalsParts(counts: CountTable): Pick<FleissKappa, "standardErrorNull" | "perCategory"> {
  const subjects = counts.filter((row) => sum(row) > 0);
  const raters = sum(subjects[0] ?? []);
  if (subjects.some((row) => sum(row) !== raters)) return {};
  const ratings = subjects.length * raters;
  const shares = columnSums(subjects).map((total) => total / ratings);
  const spreads = shares.map((share) => share * (1 - share));
  const spread = sum(spreads);
  const skew = sum(shares.map((share) => share * (1 - share) * (1 - 2 * share)));
  const categoryError = Math.sqrt(2 / (ratings * (raters - 1)));
  return {
    standardErrorNull: (categoryError * Math.sqrt(spread ** 2 - skew)) / spread,
    perCategory: spreads.map((categorySpread, category) => {
      if (categorySpread === 0) return { standardErrorNull: categoryError };
      const split = sum(
        subjects.map((row) => {
          const count = row[category] ?? 0;
          return count * (raters - count);
        }),
      );
      return { kappa: 1 - split / (ratings * (raters - 1) * categorySpread), standardErrorNull: categoryError };
    }),
  };
}
