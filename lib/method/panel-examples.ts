import {
  caseDisagreement,
  cohenKappa,
  congerKappa,
  fleissKappa,
  gwetAC,
  intraclassCorrelation,
  krippendorffAlpha,
  lightKappa,
} from "@/lib/statistics";
import { ABSTRACTORS_2014, ANXIETY, JUDGES_1979, KRIPPENDORFF_2011, PSYCHIATRIC_1971 } from "./examples";
import { pairsOfTable } from "./kappa-examples";
import { countsTable, type ExampleTable, ends, known, present, type WorkedExample } from "./worked-example";

const PSYCHIATRIC_DATA = "30 patients, six psychiatrists each, five diagnoses: Fleiss (1971), table 1.";

export function fleissKappaExample(): WorkedExample {
  const { categories, ratings } = PSYCHIATRIC_1971;
  const counts = ratings.map((row) => categories.map((_, code) => row.filter((rating) => rating === code + 1).length));
  const result = known(fleissKappa(counts));
  const perCategory = present(result.perCategory);
  const printed = [0.245, 0.245, 0.52, 0.471, 0.566];
  return {
    data: PSYCHIATRIC_DATA,
    tables: [
      {
        caption: `How many of the six gave each diagnosis: ${categories.join(", ")}`,
        heads: ["patient", "depr.", "pers.", "schiz.", "neur.", "other"],
        rows: counts.map((cells, patient) => ({ head: `${patient + 1}`, cells })),
        isLong: true,
      },
    ],
    figures: [
      { label: "Kappa", value: result.kappa.estimate, digits: 3, printed: 0.43 },
      {
        label: "Kappa over its standard error at 0",
        value: result.kappa.estimate / present(result.standardErrorNull),
        digits: 1,
        printed: 17.7,
      },
      ...categories.map((category, index) => ({
        label: `Kappa of “${category}”`,
        value: present(perCategory[index]?.kappa),
        digits: 3,
        printed: printed[index],
      })),
      { label: "95 % interval", value: ends(result.kappa), digits: 3, recomputed: [0.3193953, 0.5410938] as const },
    ],
    note: "17.7 is quoted from memory and was checked by recomputation; it uses the standard error of 1979, because that of the 1971 paper is wrong.",
  };
}

export function lightKappaExample(): WorkedExample {
  return {
    data: `${PSYCHIATRIC_DATA} Columns as arranged in the R package irr.`,
    figures: [
      {
        label: "Mean kappa of 15 pairs",
        value: known(lightKappa(PSYCHIATRIC_1971.ratings)).kappa.estimate,
        digits: 3,
        printed: 0.459,
      },
    ],
    note: "The psychiatrists changed from patient to patient, so that this is a check of the arithmetic alone. Printed by irr; quoted from memory, checked by recomputation.",
  };
}

export function congerKappaExample(): WorkedExample {
  return {
    data: `${PSYCHIATRIC_DATA} Columns as arranged in the R package irr.`,
    figures: [
      {
        label: "Kappa",
        value: known(congerKappa(PSYCHIATRIC_1971.ratings)).kappa.estimate,
        digits: 3,
        printed: 0.442,
      },
    ],
    note: "A check of the arithmetic, as for Light’s kappa. Printed by irr; quoted from memory, checked by recomputation.",
  };
}

export function krippendorffExample(): WorkedExample {
  const alpha = (metric: "nominal" | "ordinal" | "interval") =>
    known(krippendorffAlpha(KRIPPENDORFF_2011, { metric })).alpha.estimate;
  return {
    data: "12 units, four observers, some values missing: Krippendorff (2011), sections C and D.",
    tables: [unitsTable("Values by unit")],
    figures: [
      { label: "Alpha, names", value: alpha("nominal"), digits: 3, printed: 0.743 },
      { label: "Alpha, ranks", value: alpha("ordinal"), digits: 3, printed: 0.815 },
      { label: "Alpha, measurements", value: alpha("interval"), digits: 3, printed: 0.849 },
    ],
    note: "Unit 12 has one value only and takes no part. An empty place is a missing value.",
  };
}

export function gwetExample(): WorkedExample {
  const { categories, table } = ABSTRACTORS_2014;
  const ratings = pairsOfTable(table);
  const plain = known(gwetAC(ratings));
  const linear = known(gwetAC(ratings, { weights: "linear" }));
  const quadratic = known(gwetAC(ratings, { weights: "quadratic" }));
  const toTableForm = Math.sqrt((plain.n - 1) / plain.n);
  return {
    data: "100 cases classified by two abstractors: Gwet (2014).",
    tables: [countsTable("Counts, first abstractor in rows", categories, table)],
    figures: [
      { label: "AC1", value: plain.coefficient.estimate, digits: 4, printed: 0.8493305 },
      {
        label: "Standard error, with n² as in 2008",
        value: present(plain.coefficient.standardError) * toTableForm,
        digits: 4,
        printed: 0.04321747,
      },
      { label: "Standard error, as used here", value: present(plain.coefficient.standardError), digits: 4 },
      { label: "AC2, linear weights", value: linear.coefficient.estimate, digits: 2, printed: 0.9 },
      { label: "AC2, quadratic weights", value: quadratic.coefficient.estimate, digits: 2, printed: 0.94 },
      {
        label: "Cohen’s kappa, for comparison",
        value: known(cohenKappa(table)).kappa.estimate,
        digits: 4,
        printed: 0.7964094,
      },
    ],
    note: "Tables of two raters printed from the 2008 paper divide the variance by n²; here it is n(n − 1), for two raters as for many.",
  };
}

export function intraclassExample(): WorkedExample {
  const icc = known(intraclassCorrelation(JUDGES_1979));
  const anxiety = known(intraclassCorrelation(ANXIETY));
  return {
    data: "Six targets, four judges: Shrout & Fleiss (1979), tables 2 to 4. Interval: the three raters of the data set anxiety, R package irr.",
    tables: [
      {
        caption: "Ratings",
        heads: ["target", "judge 1", "judge 2", "judge 3", "judge 4"],
        rows: JUDGES_1979.map((cells, target) => ({ head: `${target + 1}`, cells })),
      },
    ],
    figures: [
      { label: "ICC(1,1)", value: present(icc.icc11).estimate, digits: 2, printed: 0.17 },
      { label: "ICC(2,1)", value: present(icc.icc21).estimate, digits: 2, printed: 0.29 },
      { label: "ICC(3,1)", value: present(icc.icc31).estimate, digits: 2, printed: 0.71 },
      { label: "ICC(1,k)", value: present(icc.icc1k).estimate, digits: 2, printed: 0.44 },
      { label: "ICC(2,k)", value: present(icc.icc2k).estimate, digits: 2, printed: 0.62 },
      { label: "ICC(3,k)", value: present(icc.icc3k).estimate, digits: 2, printed: 0.91 },
      { label: "ICC(2,1), anxiety", value: present(anxiety.icc21).estimate, digits: 3, printed: 0.198 },
      { label: "95 % interval, anxiety", value: ends(present(anxiety.icc21)), digits: 3, printed: [-0.039, 0.494] },
    ],
    note: "The same ratings give 0.17 or 0.91: a coefficient without its form says nothing. The anxiety values are quoted from memory and were checked by recomputation.",
  };
}

export function caseDisagreementExample(): WorkedExample {
  const { cases } = known(caseDisagreement(KRIPPENDORFF_2011));
  const unit = (number: number) => known(present(cases[number - 1]));
  return {
    data: "The 12 units of Krippendorff (2011), taken as cases.",
    tables: [unitsTable("Values by unit")],
    figures: [
      { label: "Unit 3, share of the modal label", value: unit(3).share, digits: 2, recomputed: 1 },
      { label: "Unit 3, entropy in bits", value: unit(3).entropy, digits: 2, recomputed: 0 },
      { label: "Unit 2, share of the modal label", value: unit(2).share, digits: 2, recomputed: 0.75 },
      { label: "Unit 2, entropy in bits", value: unit(2).entropy, digits: 2, recomputed: 0.8112781 },
      { label: "Unit 6, share of the modal label", value: unit(6).share, digits: 2, recomputed: 0.25 },
      { label: "Unit 6, entropy in bits", value: unit(6).entropy, digits: 2, recomputed: 2 },
    ],
    note: "Only unit 6 splits its observers. Recomputed here means by hand: four different labels are 2 bits, three to one is 2 − ¾ of the binary logarithm of 3.",
  };
}

function unitsTable(caption: string): ExampleTable {
  return {
    caption,
    heads: ["unit", "A", "B", "C", "D"],
    rows: KRIPPENDORFF_2011.map((cells, unit) => ({ head: `${unit + 1}`, cells })),
    isLong: true,
  };
}
