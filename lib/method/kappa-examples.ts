import { cohenKappa, compareKappas, crossTable, gwetAC } from "@/lib/statistics";
import { ABSTRACTORS_2014, ANXIETY, DIAGNOSES_1969, PARADOX_1990 } from "./examples";
import { countsTable, ends, known, present, type WorkedExample } from "./worked-example";

export function cohenKappaExample(): WorkedExample {
  const { categories, table } = DIAGNOSES_1969;
  const result = known(cohenKappa(table));
  const abstractors = known(cohenKappa(ABSTRACTORS_2014.table));
  return {
    data: "Diagnoses of 200 patients by two raters: Fleiss, Cohen & Everitt (1969). Standard error: 100 cases of Gwet (2014), whose table stands under Gwet’s AC.",
    tables: [countsTable("Counts, first rater in rows", categories, table)],
    figures: [
      { label: "Observed agreement", value: result.observed, digits: 3, recomputed: 0.7 },
      { label: "Agreement by chance", value: result.expected, digits: 3, recomputed: 0.475 },
      { label: "Kappa", value: result.kappa.estimate, digits: 3, printed: 0.429 },
      { label: "95 % interval", value: ends(result.kappa), digits: 3, recomputed: [0.3232998, 0.5338431] },
      { label: "Kappa, Gwet’s table", value: abstractors.kappa.estimate, digits: 4, printed: 0.7964094 },
      {
        label: "Standard error, Gwet’s table",
        value: present(abstractors.kappa.standardError),
        digits: 4,
        printed: 0.05891072,
      },
    ],
    note: "The printed 0.429 is quoted from memory and was checked by recomputation.",
  };
}

export function prevalenceExample(): WorkedExample {
  const { balanced, prevalent } = PARADOX_1990;
  const first = known(cohenKappa(balanced));
  const second = known(cohenKappa(prevalent));
  const ac1Of = (table: readonly (readonly number[])[]) => known(gwetAC(pairsOfTable(table))).coefficient.estimate;
  return {
    data: "Two tables of 100 cases, yes or no, read by two people: Feinstein & Cicchetti (1990).",
    tables: [
      countsTable("A: yes and no about as common", ["yes", "no"], balanced),
      countsTable("B: nearly all yes", ["yes", "no"], prevalent),
    ],
    figures: [
      { label: "Observed agreement, A", value: first.observed, digits: 2, printed: 0.85 },
      { label: "Observed agreement, B", value: second.observed, digits: 2, printed: 0.85 },
      { label: "Kappa, A", value: first.kappa.estimate, digits: 2, printed: 0.7 },
      { label: "Kappa, B", value: second.kappa.estimate, digits: 2, printed: 0.32 },
      { label: "Prevalence index, A", value: present(first.prevalenceIndex), digits: 2, recomputed: -0.05 },
      { label: "Prevalence index, B", value: present(second.prevalenceIndex), digits: 2, recomputed: 0.75 },
      { label: "Bias index, B", value: present(second.biasIndex), digits: 2, recomputed: 0.05 },
      { label: "PABAK, A and B alike", value: present(second.pabak), digits: 2, recomputed: 0.7 },
      { label: "Largest kappa, B", value: present(second.maximum), digits: 2, recomputed: 0.7727273 },
      { label: "AC1, A", value: ac1Of(balanced), digits: 2, recomputed: 0.7007481 },
      { label: "AC1, B", value: ac1Of(prevalent), digits: 2, recomputed: 0.808 },
    ],
    note: "The two agree on 85 of 100 cases each time. In B kappa is less than half of that in A, only because one answer is rare.",
  };
}

export function weightedKappaExample(): WorkedExample {
  const scores = [1, 2, 3, 4, 5, 6];
  const { counts } = known(
    crossTable(
      ANXIETY.map(([first]) => first),
      ANXIETY.map(([, second]) => second),
      scores,
    ),
  );
  const linear = known(cohenKappa(counts, { weights: "linear" }));
  const quadratic = known(cohenKappa(counts, { weights: "quadratic" }));
  return {
    data: "Scores from 1 to 6 of 20 subjects by the first two raters of the data set anxiety (artificial), R package irr.",
    tables: [countsTable("Counts, first rater in rows", scores.map(String), counts)],
    figures: [
      { label: "Linear weights", value: linear.kappa.estimate, digits: 3, recomputed: 0.1891892 },
      { label: "Quadratic weights", value: quadratic.kappa.estimate, digits: 3, printed: 0.297 },
      {
        label: "Quadratic, over its standard error at kappa 0",
        value: quadratic.kappa.estimate / quadratic.standardErrorNull,
        digits: 2,
        printed: 1.34,
      },
      {
        label: "95 % interval, quadratic",
        value: ends(quadratic.kappa),
        digits: 2,
        recomputed: [-0.0109619, 0.6044921],
      },
    ],
    note: "The printed values are quoted from memory and were checked by recomputation. With 20 cases the interval runs from no agreement to a good one.",
  };
}

export function compareKappasExample(): WorkedExample {
  const kappas = [cohenKappa(PARADOX_1990.balanced), cohenKappa(PARADOX_1990.prevalent)];
  const result = known(compareKappas(kappas));
  return {
    data: "The two tables of Feinstein & Cicchetti (1990) above, taken as one examiner in two rounds.",
    figures: [
      { label: "Pooled kappa", value: result.pooled.estimate, digits: 3 },
      { label: "95 % interval", value: ends(result.pooled), digits: 3 },
      { label: "Chi-square, 1 degree of freedom", value: result.chiSquare, digits: 2 },
      { label: "p", value: present(result.p), digits: 3 },
    ],
    note: "No printed example was at hand. The test calls the two kappas different, and yet the observed agreement is the same: it was the mix of cases that changed.",
  };
}

/** The two readings of each case in a square table of counts, as numbers of the categories. */
export function pairsOfTable(table: readonly (readonly number[])[]): number[][] {
  return table.flatMap((cells, row) =>
    cells.flatMap((count, column) => Array.from({ length: count }, () => [row, column])),
  );
}
