import {
  concordanceExample,
  exactLimitsExample,
  limitsExample,
  limitsWithMeanExample,
  repeatabilityExample,
  replicatesExample,
} from "@/lib/method/degrees-examples";
import { bar, frac, m, root, sub, subSup, sum, sup } from "./math";
import type { MethodEntry } from "./method-entry";

const squared = (base: string, index: string) => subSup(base, index, "2");

/** Readings in degrees: how far apart they lie. */
export const DEGREES_ENTRIES: readonly MethodEntry[] = [
  {
    id: "limits-of-agreement",
    title: "Bias and limits of agreement",
    answers:
      "How far a reading in degrees lies from the reference on average, and between which limits 95 of 100 differences lie. Horizontal and vertical are kept apart, in signed components.",
    formulas: [
      {
        math: m`${bar("d")} ± 1.96 s`,
        reading: "the limits are the mean difference plus and minus 1.96 standard deviations of the differences.",
      },
      {
        math: m`${sub("SE", "bias")} = ${frac("s", root("n"))}`,
        reading: "the standard error of the bias is the standard deviation over the root of n.",
      },
      {
        math: m`${sub("SE", "limit")} = s ${root(m`${frac("1", "n")} + ${frac(sup("1.96", "2"), "2 (n − 1)")}`)}`,
        reading:
          "the standard error of a limit is the standard deviation times the root of one over n plus 1.96 squared over twice n less one. Intervals are by t on n less one degrees of freedom.",
      },
      {
        math: m`d = α + β ${frac("x + y", "2")}`,
        reading: "a line of the difference on the mean of the two shows whether the bias grows with the size.",
      },
    ],
    letters: [
      { sign: m`d`, meaning: "reading minus reference" },
      { sign: m`${bar("d")}, s`, meaning: "mean and standard deviation of the differences, divisor n − 1" },
      { sign: m`n`, meaning: "pairs in which both are readable and neither is beyond the limbus" },
    ],
    limits:
      "The limits describe single readings, and assume differences that are about normal and do not grow with the size: look at the plot and at the slope. One reversed direction is a difference of twice the angle and widens them beyond use, so directions are counted apart. Pairs left out are counted beside the figure. Several readings of one case are not independent. Limits from fewer than 20 pairs are shown as too few to say: each limit is then uncertain by about 0.8 standard deviations or more.",
    source:
      "Bland & Altman, Lancet 1986; 1: 307-310, and Statistical Methods in Medical Research 1999; 8: 135-160, whose standard error of a limit is used.",
    example: limitsExample(),
  },
  {
    id: "exact-limits",
    title: "Exact intervals of the limits",
    answers: "How uncertain a limit of agreement is when there are few pairs, without the large-sample shortcut.",
    formulas: [
      {
        math: m`${bar("d")} ± ${sub("t", "p")} (n − 1, z ${root("n")}) ${frac("s", root("n"))}`,
        reading:
          "each end of the interval of a limit is the mean difference plus or minus a quantile of the noncentral t distribution times the standard error of the mean.",
      },
    ],
    letters: [
      {
        sign: m`${sub("t", "p")} (f, c)`,
        meaning: "quantile p of noncentral t with f degrees of freedom and noncentrality c; p is 0.025 and 0.975",
      },
      { sign: m`z`, meaning: "normal quantile of the limit, 1.959964 for limits that hold 95 %" },
    ],
    limits:
      "Exact for normal differences only. Each limit has its interval by itself; both together are covered less often than 95 times in 100. The interval is not symmetric: it reaches further outwards.",
    source: "Carkeet, Optometry and Vision Science 2015; 92: e71-e80.",
    example: exactLimitsExample(),
  },
  {
    id: "limits-with-replicates",
    title: "Limits of agreement with replicates",
    answers: "The same limits for single readings, when each case was read several times by both.",
    formulas: [
      {
        math: m`${sup("s", "2")} = ${squared("s", "d")} + ${sub("c", "1")} ${squared("s", "1w")} + ${sub("c", "2")} ${squared("s", "2w")}`,
        reading:
          "true value constant: the variance of the differences of case means, plus what averaging took away from each of the two.",
      },
      {
        math: m`c = 1 − ${frac("1", "n")} ${sum("i")} ${frac("1", sub("m", "i"))}`,
        reading: "the part taken away is one less the mean of one over the number of readings.",
      },
      {
        math: m`${sup("s", "2")} = ${squared("s", "b")} + ${squared("s", "w")} , ${squared("s", "b")} = ${frac("B − W", sub("m", "0"))}`,
        reading:
          "true value varying: the variance between cases plus the variance within, from a one-way analysis of the paired differences.",
      },
    ],
    letters: [
      { sign: m`${squared("s", "d")}`, meaning: "variance of the differences of case means" },
      {
        sign: m`${squared("s", "1w")}, ${squared("s", "2w")}`,
        meaning: "variance within cases of the first and of the second",
      },
      {
        sign: m`${sub("m", "i")}, ${sub("m", "0")}`,
        meaning: "readings of a case, and their adjusted mean number; n is the number of cases",
      },
      { sign: m`B, W`, meaning: "mean squares between and within cases" },
    ],
    limits:
      "Choose constant where the case does not change, as a photograph does not, and varying where the two were read as pairs while it did. Replicates must be blind repeats; a remembered answer makes the variance within too small. Intervals take 1.96 and are rough below about 20 cases.",
    source: "Bland & Altman, Statistical Methods in Medical Research 1999; 8: 135-160, sections 5.1 to 5.3.",
    example: replicatesExample(),
  },
  {
    id: "limits-with-the-mean",
    title: "Limits of agreement with the mean of the panel",
    answers:
      "How far one examiner may lie from the mean of all examiners, when there is no reference to hold them against.",
    formulas: [
      {
        math: m`± 1.96 ${root(frac(m`${sub("SS", "B")} + ${sub("SS", "E")}`, "a b"))}`,
        reading:
          "plus and minus 1.96 times the root of the sums of squares between examiners and residual, over the number of readings.",
      },
    ],
    letters: [
      { sign: m`${sub("SS", "B")}, ${sub("SS", "E")}`, meaning: "sums of squares between examiners, and residual" },
      { sign: m`a, b`, meaning: "cases that all read, and examiners" },
    ],
    limits:
      "Agreement with the panel is not being right: a panel may be wrong together. The examiner is part of the mean, which draws the two together when the panel is small. Another version in use leaves the constant differences between examiners out; this one counts them. With few examiners the interval is wide upwards.",
    source:
      "Jones, Dobson & O’Brian, International Journal of Epidemiology 2011; 40: 1308-1313. Estimate and interval: Christensen, Borgbjerg, Børty & Bøgsted, BMC Medical Research Methodology 2020; 20: 304.",
    example: limitsWithMeanExample(),
  },
  {
    id: "repeatability",
    title: "Repeatability",
    answers:
      "How far apart two readings of one case by the same examiner may lie. Hidden repeats in a round are there for it.",
    formulas: [
      {
        math: m`${squared("s", "w")} = ${frac(m`${sum("i")} (${sub("m", "i")} − 1) ${squared("s", "i")}`, m`${sum("i")} (${sub("m", "i")} − 1)`)}`,
        reading:
          "the variance within cases is the mean of the variances of each case’s readings, weighted by their degrees of freedom.",
      },
      {
        math: m`r = 1.96 ${root("2")} ${sub("s", "w")}`,
        reading:
          "the coefficient is 1.96 times root two times the standard deviation within: 95 of 100 pairs of repeats differ by less.",
      },
    ],
    letters: [
      { sign: m`${sub("m", "i")}, ${squared("s", "i")}`, meaning: "number and variance of the readings of case i" },
      { sign: m`r`, meaning: "repeatability coefficient, in degrees" },
    ],
    limits:
      "It says nothing about being right: a constant error repeats perfectly. It assumes that the spread is the same for small and large deviations. The interval is by chi-square; from ten repeats it runs from about 0.7 to 1.8 times the value, so that twenty or more over several rounds are wanted.",
    source: "Bland & Altman, Statistical Methods in Medical Research 1999; 8: 135-160, section 2.",
    example: repeatabilityExample(),
  },
  {
    id: "lins-concordance",
    title: "Lin’s concordance correlation",
    answers:
      "How close pairs of readings lie to the line on which both are equal: 1 on it. Unlike a correlation it falls when one of the two reads higher throughout.",
    formulas: [
      {
        math: m`${sub("ρ", "c")} = ${frac(m`2 ${sub("s", "xy")}`, m`${squared("s", "x")} + ${squared("s", "y")} + ${sup(m`(${bar("x")} − ${bar("y")})`, "2")}`)}`,
        reading: "twice the covariance, over the sum of both variances and the squared difference of the means.",
      },
    ],
    letters: [
      { sign: m`${sub("s", "xy")}`, meaning: "covariance, divisor n" },
      { sign: m`${squared("s", "x")}, ${squared("s", "y")}`, meaning: "variances, divisor n" },
    ],
    limits:
      "As with the intraclass correlation, a wide spread of cases makes it high without better reading. It has no unit: say the limits of agreement with it. The interval is by Fisher’s z; there is none when the value is 1 or −1, or when one of the two is constant.",
    source: "Lin, Biometrics 1989; 45: 255-268; standard error as corrected in Biometrics 2000; 56: 324-325.",
    example: concordanceExample(),
  },
];
