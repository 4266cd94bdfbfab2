import { robustMeanExample, theilSenExample, twoWayBiasExample, zScoresExample } from "@/lib/method/bias-examples";
import { abs, frac, m, root, sub, subSup, sum, sup, words } from "./math";
import type { MethodEntry } from "./method-entry";

const starred = (letter: string) => sup(letter, "*");

/** Systematic error: slopes, robust means, scores and the bias of each examiner. */
export const BIAS_ENTRIES: readonly MethodEntry[] = [
  {
    id: "theil-sen",
    title: "Theil–Sen slope",
    answers:
      "Whether sizes are read too small or too large in proportion. A slope of reading on reference well below or above 1 points to another convention, such as 7° per mm, and not to many small errors.",
    formulas: [
      {
        math: m`b = ${sub(words("median"), "i < j")} ${frac(m`${sub("y", "j")} − ${sub("y", "i")}`, m`${sub("x", "j")} − ${sub("x", "i")}`)}`,
        reading: "the slope is the median of the slopes through all pairs of points with different x.",
      },
      { math: m`a = ${words("median")} (y − b x)`, reading: "the intercept is the median of what is left." },
    ],
    letters: [{ sign: m`x, y`, meaning: "size in the reference, and size read" }],
    limits:
      "Up to about 29 of 100 wild points do not move it (from memory). It needs references of several sizes. Its interval counts pairs by Kendall’s statistic and is left out where there are too few points.",
    source:
      "Theil, Indagationes Mathematicae 1950; 12: 85-91; Sen, Journal of the American Statistical Association 1968; 63: 1379-1389.",
    example: theilSenExample(),
  },
  {
    id: "robust-mean",
    title: "Robust mean and standard deviation",
    answers:
      "What a panel reads, and how much it varies, without letting one wild reading decide: for a reference by consensus.",
    formulas: [
      { math: m`${starred("x")} = ${words("median")} (x)`, reading: "start from the median," },
      {
        math: m`${starred("s")} = 1.483 ~${words("median")}~ ${abs(m`x − ${starred("x")}`)}`,
        reading: "and from 1.483 times the median distance from it.",
      },
      {
        math: m`${subSup("x", "i", "′")} = min(max(${sub("x", "i")}, ${starred("x")} − δ), ${starred("x")} + δ)`,
        reading: "pull in every value that lies further than delta from the robust mean.",
      },
      {
        math: m`${starred("x")} = ${words("mean")} (${sup("x", "′")})`,
        reading: "take the mean of these as the new robust mean.",
      },
      {
        math: m`${starred("s")} = 1.134 ${root(frac(m`${sum("i")} ${sup(m`(${subSup("x", "i", "′")} − ${starred("x")})`, "2")}`, "n − 1"))}`,
        reading: "take 1.134 times their standard deviation as the new one; repeat until neither changes.",
      },
      {
        math: m`u = ${frac(m`1.25 ${starred("s")}`, root("n"))}`,
        reading: "the standard uncertainty of the robust mean is 1.25 robust standard deviations over the root of n.",
      },
    ],
    letters: [
      { sign: m`${starred("x")}, ${starred("s")}`, meaning: "robust mean and standard deviation" },
      { sign: m`δ`, meaning: "1.5 robust standard deviations" },
      { sign: m`u`, meaning: "standard uncertainty of the robust mean" },
    ],
    limits:
      "It cannot run when half of the values or more are the same, because it would start at 0; that is then said. A panel that is wrong together stays wrong. A small department is a poor standard for itself, and whoever is scored is left out of the mean.",
    source: "Algorithm A of ISO 13528:2015, annex C.3, the same as in ISO 5725-5:1998 (from memory).",
    example: robustMeanExample(),
  },
  {
    id: "z-scores",
    title: "z and z′ scores",
    answers:
      "How far one reading lies from its reference, in units of what is tolerable; z′ when the reference is itself uncertain. Beyond 2 is a warning, beyond 3 calls for action.",
    formulas: [
      {
        math: m`z = ${frac("x − X", "σ")}`,
        reading: "z is the reading less the reference, over the standard deviation for assessment.",
      },
      {
        math: m`${sup("z", "′")} = ${frac("x − X", root(m`${sup("σ", "2")} + ${sup("u", "2")}`))}`,
        reading:
          "z prime divides by the root of that standard deviation squared and the uncertainty of the reference squared.",
      },
    ],
    letters: [
      { sign: m`x, X`, meaning: "reading and reference" },
      { sign: m`σ`, meaning: "standard deviation for assessment, chosen beforehand" },
      { sign: m`u`, meaning: "standard uncertainty of the reference" },
    ],
    limits:
      "About 5 of 100 scores of a perfectly ordinary examiner lie beyond 2 by chance, so that one warning says nothing. Scores of opposite sign cancel in a mean: look at their spread too. Where u is small beside the standard deviation for assessment the two scores are the same; where it is not, z alone would blame people for the reference, and a very uncertain reference lets z′ pass everybody.",
    source: "ISO 13528:2015 (from memory).",
    example: zScoresExample(),
  },
  {
    id: "two-way-bias",
    title: "Bias of each examiner, freed from the mix of cases",
    answers:
      "How far each examiner reads above or below the reference, when the examiners have not all read the same cases or rounds.",
    formulas: [
      {
        math: m`${sub("d", "ijk")} = μ + ${sub("e", "i")} + ${sub("c", "j")} + ${sub("r", "k")} + ${sub("ε", "ijk")}`,
        reading:
          "a difference is the mean of all, plus an effect of the examiner, of the case and of the round, plus what is left.",
      },
      {
        math: m`${sum("i")} ${sub("e", "i")} = ${sum("j")} ${sub("c", "j")} = ${sum("k")} ${sub("r", "k")} = 0`,
        reading:
          "the effects of each kind add up to zero, each level counting once; they are found by least squares. An examiner’s bias is the mean of all plus the examiner’s effect.",
      },
    ],
    letters: [
      { sign: m`${sub("d", "ijk")}`, meaning: "reading of examiner i of case j in round k, minus the reference" },
      { sign: m`${sub("e", "i")}, ${sub("c", "j")}, ${sub("r", "k")}`, meaning: "effects of examiner, case and round" },
      { sign: m`${sub("ε", "ijk")}`, meaning: "what is left; its standard deviation makes the intervals, by t" },
    ],
    limits:
      "It supposes that an examiner’s error is the same on every case but for chance. Examiners must share cases, and rounds must share anchor cases, or they cannot be compared and the program says so. Standard errors are those of reading error: they say nothing about other cases.",
    source: "Least squares of the crossed classification without interaction: Searle, Linear Models, 1971.",
    example: twoWayBiasExample(),
  },
];
