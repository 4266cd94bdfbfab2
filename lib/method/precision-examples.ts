import { formatNumber } from "@/lib/format/numbers";
import {
  bootstrapInterval,
  casesForKappa,
  casesForLimits,
  cohenKappa,
  planKappa,
  planLimits,
  wilsonInterval,
} from "@/lib/statistics";
import { DIAGNOSES_1969, NEWCOMBE_1998 } from "./examples";
import { pairsOfTable } from "./kappa-examples";
import { type ExampleTable, ends, known, type WorkedExample } from "./worked-example";

export function wilsonExample(): WorkedExample {
  const printed = [
    [0.2553, 0.3662],
    [0.0624, 0.1605],
    [0, 0.1611],
    [0.0061, 0.1718],
  ] as const;
  return {
    data: "Newcombe (1998), table I, method 3.",
    figures: NEWCOMBE_1998.map(({ count, n }, index) => ({
      label: `${count} out of ${n}`,
      value: ends(known(wilsonInterval(count, n))),
      digits: 4,
      printed: printed[index],
    })),
    note: "The printed values are quoted from memory and were checked by recomputation. None out of 20 still allows a share of 16 %.",
  };
}

export function bootstrapExample(): WorkedExample {
  const pairs = pairsOfTable(DIAGNOSES_1969.table);
  const kappaOf = (indices: readonly number[]) => {
    const table = DIAGNOSES_1969.table.map((row) => row.map(() => 0));
    for (const index of indices) {
      const [row = 0, column = 0] = pairs[index] ?? [];
      const cells = table[row];
      if (cells) cells[column] = (cells[column] ?? 0) + 1;
    }
    const result = cohenKappa(table);
    return result.ok ? result.kappa.estimate : Number.NaN;
  };
  const intervalBy = (method: "percentile" | "bca") =>
    ends(known(bootstrapInterval(pairs.length, kappaOf, { resamples: 2000, seed: 1, method })));
  return {
    data: "Kappa of the 200 patients of Fleiss, Cohen & Everitt (1969), 2,000 resamples.",
    figures: [
      { label: "Percentile interval", value: intervalBy("percentile"), digits: 2, recomputed: [0.3217425, 0.5325962] },
      { label: "BCa interval", value: intervalBy("bca"), digits: 2, recomputed: [0.3225372, 0.5334582] },
      {
        label: "Interval by the formula of 1969",
        value: ends(known(cohenKappa(DIAGNOSES_1969.table)).kappa),
        digits: 2,
        recomputed: [0.3232998, 0.5338431],
      },
    ],
    note: "Recomputed with R and 200,000 resamples; 2,000 come to within 0.02 of them. With 200 cases the formula and the bootstrap agree.",
  };
}

export function planningExample(): WorkedExample {
  const even = { kappa: 0.8, marginals: [0.5, 0.5] } as const;
  return {
    data: "Limits: Bland (2004). Cases for a kappa: recomputed with R from two forms of the variance that must agree.",
    tables: [fewCasesTable()],
    figures: [
      {
        label: "A limit from 100 cases, ± in SD",
        value: known(planLimits({ n: 100, sd: 1 })).halfWidth,
        digits: 2,
        printed: 0.34,
      },
      {
        label: "A limit from 200 cases, ± in SD",
        value: known(planLimits({ n: 200, sd: 1 })).halfWidth,
        digits: 2,
        printed: 0.24,
      },
      {
        label: "Cases for a limit within ± 0.5 SD",
        value: casesForLimits({ halfWidth: 0.5, sd: 1 }).n,
        digits: 0,
        recomputed: 49,
      },
      {
        label: "Cases for kappa 0.80 within ± 0.10",
        value: known(casesForKappa({ halfWidth: 0.1, ...even })).n,
        digits: 0,
        recomputed: 139,
      },
      {
        label: "Cases for kappa 0.80 within ± 0.20",
        value: known(casesForKappa({ halfWidth: 0.2, ...even })).n,
        digits: 0,
        recomputed: 35,
      },
    ],
    note: "0.34 and 0.24 are quoted from memory and were checked by recomputation. The kappas are for two answers, both readings with half of the cases in each.",
  };
}

/** What a true kappa of 0.80, and a limit of agreement, are worth from so many cases. */
export function fewCasesTable(): ExampleTable {
  const halfWidth = (n: number, share: number) =>
    `± ${formatNumber(known(planKappa({ n, kappa: 0.8, marginals: [share, share] })).halfWidth, 2)}`;
  return {
    caption: "95 % interval from so many cases",
    heads: ["cases", "kappa 0.80, answers even", "kappa 0.80, one answer 90 %", "each limit, in SD"],
    rows: [10, 20, 40, 100, 200].map((n) => ({
      head: `${n}`,
      cells: [halfWidth(n, 0.5), halfWidth(n, 0.9), `± ${formatNumber(known(planLimits({ n, sd: 1 })).halfWidth, 2)}`],
    })),
  };
}
