import {
  cohenKappaExample,
  compareKappasExample,
  prevalenceExample,
  weightedKappaExample,
} from "@/lib/method/kappa-examples";
import { abs, bar, frac, m, root, sub, subSup, sum, sup } from "./math";
import type { MethodEntry } from "./method-entry";

const observed = sub("p", "o");
const expected = sub("p", "e");

/** Two readings of the same cases, as labels: an examiner against the reference, or with oneself. */
export const KAPPA_ENTRIES: readonly MethodEntry[] = [
  {
    id: "cohens-kappa",
    title: "Cohen’s kappa",
    answers:
      "Whether two sets of labels agree more often than the habits of the two would make them agree by chance. Each examiner’s direction labels are held against the reference with it. It is 1 when all labels agree, 0 when they agree as often as by chance, and negative when less often.",
    formulas: [
      {
        math: m`κ = ${frac(m`${observed} − ${expected}`, m`1 − ${expected}`)}`,
        reading: "kappa is observed agreement less chance agreement, over one less chance agreement.",
      },
      {
        math: m`${expected} = ${sum("k")} ${sub("r", "k")} ${sub("c", "k")}`,
        reading: "chance agreement is the sum over categories of the first one’s share times the second one’s.",
      },
      {
        math: m`${sub("a", "ij")} = ${sub("w", "ij")} (1 − ${expected}) − (${sub("u", "i")} + ${sub("v", "j")}) (1 − ${observed})`,
        reading:
          "for each cell, its weight times one less chance agreement, less the mean weights of its row and column times one less observed agreement.",
      },
      {
        math: m`${sup("SE", "2")} = ${frac(
          m`${sum("ij")} ${sub("p", "ij")} ${subSup("a", "ij", "2")} − ${sup(m`(${observed} ${expected} − 2 ${expected} + ${observed})`, "2")}`,
          m`n ${sup(m`(1 − ${expected})`, "4")}`,
        )}`,
        reading:
          "the squared standard error is the mean of the squared cells less the square of their mean, over n times the fourth power of one less chance agreement. The interval is kappa plus and minus 1.96 standard errors.",
      },
    ],
    letters: [
      { sign: m`${observed}, ${expected}`, meaning: "agreement seen, and agreement expected by chance" },
      {
        sign: m`${sub("r", "k")}, ${sub("c", "k")}`,
        meaning: "share of category k among the first and the second labels",
      },
      { sign: m`${sub("p", "ij")}`, meaning: "share of cases that got i first and j second" },
      { sign: m`${sub("w", "ij")}`, meaning: "weight of that cell: here 1 where i and j are the same, otherwise 0" },
      {
        sign: m`${sub("u", "i")}, ${sub("v", "j")}`,
        meaning: "mean weight of row i under the second one’s shares, and of column j under the first one’s",
      },
      { sign: m`n`, meaning: "cases with both labels" },
    ],
    limits:
      "Kappa depends on how the cases are mixed: see prevalence and bias. Kappas of rounds with a different mix are not comparable. The interval is a large-sample one; it is not cut at 1, and from few cases it is rough as well as wide. Kappa cannot be computed when both used one and the same category only. Fewer than 20 readings are shown as too few to say.",
    source:
      "Cohen, Educational and Psychological Measurement 1960; 20: 37-46. Standard error: Fleiss, Cohen & Everitt, Psychological Bulletin 1969; 72: 323-327; the one that does not assume kappa 0.",
    example: cohenKappaExample(),
  },
  {
    id: "prevalence-and-bias",
    title: "Prevalence and bias indices, PABAK, largest kappa",
    answers:
      "Whether a low kappa comes from disagreement, from one answer being rare, or from two people using the answers unequally often.",
    formulas: [
      {
        math: m`PI = ${frac("a − d", "n")}`,
        reading: "the prevalence index is cases both called first less cases both called second, over n.",
      },
      {
        math: m`BI = ${frac("b − c", "n")}`,
        reading: "the bias index is the difference between the two kinds of disagreement, over n.",
      },
      {
        math: m`PABAK = ${frac(m`q ${observed} − 1`, "q − 1")}`,
        reading:
          "PABAK is the number of categories times observed agreement, less one, over the number of categories less one.",
      },
      {
        math: m`${sub("κ", "max")} = ${frac(m`${sum("k")} min(${sub("r", "k")}, ${sub("c", "k")}) − ${expected}`, m`1 − ${expected}`)}`,
        reading:
          "the largest kappa that these shares allow has the smaller of the two shares of each category as its agreement.",
      },
    ],
    letters: [
      { sign: m`a, d`, meaning: "cases that both put in the first, and both in the second category" },
      { sign: m`b, c`, meaning: "cases that only the first, and only the second of the two put in the first category" },
      { sign: m`q`, meaning: "number of categories; the indices are for two" },
    ],
    limits:
      "PABAK is no better kappa: it only says what kappa would be if all categories were equally common and used alike. With two categories it is observed agreement on another scale. Read kappa, observed agreement and the indices together.",
    source:
      "Byrt, Bishop & Carlin, Journal of Clinical Epidemiology 1993; 46: 423-429. The paradox: Feinstein & Cicchetti, Journal of Clinical Epidemiology 1990; 43: 543-549.",
    example: prevalenceExample(),
  },
  {
    id: "weighted-kappa",
    title: "Weighted kappa",
    answers:
      "How well two sets of steps agree when a near miss counts as part of an agreement. The size of a deviation is held against the reference in steps of 0, 15, 30, 45 and beyond 45 degrees with it.",
    formulas: [
      {
        math: m`${sub("w", "ij")} = 1 − ${frac(abs("i − j"), "q − 1")}`,
        reading: "linear weights lose the same for each step apart.",
      },
      {
        math: m`${sub("w", "ij")} = 1 − ${sup(m`(${frac("i − j", "q − 1")})`, "2")}`,
        reading: "quadratic weights lose by the square of the steps apart.",
      },
      {
        math: m`${observed} = ${sum("ij")} ${sub("w", "ij")} ${sub("p", "ij")}`,
        reading: "observed agreement is the weighted share of the cells.",
      },
      {
        math: m`${expected} = ${sum("ij")} ${sub("w", "ij")} ${sub("r", "i")} ${sub("c", "j")}`,
        reading:
          "chance agreement is the weighted share that independent labels would have. Kappa and its standard error are then those of Cohen’s kappa.",
      },
    ],
    letters: [{ sign: m`q`, meaning: "number of steps offered, those that nobody used included" }],
    limits:
      "The value depends on the weights and on where the steps end, so that both must be named with it. Quadratic weighted kappa comes close to the intraclass correlation and shares its fault: it is high as soon as the cases differ much.",
    source:
      "Cohen, Psychological Bulletin 1968; 70: 213-220; weights as in Fleiss & Cohen, Educational and Psychological Measurement 1973; 33: 613-619; standard error as above.",
    example: weightedKappaExample(),
  },
  {
    id: "comparing-kappas",
    title: "Comparing kappas",
    answers:
      "Whether kappas of different sets of cases differ by more than chance, and what their common value is. The drift board takes the centre of its kappa charts from it.",
    formulas: [
      {
        math: m`${bar("κ")} = ${frac(m`${sum("i")} ${sub("w", "i")} ${sub("κ", "i")}`, m`${sum("i")} ${sub("w", "i")}`)}`,
        reading: "the pooled kappa is the mean of the kappas, each weighted by its precision.",
      },
      {
        math: m`SE = ${frac("1", root(m`${sum("i")} ${sub("w", "i")}`))}`,
        reading: "its standard error is one over the root of the sum of the weights.",
      },
      {
        math: m`${sup("χ", "2")} = ${sum("i")} ${sub("w", "i")} ${sup(m`(${sub("κ", "i")} − ${bar("κ")})`, "2")}`,
        reading:
          "chi-square is the weighted sum of the squared distances from it, on one degree of freedom less than there are kappas.",
      },
    ],
    letters: [
      { sign: m`${sub("κ", "i")}`, meaning: "a kappa" },
      { sign: m`${sub("w", "i")}`, meaning: "its weight, 1 over its squared standard error" },
    ],
    limits:
      "The sets of cases must be independent: not for two examiners on the same photographs. Kappas that differ may only have had another mix of cases. With few cases the standard errors are themselves uncertain, and a kappa of exactly 1 has none, so that it cannot take part.",
    source: "Fleiss, Statistical Methods for Rates and Proportions, 2nd ed. 1981, section 13.1 (from memory).",
    example: compareKappasExample(),
  },
];
