import { bootstrapExample, planningExample, wilsonExample } from "@/lib/method/precision-examples";
import { frac, m, root, sub, subSup, sup } from "./math";
import type { MethodEntry } from "./method-entry";

const movedShare = m`${sub("z", "0")} + ${sub("z", "p")}`;

/** How sure a figure is, and how many cases it takes. */
export const PRECISION_ENTRIES: readonly MethodEntry[] = [
  {
    id: "few-cases",
    title: "What few cases are worth, and planning",
    answers:
      "How wide the interval of a kappa or of a limit of agreement will be with so many cases, and how many cases a wished interval takes. Plainly: a kappa from 10 or 20 cases tells a good examiner from a guessing one and no more. With 20 cases and a true kappa of 0.80, the interval reaches 0.26 to both sides when two answers are equally common, and 0.45 when one answer is given nine times in ten. A limit of agreement from 20 pairs is known to within 0.8 standard deviations.",
    formulas: [
      {
        math: m`h = z ${root(frac("V", "n"))}`,
        reading:
          "the half-width of a kappa interval is 1.96 times the root of its variance for one case over n; the variance is that of Cohen’s kappa, for the table that the expected kappa and shares fix.",
      },
      {
        math: m`h = ${sub("t", "n − 1")} s ${root(m`${frac("1", "n")} + ${frac(sup("1.96", "2"), "2 (n − 1)")}`)}`,
        reading: "the half-width of the interval of a limit is the t quantile times the standard error of the limit.",
      },
      {
        math: m`h = ${frac("s", "2")} ~ ${frac(m`${subSup("t", "0.975", "′")} − ${subSup("t", "0.025", "′")}`, root("n"))}`,
        reading:
          "the exact half-width is half the distance of the two noncentral t quantiles, over the root of n, in standard deviations. The number of cases for a limit is the smallest whose exact half-width is not above the wished one.",
      },
    ],
    letters: [
      { sign: m`h`, meaning: "half-width of the 95 % interval" },
      { sign: m`V`, meaning: "n times the variance of kappa" },
      { sign: m`s`, meaning: "expected standard deviation of the differences" },
      { sign: m`${sup("t", "′")}`, meaning: "quantiles of noncentral t, as for the exact limits" },
    ],
    limits:
      "The plan for a kappa is for two readings and two answers only, and uses a large-sample variance, which is rough with few cases. Evenglint shows figures from fewer than 20 readings greyed, as too few to say; 20 is a floor against nonsense, not a number that suffices.",
    source:
      "Kappa: variance of Fleiss, Cohen & Everitt 1969, for planning Flack, Afifi, Lachenbruch & Schouten, Psychometrika 1988; 53: 321-325, and Cantor, Psychological Methods 1996; 1: 150-153. Limits: Bland & Altman 1999; Carkeet 2015.",
    example: planningExample(),
  },
  {
    id: "wilson-interval",
    title: "Wilson interval of a share",
    answers:
      "Between which values the true share lies, for k out of n: for observed agreement, and for the share of cases read with the right label and within tolerance.",
    formulas: [
      {
        math: m`${frac(m`2 k + ${sup("z", "2")}`, m`2 (n + ${sup("z", "2")})`)} ± ${frac("z", m`n + ${sup("z", "2")}`)} ${root(m`${frac("k (n − k)", "n")} + ${frac(sup("z", "2"), "4")}`)}`,
        reading:
          "the middle is twice k and z squared, over twice the sum of n and z squared; the reach is z over that sum, times the root of k times n less k over n, plus a quarter of z squared.",
      },
    ],
    letters: [{ sign: m`z`, meaning: "1.96 for a 95 % interval" }],
    limits:
      "It stays between 0 and 1, and gives an honest end even for none or all out of n. It takes the cases as independent: several readings of one case are not.",
    source:
      "Wilson, Journal of the American Statistical Association 1927; 22: 209-212; method 3 of Newcombe, Statistics in Medicine 1998; 17: 857-872.",
    example: wilsonExample(),
  },
  {
    id: "bootstrap",
    title: "Bootstrap interval",
    answers:
      "How much a figure would vary with other cases of the same kind, where no formula gives it. The figures of a whole panel have such intervals: cases are drawn again, not readings, because the readings of one case belong together.",
    formulas: [
      {
        math: m`(${subSup("θ", "0.025", "*")}, ${subSup("θ", "0.975", "*")})`,
        reading: "percentile interval: the values below which 2.5 and 97.5 of 100 resampled figures lie.",
      },
      {
        math: m`${sup("p", "′")} = Φ (${sub("z", "0")} + ${frac(movedShare, m`1 − a (${movedShare})`)})`,
        reading:
          "BCa: the two percentiles are moved for a bias of the median and for a standard error that changes with the value.",
      },
    ],
    letters: [
      { sign: m`${sup("θ", "*")}`, meaning: "the figure, computed from n cases drawn with replacement from the n" },
      {
        sign: m`${sub("z", "0")}`,
        meaning: "normal quantile of the share of resamples below the estimate, ties counted half",
      },
      { sign: m`a`, meaning: "acceleration: a sixth of the skewness as single cases are left out" },
      { sign: m`Φ, ${sub("z", "p")}`, meaning: "normal distribution, and its quantile at 0.025 and 0.975" },
    ],
    limits:
      "Resampling cannot invent what the cases do not show: from few cases the interval is too narrow, and when all agree it has no width at all. A fixed seed makes it repeatable. Resamples in which the figure cannot be computed are counted and left out.",
    source: "Efron & Tibshirani, An Introduction to the Bootstrap, 1993, chapters 13 and 14.",
    example: bootstrapExample(),
  },
];
