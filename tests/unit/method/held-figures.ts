import { robustMeanExample, theilSenExample, twoWayBiasExample, zScoresExample } from "@/lib/method/bias-examples";
import {
  concordanceExample,
  exactLimitsExample,
  limitsExample,
  limitsWithMeanExample,
  repeatabilityExample,
  replicatesExample,
} from "@/lib/method/degrees-examples";
import { cusumExample, ewmaExample, runLengthExample, shewhartExample } from "@/lib/method/drift-examples";
import * as data from "@/lib/method/examples";
import {
  cohenKappaExample,
  compareKappasExample,
  prevalenceExample,
  weightedKappaExample,
} from "@/lib/method/kappa-examples";
import { schematicEyeExample } from "@/lib/method/optics-examples";
import {
  caseDisagreementExample,
  congerKappaExample,
  fleissKappaExample,
  gwetExample,
  intraclassExample,
  krippendorffExample,
  lightKappaExample,
} from "@/lib/method/panel-examples";
import { planningExample, wilsonExample } from "@/lib/method/precision-examples";
import type { FigureValue, WorkedExample } from "@/lib/method/worked-example";
import algorithmA from "../../reference/algorithm-a.json";
import arlCusum from "../../reference/arl-cusum.json";
import arlEwma from "../../reference/arl-ewma.json";
import cardiac from "../../reference/ba-cardiac-output-1999.json";
import peakFlow from "../../reference/ba-pefr-1986.json";
import cusumNist from "../../reference/chart-cusum-nist.json";
import ewmaNist from "../../reference/chart-ewma-nist.json";
import psychiatric from "../../reference/fleiss-1971-psychiatric.json";
import abstractors from "../../reference/gwet-table-3x3-abstractors.json";
import judges from "../../reference/icc-shrout-fleiss-1979.json";
import anxiety from "../../reference/irr-anxiety.json";
import diagnoses from "../../reference/kappa-fleiss-cohen-everitt-1969.json";
import paradox from "../../reference/kappa-paradox-feinstein-cicchetti-1990.json";
import krippendorff from "../../reference/krippendorff-4x12.json";
import dentists from "../../reference/loam-icc-dmfs-dentists.json";
import optics from "../../reference/optics-hirschberg-published.json";
import planningKappa from "../../reference/planning-kappa.json";
import planningLimits from "../../reference/planning-limits-of-agreement.json";
import slopes from "../../reference/theil-sen.json";
import wilson from "../../reference/wilson-interval.json";

const runLengthOptions = (id: string) => arlEwma.data.cases.find((entry) => entry.id === id);

/** What the reference file has for each figure that the page holds against something, by the label of the figure. */
type Held = Record<string, FigureValue | undefined>;

const first = peakFlow.expected.firstReadings;
const range = ({ low, high }: { low: number; high: number }): FigureValue => [low, high];
const pair = (values: readonly number[] | undefined): FigureValue => [
  values?.[0] ?? Number.NaN,
  values?.[1] ?? Number.NaN,
];
const { paradox1a, paradox1b } = paradox.expected.cases;
const creosoteExpected = algorithmA.expected.cases.creosote;
const kappaCases = planningKappa.expected.grid.find(({ kappa, prevalence }) => kappa === 0.8 && prevalence === 0.5)?.n;

/** The printed run lengths at the shifts shown. */
function atShifts(label: string, mu: readonly number[] | undefined, printed: readonly number[]): Held {
  return Object.fromEntries(
    data.RUN_LENGTH_SCHEMES.shifts.map((shift) => [`${label}, shift ${shift}`, printed[mu?.indexOf(shift) ?? -1]]),
  );
}

const shifts = runLengthOptions("LS90-0.5")?.mu;
const ewmaShifts = Array.isArray(shifts) ? shifts : [];

export const HELD: readonly (readonly [name: string, example: WorkedExample, held: Held])[] = [
  [
    "Cohen's kappa",
    cohenKappaExample(),
    {
      "Observed agreement": diagnoses.expected.unweighted.observedAgreement,
      "Agreement by chance": diagnoses.expected.unweighted.expectedAgreement,
      Kappa: diagnoses.published.kappa,
      "95 % interval": [diagnoses.expected.unweighted.ciLow, diagnoses.expected.unweighted.ciHigh],
      "Kappa, Gwet’s table": abstractors.published.kappa,
      "Standard error, Gwet’s table": abstractors.published.kappaSe,
    },
  ],
  [
    "prevalence and bias",
    prevalenceExample(),
    {
      "Observed agreement, A": paradox.published.paradox1a.observedAgreement,
      "Observed agreement, B": paradox.published.paradox1b.observedAgreement,
      "Kappa, A": paradox.published.paradox1a.kappa,
      "Kappa, B": paradox.published.paradox1b.kappa,
      "Prevalence index, A": paradox1a.prevalenceIndex,
      "Prevalence index, B": paradox1b.prevalenceIndex,
      "Bias index, B": paradox1b.biasIndex,
      "PABAK, A and B alike": paradox1a.pabak,
      "Largest kappa, B": paradox1b.kappaMax,
      "AC1, A": paradox1a.ac1,
      "AC1, B": paradox1b.ac1,
    },
  ],
  [
    "weighted kappa",
    weightedKappaExample(),
    {
      "Linear weights": anxiety.expected.kappa12.linear.kappa,
      "Quadratic weights": anxiety.published.kappa12Quadratic,
      "Quadratic, over its standard error at kappa 0": anxiety.published.kappa12QuadraticZ,
      "95 % interval, quadratic": [anxiety.expected.kappa12.quadratic.ciLow, anxiety.expected.kappa12.quadratic.ciHigh],
    },
  ],
  ["comparing kappas", compareKappasExample(), {}],
  [
    "Fleiss' kappa",
    fleissKappaExample(),
    {
      Kappa: psychiatric.published.fleissKappa,
      "Kappa over its standard error at 0": psychiatric.published.z,
      ...Object.fromEntries(
        data.PSYCHIATRIC_1971.categories.map((name, i) => [
          `Kappa of “${name}”`,
          psychiatric.published.categoryKappa[i],
        ]),
      ),
      "95 % interval": [psychiatric.expected.fleissGwetSe.ciLowT, psychiatric.expected.fleissGwetSe.ciHighT],
    },
  ],
  ["Light's kappa", lightKappaExample(), { "Mean kappa of 15 pairs": psychiatric.published.light }],
  ["Conger's kappa", congerKappaExample(), { Kappa: psychiatric.published.conger }],
  [
    "Krippendorff's alpha",
    krippendorffExample(),
    {
      "Alpha, names": krippendorff.published.nominal,
      "Alpha, ranks": krippendorff.published.ordinal,
      "Alpha, measurements": krippendorff.published.interval,
    },
  ],
  [
    "Gwet's AC",
    gwetExample(),
    {
      AC1: abstractors.published.ac1,
      "Standard error, with n² as in 2008": abstractors.published.ac1Se,
      "AC2, linear weights": abstractors.published.ac2Linear,
      "AC2, quadratic weights": abstractors.published.ac2Quadratic,
      "Cohen’s kappa, for comparison": abstractors.published.kappa,
    },
  ],
  [
    "intraclass correlation",
    intraclassExample(),
    {
      "ICC(1,1)": judges.published.ICC11,
      "ICC(2,1)": judges.published.ICC21,
      "ICC(3,1)": judges.published.ICC31,
      "ICC(1,k)": judges.published.ICC1k,
      "ICC(2,k)": judges.published.ICC2k,
      "ICC(3,k)": judges.published.ICC3k,
      "ICC(2,1), anxiety": anxiety.published.icc21,
      "95 % interval, anxiety": pair(anxiety.published.icc21Ci),
    },
  ],
  [
    "case disagreement", // by hand
    caseDisagreementExample(),
    {
      "Unit 3, share of the modal label": 1,
      "Unit 3, entropy in bits": 0,
      "Unit 2, share of the modal label": 3 / 4,
      "Unit 2, entropy in bits": 2 - 0.75 * Math.log2(3),
      "Unit 6, share of the modal label": 1 / 4,
      "Unit 6, entropy in bits": 2,
    },
  ],
  [
    "limits of agreement",
    limitsExample(),
    {
      Bias: peakFlow.published.bias,
      "95 % interval of the bias": pair(peakFlow.published.biasCi),
      "SD of the differences": peakFlow.published.sd,
      "Standard error of the bias": peakFlow.published.seBias,
      "Limits, as used here": [first.lower, first.upper],
      "Limits, rounded bias ± 2 rounded SD": [peakFlow.published.lower2sd, peakFlow.published.upper2sd],
      "95 % interval of the upper limit": range(first.approx1999.upperCi),
      "Slope of difference on mean": first.proportionalBias.slope,
    },
  ],
  [
    "exact limits",
    exactLimitsExample(),
    {
      "Lower limit, exact interval": range(first.exactIndividual.lowerCi),
      "Lower limit, approximate interval": range(first.approx1999.lowerCi),
      "Upper limit, exact interval": range(first.exactIndividual.upperCi),
      "Upper limit, approximate interval": range(first.approx1999.upperCi),
    },
  ],
  [
    "limits with replicates",
    replicatesExample(),
    {
      "Bias, true value constant": cardiac.published.unequalBias,
      "Limits, true value constant": [cardiac.published.unequalLower, cardiac.published.unequalUpper],
      "Bias, true value varying": cardiac.published.pairedBias,
      "SD, true value varying": cardiac.published.pairedSd,
      "Limits, true value varying": [cardiac.expected.pairedReplicates.lower, cardiac.expected.pairedReplicates.upper],
    },
  ],
  [
    "limits with the mean",
    limitsWithMeanExample(),
    {
      "Limit, each way": dentists.expected.loam.loam,
      "95 % interval of the limit": [dentists.expected.loam.ciLow, dentists.expected.loam.ciHigh],
      ...Object.fromEntries(
        dentists.expected.loam.observerOffsets.map((offset, i) => [
          `Dentist ${"ABCD"[i]}, offset from the mean`,
          offset,
        ]),
      ),
    },
  ],
  [
    "repeatability",
    repeatabilityExample(),
    {
      "Within-person SD, Wright": peakFlow.expected.repeatabilityX.sw,
      "95 % interval": [peakFlow.expected.repeatabilityX.swCiLow, peakFlow.expected.repeatabilityX.swCiHigh],
      "Repeatability coefficient, Wright": peakFlow.expected.repeatabilityX.repeatabilityCoefficient,
      "Within-person SD, mini": peakFlow.expected.repeatabilityY.sw,
      "Repeatability coefficient, mini": peakFlow.expected.repeatabilityY.repeatabilityCoefficient,
    },
  ],
  [
    "Lin's concordance",
    concordanceExample(),
    {
      Concordance: peakFlow.expected.ccc.ccc,
      "95 % interval": [peakFlow.expected.ccc.ciLowZ, peakFlow.expected.ccc.ciHighZ],
    },
  ],
  [
    "Wilson interval",
    wilsonExample(),
    Object.fromEntries(
      Object.entries(wilson.published).map(([share, printed]) => [share.replace("/", " out of "), pair(printed)]),
    ),
  ],
  [
    "planning",
    planningExample(),
    {
      "A limit from 100 cases, ± in SD": planningLimits.published.n100,
      "A limit from 200 cases, ± in SD": planningLimits.published.n200,
      "Cases for a limit within ± 0.5 SD": planningLimits.expected.sampleSize.find(
        ({ halfWidthInSd }) => halfWidthInSd === 0.5,
      )?.nExactHalfWidth,
      "Cases for kappa 0.80 within ± 0.10": kappaCases?.find(({ halfWidth }) => halfWidth === 0.1)?.n,
      "Cases for kappa 0.80 within ± 0.20": kappaCases?.find(({ halfWidth }) => halfWidth === 0.2)?.n,
    },
  ],
  [
    "Theil-Sen slope",
    theilSenExample(),
    {
      "Theil–Sen slope": slopes.expected.cases.oneOutlier.slope,
      "Theil–Sen intercept": slopes.expected.cases.oneOutlier.interceptMedianResidual,
    },
  ],
  [
    "robust mean",
    robustMeanExample(),
    {
      "Robust mean": creosoteExpected.mean,
      "Robust SD": creosoteExpected.sd,
      "Standard uncertainty of the mean": creosoteExpected.uncertainty,
    },
  ],
  [
    "z scores",
    zScoresExample(),
    { "z of 24.14": creosoteExpected.zScores[0], "z of 17.57": creosoteExpected.zScores[5] },
  ],
  [
    "bias of each examiner",
    twoWayBiasExample(),
    {
      "Residual mean square": judges.published.MSE,
      // Means of the columns less the mean of all, by hand.
      "Judge 1, effect": 46 / 6 - 127 / 24,
      "Judge 2, effect": 15 / 6 - 127 / 24,
    },
  ],
  ["Shewhart chart", shewhartExample(), {}],
  [
    "EWMA chart",
    ewmaExample(),
    {
      "Average after point 1": ewmaNist.published.ewma[0],
      "Average after point 8": ewmaNist.published.ewma[7],
      "Average after point 20": ewmaNist.published.ewma[19],
      "Steady limits": [ewmaNist.published.lcl, ewmaNist.published.ucl],
      "Points beyond them": ewmaNist.expected.signalsSteady.length,
    },
  ],
  [
    "CUSUM chart",
    cusumExample(),
    {
      "Upper sum after point 13": cusumNist.published.upper[12],
      "Upper sum after point 14": cusumNist.published.upper[13],
      "Lower sum after point 8": cusumNist.published.lower[7],
      "First signal at point": cusumNist.published.signals[0],
    },
  ],
  [
    "average run length",
    runLengthExample(),
    {
      ...atShifts("EWMA 0.5, width 3.071", ewmaShifts, arlEwma.published["LS90-0.5"]),
      ...atShifts("EWMA 0.03, width 2.437", ewmaShifts, arlEwma.published["LS90-0.03"]),
      ...atShifts("CUSUM k 0.5, h 4", arlCusum.data.cases[0]?.mu, arlCusum.published["k0.5-h4"].twoSided),
    },
  ],
  [
    "schematic eye",
    schematicEyeExample(),
    {
      "Schematic eye near zero, degrees per mm": optics.expected.geometricDegreesPerMm,
      "Schematic eye near zero, Δ per mm": optics.expected.geometricPrismDioptresPerMm,
    },
  ],
];
