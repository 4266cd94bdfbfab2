import {
  agreementScoreExample,
  errorKindsExample,
  signedExample,
  stepsExample,
  toleranceExample,
} from "@/lib/method/scoring-examples";
import { abs, cases, frac, m, sub, words } from "./math";
import type { MethodEntry } from "./method-entry";

/** The rules by which one reading is held against its reference. */
export const SCORING_ENTRIES: readonly MethodEntry[] = [
  {
    id: "signed-components",
    title: "Direction label and signed components",
    answers:
      "What exactly is compared: one label of eye and direction for kappa, two signed numbers for limits of agreement.",
    formulas: [
      {
        math: m`h = ${cases(["+ size", "for eso"], ["− size", "for exo"], ["0", "for neither"])}`,
        reading: "the horizontal component is positive for eso and negative for exo.",
      },
      {
        math: m`v = ${cases(["+ size", "for R hyper, L hypo"], ["− size", "for L hyper, R hypo"], ["0", "for neither"])}`,
        reading:
          "the vertical component counts right over left as positive, so that it does not matter which eye was named.",
      },
    ],
    limits:
      "A size beyond the limbus has a direction and no number: it takes part in labels and steps and not in limits. The same vertical deviation can be named on either eye; for a purely vertical one the other eye is said beside the reading, and is no wrong direction. The photograph does not always show which eye deviates.",
    source: "Common practice, no source.",
    example: signedExample(),
  },
  {
    id: "steps",
    title: "Steps",
    answers: "Into which step a size goes for weighted kappa: the landmarks of the test, and beyond the limbus.",
    limits:
      "Each size goes to the nearest step, ties to the larger one. A reading of 22° for 23° is a step off and one of 8° for 22° is not, so look at the degrees too. Of a finding with two parts the larger one decides.",
    source: "Common practice, no source.",
    example: stepsExample(),
  },
  {
    id: "tolerance",
    title: "Within tolerance",
    answers: "Whether a size is near enough to its reference to count as read right.",
    formulas: [
      {
        math: m`${abs("x − X")} ≤ ${cases(["5°", "for X up to 20°"], ["0.25 X", "above"])}`,
        reading:
          "5 degrees either way for a reference up to 20 degrees, a quarter of it above. Horizontal and vertical must both be within.",
      },
    ],
    letters: [{ sign: m`x, X`, meaning: "signed component of the reading and of the reference" }],
    limits:
      "A reference below 5° horizontally or 3° vertically is borderline: a reading without that part is accepted. Beyond the limbus equals only beyond the limbus in the same direction. The tolerance is a choice of the department and not a finding: of 16 very experienced examiners, every one read at least one of four patients 10Δ or more too small (Choi & Kushner 1998).",
    source: "Common practice, no source. Experienced examiners: Choi & Kushner, Ophthalmology 1998; 105: 1301-1306.",
    example: toleranceExample(),
  },
  {
    id: "error-kinds",
    title: "Kinds of error",
    answers: "What is wrong with a reading that does not agree: one kind each, the first of the list that fits.",
    limits:
      "All but the last two are blunders: they are counted, and kept out of the statistics of size. A unit slip is a size about twice too large or half too small (a ratio of 1.7 to 2.2 or of 0.45 to 0.58), as when prism dioptres are written for degrees; a true misjudgement can look the same. The kind blames the reading, not the person.",
    source: "Our own list, from common practice; no source.",
    example: errorKindsExample(),
  },
  {
    id: "agreement-score",
    title: "Agreement score",
    answers:
      "How well one person agrees with the references of a round: two figures side by side, each with its interval, and no composite of them.",
    formulas: [
      {
        math: m`${sub("p", words("right"))} = ${frac("k", "n")}`,
        reading:
          "the share of the cases read whose label is the same and whose size is within tolerance, with its Wilson interval. Beside it stands Cohen’s kappa of the direction labels.",
      },
    ],
    limits:
      "Each case counts once; hidden repeats are left out. A score describes readings of this set under these conditions, not work in the clinic. Compare intervals, not second decimals: two examiners whose intervals overlap widely have not been told apart.",
    source: "Our own choice; kappa and interval as above.",
    example: agreementScoreExample(),
  },
];
