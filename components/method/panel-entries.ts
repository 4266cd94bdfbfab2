import {
  caseDisagreementExample,
  congerKappaExample,
  fleissKappaExample,
  gwetExample,
  intraclassExample,
  krippendorffExample,
  lightKappaExample,
} from "@/lib/method/panel-examples";
import { bar, frac, m, root, sub, subSup, sum, sup, words } from "./math";
import type { MethodEntry } from "./method-entry";

const expected = sub("p", "e");

/** Several examiners on the same cases, with each other. */
export const PANEL_ENTRIES: readonly MethodEntry[] = [
  {
    id: "fleiss-kappa",
    title: "Fleiss’ kappa",
    answers:
      "How well several examiners agree with each other on the direction, beyond chance, when it does not matter who gave which label. It is the kappa among examiners on the page of a round’s results.",
    formulas: [
      {
        math: m`${sub("a", "i")} = ${frac(m`${sum("k")} ${sub("n", "ik")} (${sub("n", "ik")} − 1)`, m`${sub("r", "i")} (${sub("r", "i")} − 1)`)}`,
        reading: "the agreement of a case is the share of its pairs of labels that are the same.",
      },
      {
        math: m`κ = ${frac(m`${bar("a")} − ${expected}`, m`1 − ${expected}`)} , ~ ${expected} = ${sum("k")} ${subSup("π", "k", "2")}`,
        reading:
          "kappa is the mean agreement less chance agreement, over one less chance agreement; chance agreement is the sum of the squared shares of the categories.",
      },
      {
        math: m`${sub("κ", "i")} = ${frac("n", sub("n", "2"))} ${frac(m`${sub("a", "i")} − ${expected}`, m`1 − ${expected}`)} − 2 (1 − κ) ${frac(m`${sub("e", "i")} − ${expected}`, m`1 − ${expected}`)}`,
        reading:
          "each case contributes its own agreement and takes back its part in chance agreement. The first term is 0 for a case with one label.",
      },
      {
        math: m`${sup("SE", "2")} = ${frac(m`${sum("i")} ${sup(m`(${sub("κ", "i")} − κ)`, "2")}`, "n (n − 1)")}`,
        reading:
          "the squared standard error is the spread of the contributions over n times n less one. The interval is by t on n less one degrees of freedom.",
      },
      {
        math: m`${sub("SE", "0")} = ${frac(root(m`2 ${sup("S", "2")} − 2 ${sum("k")} ${sub("π", "k")} ${sub("ρ", "k")} (${sub("ρ", "k")} − ${sub("π", "k")})`), m`S ${root("n r (r − 1)")}`)}`,
        reading:
          "the standard error that kappa has when it is 0, for equally many labels on each case; only for a test of that.",
      },
    ],
    letters: [
      { sign: m`${sub("n", "ik")}`, meaning: "labels k that case i got" },
      { sign: m`${sub("r", "i")}`, meaning: "all labels of case i" },
      { sign: m`${sub("π", "k")}, ${sub("ρ", "k")}`, meaning: "mean share of category k, and 1 less that" },
      { sign: m`S = ${sum("k")} ${sub("π", "k")} ${sub("ρ", "k")}`, meaning: "the sum of their products" },
      { sign: m`${sub("e", "i")}`, meaning: "chance agreement of the case’s own shares with the panel’s" },
      { sign: m`n, ${sub("n", "2")}`, meaning: "cases with a label, and cases with two or more" },
    ],
    limits:
      "It falls with a one-sided mix of cases as Cohen’s kappa does. It hides a single outlier among many, so look at the pairs as well. The interval counts the cases as a sample and the examiners as they are. It is undefined when only one category was used.",
    source:
      "Fleiss, Psychological Bulletin 1971; 76: 378-382. Standard error at 0: Fleiss, Nee & Landis, Psychological Bulletin 1979; 86: 974-977. The other one, and unequal numbers of labels: Gwet, Handbook of Inter-Rater Reliability, 4th ed. 2014.",
    example: fleissKappaExample(),
  },
  {
    id: "lights-kappa",
    title: "Light’s kappa and the kappa of each pair",
    answers: "How well the same examiners agree in pairs: Cohen’s kappa of each with each, and the mean of these.",
    formulas: [
      {
        math: m`${sub("κ", "L")} = ${frac("2", "g (g − 1)")} ${sum("i < j")} ${sub("κ", "ij")}`,
        reading: "Light’s kappa is the mean of the kappas of all pairs.",
      },
    ],
    letters: [
      { sign: m`g`, meaning: "examiners" },
      { sign: m`${sub("κ", "ij")}`, meaning: "Cohen’s kappa of examiners i and j on the cases that both read" },
    ],
    limits:
      "The mean has no interval here. It is refused when one pair has no kappa, because leaving the pair out would change what it is the mean of. One examiner who differs from all others is seen in the pairs and hardly in the mean.",
    source: "Light, Psychological Bulletin 1971; 76: 365-377.",
    example: lightKappaExample(),
  },
  {
    id: "congers-kappa",
    title: "Conger’s kappa",
    answers:
      "What Fleiss’ kappa would be if chance agreement came from each examiner’s own habits, as in Cohen’s kappa, instead of from the panel’s.",
    formulas: [
      {
        math: m`${expected} = ${sum("k")} (${subSup(bar("p"), "k", "2")} − ${frac(subSup("s", "k", "2"), "g")})`,
        reading:
          "chance agreement is the sum over categories of the squared mean share, less the variance of the examiners’ shares over their number. Observed agreement and kappa are then those of Fleiss.",
      },
    ],
    letters: [
      { sign: m`${sub(bar("p"), "k")}`, meaning: "mean over examiners of their own share of category k" },
      { sign: m`${subSup("s", "k", "2")}`, meaning: "variance of these shares, divisor g − 1" },
      { sign: m`g`, meaning: "examiners" },
    ],
    limits: "Only where the same examiners read throughout. For two it is Cohen’s kappa. No interval is given.",
    source: "Conger, Psychological Bulletin 1980; 88: 322-328; with missing readings Gwet 2014.",
    example: congerKappaExample(),
  },
  {
    id: "krippendorffs-alpha",
    title: "Krippendorff’s alpha",
    answers:
      "How well any number of examiners agree, with readings missing, on labels that are names, ranks or measurements: 1 for no disagreement, 0 for as much as if the values were shuffled.",
    formulas: [
      {
        math: m`α = 1 − ${frac(sub("D", "o"), sub("D", "e"))}`,
        reading: "alpha is one less observed disagreement over expected disagreement.",
      },
      {
        math: m`${sub("D", "o")} = ${frac("1", "N")} ${sum("u")} ${frac("1", m`${sub("m", "u")} − 1`)} ${sum("i ≠ j")} ${sup("δ", "2")} (${sub("v", "ui")}, ${sub("v", "uj")})`,
        reading:
          "observed disagreement averages the squared distances of the values within each case, a case with m values counting m times.",
      },
      {
        math: m`${sub("D", "e")} = ${frac("1", "N (N − 1)")} ${sum("c, k")} ${sub("n", "c")} ${sub("n", "k")} ${sup("δ", "2")} (c, k)`,
        reading: "expected disagreement averages the squared distances of all pairs of values in the table.",
      },
      {
        math: m`${sub("δ", words("ordinal"))} = ${sum("c ≤ g ≤ k")} ${sub("n", "g")} − ${frac(m`${sub("n", "c")} + ${sub("n", "k")}`, "2")}`,
        reading:
          "the distance of two ranks is the number of values from one to the other, with half of each end. For names the distance is 0 or 1, for measurements their difference.",
      },
    ],
    letters: [
      { sign: m`N`, meaning: "values that have another one of the same case beside them" },
      { sign: m`${sub("m", "u")}`, meaning: "values of case u" },
      { sign: m`${sub("n", "c")}`, meaning: "how often the value c was given among the N" },
    ],
    limits:
      "Alphas of different distances are different figures: name the one used. A one-sided mix of cases lowers it as it lowers kappa. There is no closed interval; where one is shown, it is a bootstrap over cases.",
    source: "Krippendorff, Computing Krippendorff’s alpha-reliability, University of Pennsylvania 2011.",
    example: krippendorffExample(),
  },
  {
    id: "gwets-ac",
    title: "Gwet’s AC1 and AC2",
    answers:
      "Agreement beyond chance with a chance term that does not grow when one answer is common. Read it beside kappa, so that a low kappa from a one-sided set of cases is not taken for a bad examiner.",
    formulas: [
      {
        math: m`${sub("p", "e")} = ${frac("T", "q (q − 1)")} ${sum("k")} ${sub("π", "k")} (1 − ${sub("π", "k")})`,
        reading:
          "chance agreement is the sum of all weights over q times q less one, times the sum of each share times one less that share.",
      },
      {
        math: m`AC = ${frac(m`${bar("a")} − ${sub("p", "e")}`, m`1 − ${sub("p", "e")}`)}`,
        reading:
          "the coefficient is mean agreement less chance agreement, over one less chance agreement. Mean agreement, standard error and interval are made as for Fleiss’ kappa.",
      },
    ],
    letters: [
      { sign: m`q`, meaning: "categories offered, those that nobody used included" },
      { sign: m`T`, meaning: "sum of all weights: q for AC1, more for AC2" },
      { sign: m`${sub("π", "k")}`, meaning: "mean share of category k" },
    ],
    limits:
      "It is not kappa on a better scale, and not to be compared with kappas: from the same readings it is usually higher. Unused categories count, so the list offered is part of the figure. AC2 depends on its weights as weighted kappa does.",
    source:
      "Gwet, British Journal of Mathematical and Statistical Psychology 2008; 61: 29-48; Gwet, Handbook of Inter-Rater Reliability, 4th ed. 2014.",
    example: gwetExample(),
  },
  {
    id: "intraclass-correlation",
    title: "Intraclass correlation",
    answers:
      "Which part of the variance of degrees is due to the cases and not to the examiners. Its six forms differ in two things: whether examiners are a sample or only these, and whether one reading or the mean of all is judged.",
    formulas: [
      { math: m`ICC(1,1) = ${frac("R − W", "R + (k − 1) W")}`, reading: "other examiners for each case, one reading." },
      {
        math: m`ICC(2,1) = ${frac("R − E", m`R + (k − 1) E + ${frac("k", "n")} (C − E)`)}`,
        reading: "examiners as a sample of many, one reading: what a different examiner would give.",
      },
      {
        math: m`ICC(3,1) = ${frac("R − E", "R + (k − 1) E")}`,
        reading: "these examiners only, one reading; their constant differences are forgiven.",
      },
      {
        math: m`ICC(1,k) = ${frac("R − W", "R")} , ICC(3,k) = ${frac("R − E", "R")}`,
        reading: "the same for the mean of all k examiners.",
      },
      {
        math: m`ICC(2,k) = ${frac("R − E", m`R + ${frac("C − E", "n")}`)}`,
        reading: "the mean of k examiners taken as a sample.",
      },
    ],
    letters: [
      { sign: m`R, C, E`, meaning: "mean squares between cases, between examiners, and residual" },
      { sign: m`W`, meaning: "mean square within cases" },
      { sign: m`n, k`, meaning: "cases that all read, and examiners" },
    ],
    limits:
      "It is high whenever the cases differ widely, however poor the examiners are, and low for a narrow set of cases read well: it measures how cases are told apart, not agreement in degrees. Use the limits of agreement for that. Only cases that every examiner read take part. Name the form.",
    source:
      "Shrout & Fleiss, Psychological Bulletin 1979; 86: 420-428, with their F tests and intervals; the interval of ICC(2,k) by Spearman-Brown from that of ICC(2,1).",
    example: intraclassExample(),
  },
  {
    id: "case-disagreement",
    title: "Case disagreement",
    answers: "Which cases split the panel. A split case is a question about the case first, and about people second.",
    formulas: [
      {
        math: m`H = − ${sum("k")} ${sub("p", "k")} ~${sub("log", "2")}~ ${sub("p", "k")}`,
        reading:
          "the entropy is the sum over labels of their share times the bits that a label of that share is worth.",
      },
    ],
    letters: [
      { sign: m`${sub("p", "k")}`, meaning: "share of the examiners who gave label k to the case" },
      { sign: m`H`, meaning: "entropy in bits: 0 when all agree, 1 for two labels half and half" },
    ],
    limits:
      "The modal label is the one most often given; a case is called split when no label has more than half of the readings (common practice, no source). With few examiners one reading moves both figures. A case that splits examiners who read well otherwise may have a wrong reference, or may show what cannot be told from a photograph.",
    source: "Entropy: Shannon, Bell System Technical Journal 1948; 27: 379-423.",
    example: caseDisagreementExample(),
  },
];
