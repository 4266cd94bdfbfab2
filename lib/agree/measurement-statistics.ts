import { concordance } from "@/lib/statistics/concordance";
import type { Ratings, Readings } from "@/lib/statistics/input";
import { intraclassCorrelation } from "@/lib/statistics/intraclass-correlation";
import { krippendorffAlpha } from "@/lib/statistics/krippendorff-alpha";
import { limitsOfAgreement } from "@/lib/statistics/limits-of-agreement";
import { limitsWithMean } from "@/lib/statistics/limits-with-mean";
import { repeatability } from "@/lib/statistics/repeatability";
import { theilSen } from "@/lib/statistics/theil-sen";
import { type BiasReading, twoWayBias } from "@/lib/statistics/two-way-bias";
import { column } from "./panel-sections";
import { BOOTSTRAP, type Statistic } from "./report";

/** How far readings lie from a reference, case by case; every difference is reading minus reference. */
export function measureAgainst(readings: Readings, reference: Readings, of: string): Statistic[] {
  return [
    ...measurePair(readings, reference, of),
    { statistic: "theilSen", of, result: theilSen(reference, readings) },
  ];
}

/** How far two series of readings lie apart; every difference is first minus second. */
export function measurePair(first: Readings, second: Readings, of: string): Statistic[] {
  return [
    { statistic: "limitsOfAgreement", of, result: limitsOfAgreement(first, second) },
    { statistic: "concordance", of, result: concordance(first, second) },
  ];
}

/** How far a panel lies apart. Shape: cases × examiners, `null` = missing. */
export function measureAmong(rows: Ratings, examiners: readonly string[], of: string): Statistic[] {
  const limits = limitsWithMean(rows);
  const withNames = limits.ok
    ? { ...limits, offsets: limits.offsets.map((offset, index) => ({ examiner: examiners[index] ?? "", offset })) }
    : limits;
  const pair = examiners.length === 2 ? measurePair(column(rows, 0), column(rows, 1), of) : [];
  return [
    {
      statistic: "krippendorffAlpha",
      of,
      variant: "interval",
      result: krippendorffAlpha(rows, { metric: "interval", bootstrap: BOOTSTRAP }),
    },
    { statistic: "intraclassCorrelation", of, result: intraclassCorrelation(rows) },
    { statistic: "limitsWithMean", of, result: withNames },
    ...pair.map((statistic) => ({ ...statistic, variant: `${examiners[0]} minus ${examiners[1]}` })),
  ];
}

/** How far an examiner's repeats lie apart. Shape: one row of readings for each case. */
export function measureRepeats(replicates: Ratings, of: string): Statistic {
  return { statistic: "repeatability", of, result: repeatability(replicates) };
}

/** Biases of examiners, cases and rounds from all differences together. */
export function measureBias(differences: readonly BiasReading[], of: string): Statistic {
  return { statistic: "twoWayBias", of, result: twoWayBias(differences) };
}
