import { cusumExample, ewmaExample, runLengthExample, shewhartExample } from "@/lib/method/drift-examples";
import { frac, m, root, sub, subSup, sup } from "./math";
import type { MethodEntry } from "./method-entry";

/** From round to round: charts, and what their limits mean. */
export const DRIFT_ENTRIES: readonly MethodEntry[] = [
  {
    id: "shewhart",
    title: "Shewhart chart",
    answers:
      "Whether the figure of one round lies further from its target than chance allows: for large sudden changes.",
    formulas: [
      {
        math: m`T ± 3 ${sub("σ", "i")}`,
        reading:
          "action lies beyond the target plus and minus three standard errors of that round’s figure, warning beyond two.",
      },
    ],
    letters: [
      { sign: m`T`, meaning: "target: 0 for a bias, the pooled value for kappa" },
      {
        sign: m`${sub("σ", "i")}`,
        meaning: "standard error of the figure in round i, so that a round with few readings has wide limits",
      },
    ],
    limits:
      "It has no memory: a slow slide stays inside for long. One point in 22 lies beyond the warning limits by chance and one in 370 beyond the action limits; with many examiners and measures some always do. A change of the cases looks like a change of the examiner, hence the anchor cases.",
    source:
      "Shewhart, Economic Control of Quality of Manufactured Product, 1931: limits at three sigma. Warning at two thirds of them: common practice, no source.",
    example: shewhartExample(),
  },
  {
    id: "ewma",
    title: "EWMA chart",
    answers:
      "Whether a figure has moved a little and stayed there: a moving average in which older rounds count less and less.",
    formulas: [
      {
        math: m`${sub("E", "i")} = λ ${sub("x", "i")} + (1 − λ) ${sub("E", "i − 1")} , ~ ${sub("E", "0")} = T`,
        reading:
          "the average is lambda times the new value plus one less lambda times the average before; it starts at the target.",
      },
      {
        math: m`${sub("V", "i")} = ${sup("λ", "2")} ${subSup("σ", "i", "2")} + ${sup("(1 − λ)", "2")} ${sub("V", "i − 1")}`,
        reading:
          "its variance is lambda squared times that of the value, plus one less lambda squared times the variance before.",
      },
      {
        math: m`T ± L ${root(sub("V", "i"))} → T ± L σ ${root(frac("λ", "2 − λ"))}`,
        reading:
          "the limits are the target plus and minus L standard deviations of the average; they widen to a steady width.",
      },
    ],
    letters: [
      { sign: m`λ`, meaning: "weight of the newest value, above 0 up to 1" },
      { sign: m`L`, meaning: "width of the limits" },
    ],
    limits:
      "A small lambda sees small shifts, and is slow for large ones. Neighbouring points are alike by construction: a row of points on one side is no second sign. Missing rounds leave the average where it was.",
    source: "Lucas & Saccucci, Technometrics 1990; 32: 1-12; unequal sigma by the variance of the weighted sum.",
    example: ewmaExample(),
  },
  {
    id: "cusum",
    title: "CUSUM chart",
    answers: "Whether values have gone the same way for some time: what lies beyond a slack is added up on both sides.",
    formulas: [
      {
        math: m`${subSup("S", "i", "+")} = max(0, ${subSup("S", "i − 1", "+")} + ${sub("z", "i")} − k)`,
        reading: "the upper sum adds what lies above the slack, and never falls below zero.",
      },
      {
        math: m`${subSup("S", "i", "−")} = max(0, ${subSup("S", "i − 1", "−")} − ${sub("z", "i")} − k)`,
        reading: "the lower sum adds what lies below it. Action is when either passes h, warning at two thirds of h.",
      },
    ],
    letters: [
      { sign: m`${sub("z", "i")}`, meaning: "value less target, in sigma" },
      { sign: m`k`, meaning: "slack: half the shift to be seen" },
      { sign: m`h`, meaning: "decision interval" },
    ],
    limits:
      "It is tuned to one size of shift. The sums are not set back after a signal, so that they stay beyond h until readings come back; the sum is not the size of the bias.",
    source: "Page, Biometrika 1954; 41: 100-115; head start: Lucas & Crosier, Technometrics 1982; 24: 199-205.",
    example: cusumExample(),
  },
  {
    id: "run-length",
    title: "Average run length",
    answers:
      "How many rounds a chart takes on average until it signals: long while nothing has changed, short after a shift. From a wished number of false alarms a year the limits follow, and from the limits how late a drift is seen.",
    formulas: [
      {
        math: m`A = 1 + Q A`,
        reading:
          "from each state of the chart, the run length is one point more than the mean of the run lengths of the states that it leads to. The states are narrow slices of the statistic; the result is extrapolated to slices of no width.",
      },
      {
        math: m`${frac("1", "A")} = ${frac("1", sup("A", "+"))} + ${frac("1", sup("A", "−"))}`,
        reading: "both sides of a CUSUM together signal as often as the two do apart.",
      },
    ],
    letters: [
      { sign: m`A`, meaning: "average run lengths, one for each state" },
      { sign: m`Q`, meaning: "probabilities of going from state to state without a signal" },
    ],
    limits:
      "It is for independent normal values with a sigma that is known; for few readings sigma is not, and false alarms are more frequent than computed. It is a mean of a very skew distribution: half of the false alarms come before about 0.7 of it (ln 2, as in a geometric distribution). It counts points, so four rounds a year take years to show what 12 show in one.",
    source:
      "Brook & Evans, Biometrika 1972; 59: 539-549; Lucas & Crosier, Technometrics 1982; 24: 199-205; Lucas & Saccucci, Technometrics 1990; 32: 1-12.",
    example: runLengthExample(),
  },
];
