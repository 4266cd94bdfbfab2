import { caseDisagreement } from "@/lib/statistics/case-disagreement";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { congerKappa } from "@/lib/statistics/conger-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { fleissKappa } from "@/lib/statistics/fleiss-kappa";
import { gwetAC } from "@/lib/statistics/gwet-ac";
import { type AlphaMetric, krippendorffAlpha } from "@/lib/statistics/krippendorff-alpha";
import { codeRatings, countByCategory, type Label, type LabelRatings } from "@/lib/statistics/labels";
import { lightKappa } from "@/lib/statistics/light-kappa";
import { pairwiseKappa } from "@/lib/statistics/pairwise-kappa";
import { wilsonInterval } from "@/lib/statistics/wilson-interval";
import { BOOTSTRAP, type Outcome, type Statistic } from "./report";

export type LabelScale = {
  of: string;
  /** All categories offered, in order; left out, those used. */
  categories?: readonly Label[];
  metric: AlphaMetric;
};

type Labels = readonly (Label | null)[];

/** Agreement of two series of labels, case by case: of a reference and an examiner, or of an examiner's two readings. */
export function compareLabels(first: Labels, second: Labels, { of, categories, metric }: LabelScale): Statistic[] {
  const used = categories ?? codeRatings([first, second]).categories;
  const table = crossTable(first, second, used);
  const pairs = first.flatMap((label, index) => {
    const other = second[index] ?? null;
    return label === null || other === null ? [] : [[label, other]];
  });
  const same = pairs.filter(([a, b]) => a === b).length;
  const share = wilsonInterval(same, pairs.length);
  const named = share.ok ? { ok: true, n: share.n, share } : share;
  const plain: Statistic[] = [
    { statistic: "cohenKappa", of, result: table.ok ? cohenKappa(table.counts) : table },
    { statistic: "wilsonInterval", of, variant: "same label", result: named },
    { statistic: "gwetAC", of, result: gwetAC(pairs, { categories: used }) },
  ];
  if (metric === "nominal") return plain;
  const weighted = (["linear", "quadratic"] as const).flatMap((weights): Statistic[] => [
    {
      statistic: "cohenKappa",
      of,
      variant: `${weights} weights`,
      result: table.ok ? cohenKappa(table.counts, { weights }) : table,
    },
    { statistic: "gwetAC", of, variant: `${weights} weights`, result: gwetAC(pairs, { weights, categories: used }) },
  ]);
  return [...plain, ...weighted];
}

/** Agreement of a panel with each other. Shape: cases × examiners, `null` = missing. */
export function compareAmong(rows: LabelRatings, examiners: readonly string[], scale: LabelScale): Statistic[] {
  const { of, categories, metric } = scale;
  const offered = categories ?? codeRatings(rows).categories;
  const plain: Statistic[] = [
    { statistic: "fleissKappa", of, result: nameCategories(rows, offered) },
    { statistic: "congerKappa", of, result: congerKappa(rows) },
    { statistic: "lightKappa", of, result: lightKappa(rows) },
    { statistic: "gwetAC", of, result: gwetAC(rows, { categories: offered }) },
  ];
  const weighted = (["linear", "quadratic"] as const).map(
    (weights): Statistic => ({
      statistic: "gwetAC",
      of,
      variant: `${weights} weights`,
      result: gwetAC(rows, { weights, categories: offered }),
    }),
  );
  return [
    ...plain,
    ...(metric === "nominal" ? [] : weighted),
    {
      statistic: "krippendorffAlpha",
      of,
      variant: metric,
      result: krippendorffAlpha(rows, { metric, bootstrap: BOOTSTRAP }),
    },
    { statistic: "pairwiseKappa", of, result: namePairs(rows, examiners) },
  ];
}

/** The kappa of each category under its name. */
function nameCategories(rows: LabelRatings, categories: readonly Label[]): Outcome {
  const result = fleissKappa(countByCategory(codeRatings(rows, categories)));
  if (!result.ok || !result.perCategory) return result;
  const perCategory = result.perCategory.map((part, index) => ({ category: String(categories[index]), ...part }));
  return { ...result, perCategory };
}

/** Each pair once, under both names. */
function namePairs(rows: LabelRatings, examiners: readonly string[]): Outcome {
  const result = pairwiseKappa(rows);
  if (!result.ok) return result;
  const pairs = result.matrix.flatMap((row, first) =>
    row.slice(first + 1).map((kappa, offset) => ({
      pair: `${examiners[first]} and ${examiners[first + 1 + offset]}`,
      ...(kappa.ok ? { kappa: kappa.kappa, n: kappa.n } : kappa),
    })),
  );
  return { ok: true, n: result.n, pairs };
}

/** What the panel made of each case, with the names of the cases. */
export function describeCases(rows: LabelRatings, cases: readonly string[], of: string): Statistic {
  const result = caseDisagreement(rows);
  if (!result.ok) return { statistic: "caseDisagreement", of, result };
  const named = result.cases.map((one, index) => ({ case: cases[index] ?? "", ...one }));
  return { statistic: "caseDisagreement", of, result: { ok: true, n: result.n, cases: named } };
}
