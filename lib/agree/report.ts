import type { Scale } from "./read-values";

/** The result of a statistic: its parts, or `ok` false and the reason. Cases, pairs and rounds go by their names in it. */
export type Outcome = { ok: boolean; n: number; reason?: string; [part: string]: unknown };

/** One figure with everything that belongs to it, or the reason why there is none. */
export type Statistic = {
  /** The name of the function that computed it. */
  statistic: StatisticName;
  /** What it is of: "direction", "horizontal degrees", "values". */
  of: string;
  /** Which form of it: "linear weights". */
  variant?: string;
  result: Outcome;
  /** What `n` counts, where that is neither cases nor readings. */
  nOf?: string;
};

export type Section = { title: string; statistics: Statistic[] };

export type Report = {
  table: "findings" | "values";
  scale?: Scale;
  caseCount: number;
  readingCount: number;
  examiners: string[];
  rounds: string[];
  hasReference: boolean;
  sections: Section[];
};

/** For intervals that have no formula. The same table always gives the same ones. */
export const BOOTSTRAP = { resamples: 2000, seed: 1 };

/** In words, for people. Keys are the names for machines. */
export const STATISTIC_TITLES = {
  caseDisagreement: "how each case was read",
  cohenKappa: "Cohen's kappa",
  compareKappas: "kappa over the rounds",
  concordance: "Lin's concordance correlation",
  congerKappa: "Conger's kappa",
  cusum: "CUSUM chart of bias",
  errorKinds: "kinds of error",
  ewma: "EWMA chart of bias",
  fleissKappa: "Fleiss' kappa",
  gwetAC: "Gwet's agreement coefficient",
  intraclassCorrelation: "intraclass correlations",
  krippendorffAlpha: "Krippendorff's alpha",
  lightKappa: "Light's kappa",
  limitsOfAgreement: "bias and limits of agreement",
  limitsWithMean: "limits of agreement with the mean of the panel",
  limitsWithReplicates: "limits of agreement of single readings, from repeats",
  pairwiseKappa: "Cohen's kappa of each pair",
  repeatability: "repeatability",
  shewhart: "Shewhart chart of bias",
  theilSen: "Theil-Sen line on the reference",
  twoWayBias: "bias of each, freed from which cases they read",
  wilsonInterval: "share",
} as const;
export type StatisticName = keyof typeof STATISTIC_TITLES;
