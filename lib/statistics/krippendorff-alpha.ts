import { beyondChance } from "./beyond-chance";
import { bootstrapInterval } from "./bootstrap";
import { type CountTable, columnSums, dot, sum } from "./count-tables";
import { requireConfidence } from "./input";
import { codeRatings, countByCategory, type Label, type LabelRatings } from "./labels";
import { type Estimate, InputError, type Result, refuse } from "./result";
import { withoutCancellation } from "./rounding";

/** How far apart two labels are: merely different, by their ranks in all ratings, or by their difference. */
export type AlphaMetric = "nominal" | "ordinal" | "interval";

export type AlphaOptions = {
  metric: AlphaMetric;
  /** Percentile interval from resampled units; the same seed gives the same interval. */
  bootstrap?: { resamples: number; seed: number };
  confidence?: number;
};

export type KrippendorffAlpha = {
  /** `low` and `high` only with a bootstrap. */
  alpha: Estimate;
  observedDisagreement: number;
  expectedDisagreement: number;
  /** How many ratings have another one of the same unit to be compared with. */
  pairable: number;
  /** With a bootstrap: the resamples without an alpha, because all their ratings were the same. */
  leftOut?: number;
};

type Disagreements = Pick<KrippendorffAlpha, "observedDisagreement" | "expectedDisagreement" | "pairable">;

/**
 * Krippendorff's alpha: 1 less the disagreement within units over the disagreement expected of the same ratings at
 * random. Any number of raters, missing ratings, and labels that are names, ranks or measurements.
 *
 * Shape: units × raters, `null` = missing; numbers for the ordinal and interval metric. A unit with one rating takes no
 * part; `n` counts the others. Refuses without such units, and where all their ratings are the same (0/0). Throws
 * InputError for an unknown metric, labels that do not suit it, and confidence outside (0, 1).
 * Source: Krippendorff, Computing Krippendorff's alpha-reliability, University of Pennsylvania 2011. Each unit's row of
 * the coincidence matrix is worked from its own counts; the ordinal metric is the interval metric on mid-ranks.
 */
export function krippendorffAlpha(ratings: LabelRatings, options: AlphaOptions): Result<KrippendorffAlpha> {
  const { metric, bootstrap, confidence = 0.95 } = options;
  requireConfidence(confidence);
  const coded = codeRatings(ratings);
  const distanceSum = distanceSumFor(metric, coded.categories);
  const units = countByCategory(coded).filter((counts) => sum(counts) >= 2);
  const n = units.length;
  if (n === 0) return refuse(0, "no unit was rated twice");
  const parts = disagreements(units, distanceSum);
  if (parts.expectedDisagreement === 0) return refuse(n, "one category only");
  const estimate = alphaOf(parts);
  if (!bootstrap) return { ok: true, n, alpha: { estimate }, ...parts };
  const alphaOfUnits = (indices: readonly number[]) =>
    alphaOf(
      disagreements(
        indices.map((index) => units[index] ?? []),
        distanceSum,
      ),
    );
  const interval = bootstrapInterval(n, alphaOfUnits, { ...bootstrap, method: "percentile", confidence });
  if (!interval.ok) return interval;
  const { ok, leftOut, n: _, ...alpha } = interval;
  return { ok, n, alpha, ...parts, leftOut };
}

/** Given the counts of all units together, the sum of squared distances over all ordered pairs of ratings in `counts`. */
type DistanceSum = (totals: readonly number[]) => (counts: readonly number[]) => number;

function distanceSumFor(metric: AlphaMetric, categories: readonly Label[]): DistanceSum {
  if (metric === "nominal") return () => (counts) => sum(counts) ** 2 - dot(counts, counts);
  if (metric !== "ordinal" && metric !== "interval") {
    throw new InputError(`metric is "nominal", "ordinal" or "interval"; got "${metric}".`);
  }
  const values = categories.filter((category) => typeof category === "number");
  if (values.length < categories.length) throw new InputError(`The ${metric} metric needs numbers as labels.`);
  if (metric === "interval") return () => (counts) => squaredDistances(counts, values);
  return (totals) => {
    const ranks = midRanks(totals);
    return (counts) => squaredDistances(counts, ranks);
  };
}

function disagreements(units: CountTable, distanceSum: DistanceSum): Disagreements {
  const totals = columnSums(units);
  const pairable = sum(totals);
  const distances = distanceSum(totals);
  const observed = sum(units.map((counts) => distances(counts) / (sum(counts) - 1)));
  return {
    observedDisagreement: observed / pairable,
    expectedDisagreement: distances(totals) / (pairable * (pairable - 1)),
    pairable,
  };
}

function alphaOf({ observedDisagreement, expectedDisagreement }: Disagreements): number {
  return beyondChance(expectedDisagreement - observedDisagreement, expectedDisagreement);
}

/** 2m·Σ(x − mean)² over m ratings: the squared differences of all their ordered pairs. */
function squaredDistances(counts: readonly number[], values: readonly number[]): number {
  const size = sum(counts);
  const mean = dot(counts, values) / size;
  let squares = 0;
  let squaredNumbers = 0;
  for (let category = 0; category < counts.length; category += 1) {
    const count = counts[category] ?? 0;
    const value = values[category] ?? 0;
    squares += count * (value - mean) ** 2;
    squaredNumbers += count * value ** 2;
  }
  return 2 * size * withoutCancellation(squares, squaredNumbers);
}

/** Ratings before a category plus half of its own: the distance between two is Krippendorff's ordinal one. */
function midRanks(totals: readonly number[]): number[] {
  let before = 0;
  return totals.map((count) => {
    before += count;
    return before - count / 2;
  });
}
