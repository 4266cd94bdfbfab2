import { concordance, limitsOfAgreement, limitsWithMean, limitsWithReplicates, repeatability } from "@/lib/statistics";
import { CARDIAC_OUTPUT_1999, DENTISTS_1986, PEAK_FLOW_1986 } from "./examples";
import { type ExampleTable, ends, known, present, type WorkedExample } from "./worked-example";

const PEAK_FLOW_DATA =
  "Peak expiratory flow of 17 people in L/min, large Wright meter and mini meter: Bland & Altman (1986), table I.";

export function limitsExample(): WorkedExample {
  const { wright, mini } = PEAK_FLOW_1986;
  const limits = known(limitsOfAgreement(wright, mini));
  const bias = oneDecimal(limits.bias.estimate);
  const sd = oneDecimal(limits.sd);
  return {
    data: `${PEAK_FLOW_DATA} First readings, Wright minus mini.`,
    tables: [peakFlowTable(["wright", "mini"])],
    figures: [
      { label: "Bias", value: limits.bias.estimate, digits: 1, printed: -2.1 },
      { label: "95 % interval of the bias", value: ends(limits.bias), digits: 1, printed: [-22, 17.8] },
      { label: "SD of the differences", value: limits.sd, digits: 1, printed: 38.8 },
      { label: "Standard error of the bias", value: present(limits.bias.standardError), digits: 1, printed: 9.4 },
      {
        label: "Limits, as used here",
        value: [limits.lower.estimate, limits.upper.estimate],
        digits: 1,
        recomputed: [-78.0973, 73.862],
      },
      {
        label: "Limits, rounded bias ± 2 rounded SD",
        value: [bias - 2 * sd, bias + 2 * sd],
        digits: 1,
        printed: [-79.7, 75.5],
      },
      {
        label: "95 % interval of the upper limit",
        value: ends(limits.upper),
        digits: 1,
        recomputed: [39.1059312, 108.6180838],
      },
      {
        label: "Slope of difference on mean",
        value: present(limits.proportional).slope.estimate,
        digits: 3,
        recomputed: 0.0286874,
      },
    ],
    note: "The 1986 paper takes 2 for 1.96 and rounds bias and SD first. The interval of the upper limit spans 70 L/min: 17 people place a limit poorly.",
  };
}

export function exactLimitsExample(): WorkedExample {
  const { wright, mini } = PEAK_FLOW_1986;
  const { exact, lower, upper } = known(limitsOfAgreement(wright, mini));
  return {
    data: `${PEAK_FLOW_DATA} First readings, Wright minus mini.`,
    figures: [
      {
        label: "Lower limit, exact interval",
        value: ends(exact.lower),
        digits: 1,
        recomputed: [-124.1607983, -53.0949314],
      },
      {
        label: "Lower limit, approximate interval",
        value: ends(lower),
        digits: 1,
        recomputed: [-112.8533779, -43.3412253],
      },
      {
        label: "Upper limit, exact interval",
        value: ends(exact.upper),
        digits: 1,
        recomputed: [48.8596373, 119.9255042],
      },
      {
        label: "Upper limit, approximate interval",
        value: ends(upper),
        digits: 1,
        recomputed: [39.1059312, 108.6180838],
      },
    ],
    note: "The exact interval lies further out on both sides. Not printed in the paper; recomputed with R and SciPy from Carkeet’s formula.",
  };
}

export function replicatesExample(): WorkedExample {
  const { ventriculography, impedance } = CARDIAC_OUTPUT_1999;
  const constant = known(limitsWithReplicates(ventriculography, impedance));
  const varying = known(limitsWithReplicates(ventriculography, impedance, { trueValue: "varying" }));
  return {
    data: "Cardiac output of 12 people in L/min by radionuclide ventriculography and impedance cardiography, 3 to 6 pairs each: Bland & Altman (1999), table 4.",
    tables: [
      {
        caption: "Readings of each person, ventriculography and impedance",
        isText: true,
        heads: ["person", "ventriculography", "impedance"],
        rows: ventriculography.map((readings, person) => ({
          head: `${person + 1}`,
          cells: [readings.join(", "), present(impedance[person]).join(", ")],
        })),
        isLong: true,
      },
    ],
    figures: [
      { label: "Bias, true value constant", value: constant.bias.estimate, digits: 4, printed: 0.7092 },
      {
        label: "Limits, true value constant",
        value: [constant.lower.estimate, constant.upper.estimate],
        digits: 2,
        printed: [-1.35, 2.77],
      },
      { label: "Bias, true value varying", value: varying.bias.estimate, digits: 2, printed: 0.6 },
      { label: "SD, true value varying", value: varying.sd, digits: 2, printed: 0.99 },
      {
        label: "Limits, true value varying",
        value: [varying.lower.estimate, varying.upper.estimate],
        digits: 2,
        recomputed: [-1.3394566, 2.5437899],
      },
    ],
    note: "The printed values are quoted from memory and were checked by recomputation.",
  };
}

export function limitsWithMeanExample(): WorkedExample {
  const { limit, offsets } = known(limitsWithMean(DENTISTS_1986));
  const expected = [-0.875, -0.675, 2.625, -1.075];
  return {
    data: "DMFS scores of 10 patients by four dentists: Fleiss (1986), reused by Jones, Dobson & O’Brian (2011).",
    tables: [
      {
        caption: "Scores",
        heads: ["patient", "A", "B", "C", "D"],
        rows: DENTISTS_1986.map((cells, patient) => ({ head: `${patient + 1}`, cells })),
        isLong: true,
      },
    ],
    figures: [
      { label: "Limit, each way", value: limit.estimate, digits: 2, recomputed: 4.0077549 },
      { label: "95 % interval of the limit", value: ends(limit), digits: 2, recomputed: [3.073835, 11.4479287] },
      ...offsets.map((offset, index) => ({
        label: `Dentist ${"ABCD".charAt(index)}, offset from the mean`,
        value: offset,
        digits: 3,
        recomputed: expected[index],
      })),
    ],
    note: "Dentist C scores 2.6 above the panel, and with four dentists the interval is wide upwards. Recomputed with R and the package loamr; the text of the 2011 paper was not at hand.",
  };
}

export function repeatabilityExample(): WorkedExample {
  const { wright, wrightAgain, mini, miniAgain } = PEAK_FLOW_1986;
  const repeats = (first: readonly number[], second: readonly number[]) =>
    known(repeatability(first.map((value, person) => [value, second[person] ?? null])));
  const large = repeats(wright, wrightAgain);
  const small = repeats(mini, miniAgain);
  return {
    data: `${PEAK_FLOW_DATA} First and second reading with each meter.`,
    tables: [peakFlowTable(["wright", "wrightAgain", "mini", "miniAgain"])],
    figures: [
      { label: "Within-person SD, Wright", value: large.withinSd.estimate, digits: 1, recomputed: 15.3066691 },
      { label: "95 % interval", value: ends(large.withinSd), digits: 1, recomputed: [11.4859346, 22.9469009] },
      {
        label: "Repeatability coefficient, Wright",
        value: large.coefficient.estimate,
        digits: 1,
        recomputed: 42.427922,
      },
      { label: "Within-person SD, mini", value: small.withinSd.estimate, digits: 1, recomputed: 19.9108306 },
      {
        label: "Repeatability coefficient, mini",
        value: small.coefficient.estimate,
        digits: 1,
        recomputed: 55.1900068,
      },
    ],
    note: "Published data; recomputed with R, because the paper gives twice the SD of the differences instead.",
  };
}

export function concordanceExample(): WorkedExample {
  const { wright, mini } = PEAK_FLOW_1986;
  const { rho } = known(concordance(wright, mini));
  return {
    data: `${PEAK_FLOW_DATA} First readings.`,
    figures: [
      { label: "Concordance", value: rho.estimate, digits: 3, recomputed: 0.9427424 },
      { label: "95 % interval", value: ends(rho), digits: 3, recomputed: [0.8504919, 0.9787263] },
    ],
    note: "Recomputed with R and the package epiR. A concordance of 0.94 beside limits of about ± 76 L/min: the people differ a great deal, and that is what makes it high.",
  };
}

function oneDecimal(value: number): number {
  return Math.round(value * 10) / 10;
}

const METER_HEADS = { wright: "Wright", wrightAgain: "Wright again", mini: "mini", miniAgain: "mini again" };

function peakFlowTable(meters: readonly (keyof typeof PEAK_FLOW_1986)[]): ExampleTable {
  return {
    caption: "Peak flow, L/min",
    heads: ["person", ...meters.map((meter) => METER_HEADS[meter])],
    rows: PEAK_FLOW_1986.wright.map((_, person) => ({
      head: `${person + 1}`,
      cells: meters.map((meter) => PEAK_FLOW_1986[meter][person] ?? null),
    })),
    isLong: true,
  };
}
