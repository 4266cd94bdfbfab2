import { STEPS } from "@/lib/reflex/step";
import { examinerFigures, type ShownItem } from "@/lib/results/examiner-figures";
import { panelFigures } from "@/lib/results/panel-figures";
import * as statistics from "@/lib/statistics";
import { bootstrapInterval } from "@/lib/statistics/bootstrap";
import { caseDisagreement } from "@/lib/statistics/case-disagreement";
import { casesForLimits } from "@/lib/statistics/cases-for-limits";
import { cohenKappa } from "@/lib/statistics/cohen-kappa";
import { compareKappas } from "@/lib/statistics/compare-kappas";
import { concordance } from "@/lib/statistics/concordance";
import { congerKappa } from "@/lib/statistics/conger-kappa";
import { crossTable } from "@/lib/statistics/cross-table";
import { cusum } from "@/lib/statistics/cusum";
import { decisionIntervalForRunLength } from "@/lib/statistics/decision-interval-for-run-length";
import { ewma } from "@/lib/statistics/ewma";
import { fleissKappa } from "@/lib/statistics/fleiss-kappa";
import { gwetAC } from "@/lib/statistics/gwet-ac";
import { intraclassCorrelation } from "@/lib/statistics/intraclass-correlation";
import { krippendorffAlpha } from "@/lib/statistics/krippendorff-alpha";
import { codeRatings, countByCategory } from "@/lib/statistics/labels";
import { lightKappa } from "@/lib/statistics/light-kappa";
import { limitsOfAgreement } from "@/lib/statistics/limits-of-agreement";
import { limitsWithMean } from "@/lib/statistics/limits-with-mean";
import { limitsWithReplicates } from "@/lib/statistics/limits-with-replicates";
import { pairwiseKappa } from "@/lib/statistics/pairwise-kappa";
import { casesForKappa, planKappa } from "@/lib/statistics/plan-kappa";
import { planLimits } from "@/lib/statistics/plan-limits";
import { repeatability } from "@/lib/statistics/repeatability";
import { robustLocationScale } from "@/lib/statistics/robust-location-scale";
import { runLength } from "@/lib/statistics/run-length";
import { shewhart } from "@/lib/statistics/shewhart";
import { theilSen } from "@/lib/statistics/theil-sen";
import { twoWayBias } from "@/lib/statistics/two-way-bias";
import { widthForRunLength } from "@/lib/statistics/width-for-run-length";
import { wilsonInterval } from "@/lib/statistics/wilson-interval";
import { zScores } from "@/lib/statistics/z-scores";
import { formatSpeed, measureMs } from "./measure";
import { makePanel, type Panel } from "./panel";

const SIZES = [
  [40, 60],
  [500, 200],
] as const;

/** What each export is called with: a whole panel where it takes one, else one examiner or one series of cases. */
function callsOn(panel: Panel): Record<string, () => unknown> {
  const { labels, steps, degrees, caseCount, examinerCount } = panel;
  const column = <Value>(rows: readonly (readonly Value[])[], examiner: number) =>
    rows.map((row) => row[examiner] ?? null);
  const [first, second] = [column(degrees, 0), column(degrees, 1)];
  const [firstLabels, secondLabels] = [column(labels, 0), column(labels, 1)];
  const table = crossTable(firstLabels, secondLabels);
  const counts = table.ok ? table.counts : [];
  const categoryCounts = countByCategory(codeRatings(labels));
  const kappas = Array.from({ length: examinerCount }, (_, examiner) => {
    const own = crossTable(firstLabels, column(labels, examiner));
    return own.ok ? cohenKappa(own.counts) : own;
  }).slice(1);
  // Some statistics take complete rows only, and with this many examiners hardly any row would be.
  const complete = degrees.map((row) => row.map((degree) => degree ?? 0));
  const replicates = degrees.map((row) => row.slice(0, 3));
  const differences = degrees.flatMap((row, index) =>
    row.map((degree, examiner) => ({
      examiner,
      case: index,
      difference: degree === null ? null : degree - index / 10,
    })),
  );
  const present = first.filter((value) => value !== null);
  const chart = { target: 0, sigma: 15 };
  const plan = { kappa: 0.6, marginals: [0.3, 0.4] as const };
  return {
    crossTable: () => crossTable(firstLabels, secondLabels),
    cohenKappa: () => cohenKappa(counts),
    "cohenKappa, weighted": () => cohenKappa(counts, { weights: "quadratic" }),
    fleissKappa: () => fleissKappa(categoryCounts),
    lightKappa: () => lightKappa(labels),
    congerKappa: () => congerKappa(labels),
    pairwiseKappa: () => pairwiseKappa(labels),
    krippendorffAlpha: () => krippendorffAlpha(labels, { metric: "nominal" }),
    "krippendorffAlpha, ordinal": () => krippendorffAlpha(steps, { metric: "ordinal" }),
    "krippendorffAlpha, interval": () => krippendorffAlpha(degrees, { metric: "interval" }),
    gwetAC: () => gwetAC(labels),
    "gwetAC, weighted": () => gwetAC(steps, { weights: "quadratic", categories: STEPS.map((_, index) => index) }),
    caseDisagreement: () => caseDisagreement(labels),
    compareKappas: () => compareKappas(kappas),
    intraclassCorrelation: () => intraclassCorrelation(complete),
    limitsOfAgreement: () => limitsOfAgreement(first, second),
    limitsWithReplicates: () => limitsWithReplicates(replicates, replicates),
    limitsWithMean: () => limitsWithMean(complete),
    repeatability: () => repeatability(degrees),
    concordance: () => concordance(first, second),
    theilSen: () => theilSen(first, second),
    twoWayBias: () => twoWayBias(differences),
    robustLocationScale: () => robustLocationScale(degrees[0] ?? []),
    zScores: () => zScores(degrees[0] ?? [], { assigned: 0, sd: 5, uncertainty: 1 }),
    wilsonInterval: () => wilsonInterval(caseCount - 5, caseCount),
    "bootstrapInterval, 2,000 of a mean": () =>
      bootstrapInterval(present.length, (indices) => indices.reduce((sum, index) => sum + (present[index] ?? 0), 0), {
        resamples: 2000,
        seed: 1,
        method: "percentile",
      }),
    ewma: () => ewma(first, { ...chart, lambda: 0.2, width: 2.7 }),
    cusum: () => cusum(first, { ...chart, k: 0.5, h: 4 }),
    shewhart: () => shewhart(first, chart),
    "runLength.ewma": () => runLength.ewma({ lambda: 0.2, width: 2.7, shift: 1 }),
    "runLength.cusum": () => runLength.cusum({ k: 0.5, h: 4, shift: 1 }),
    widthForRunLength: () => widthForRunLength({ lambda: 0.2, runLength: 500 }),
    decisionIntervalForRunLength: () => decisionIntervalForRunLength({ k: 0.5, runLength: 500 }),
    planLimits: () => planLimits({ n: caseCount, sd: 4 }),
    casesForLimits: () => casesForLimits({ halfWidth: 1, sd: 4 }),
    planKappa: () => planKappa({ n: caseCount, ...plan }),
    casesForKappa: () => casesForKappa({ halfWidth: 0.1, ...plan }),
  };
}

/** What is computed and stored when a round closes: the figures of every examiner and of the panel. */
function closeRound({ readings, references, examinerCount }: Panel) {
  const shown = Array.from({ length: examinerCount }, (_, examiner) =>
    references.map(
      (reference, index): ShownItem => ({
        itemId: `case ${index}`,
        kind: "first",
        reading: readings[index]?.[examiner] ?? null,
        reference,
      }),
    ),
  );
  return [shown.map(examinerFigures), panelFigures(shown)];
}

function unmeasured(measured: readonly string[]): string[] {
  const names = Object.entries(statistics).filter(([name]) => name !== "InputError");
  return names.map(([name]) => name).filter((name) => !measured.some((call) => call.split(/[.,]/)[0] === name));
}

/** Prints time and operations per second of every export of the statistics at both sizes of a round. */
export function run(): void {
  const panels = SIZES.map(([examiners, cases]) => makePanel(examiners, cases));
  const calls = panels.map(callsOn);
  const names = Object.keys(calls[0] ?? {});
  printRow(
    "",
    SIZES.map(([examiners, cases]) => `${examiners} examiners x ${cases} cases`),
  );
  for (const name of names) {
    printRow(
      name,
      calls.map((call) => speedOf(call[name])),
    );
  }
  printRow(
    "all results of a closed round",
    panels.map((panel) => speedOf(() => closeRound(panel))),
  );
  const bootstrap = { resamples: 2000, seed: 1 };
  const labels = panels[0]?.labels ?? [];
  printRow("krippendorffAlpha, 2,000 resamples", [
    speedOf(() => krippendorffAlpha(labels, { metric: "nominal", bootstrap })),
  ]);
  const missing = unmeasured(names);
  if (missing.length > 0) console.log(`\nNot measured: ${missing.join(", ")}`);
}

function speedOf(call: () => unknown = () => undefined): string {
  return formatSpeed(measureMs(call));
}

function printRow(name: string, columns: readonly string[]): void {
  console.log(name.padEnd(36) + columns.map((text) => text.padStart(28)).join(""));
}
