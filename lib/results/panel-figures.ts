import { DIRECTION_LABELS, directionLabel } from "@/lib/reflex/direction-label";
import { bootstrapInterval, cohenKappa, type Estimate, fleissKappa, type Result } from "@/lib/statistics";
import { compareDegrees, DEGREES_MEASURES } from "./degrees-figures";
import { onReferenceEye, type ShownItem, usedCategories } from "./examiner-figures";
import type { PanelFigures } from "./schema";

const BOOTSTRAP = { resamples: 1000, seed: 1, method: "percentile" } as const;

/** What everybody made of one item. */
type PanelCase = {
  labels: number[];
  referenceLabel: number;
  horizontal: number[];
  vertical: number[];
  size: number[];
};

/**
 * The panel as a whole: kappa, bias and limits of all readings together against the reference, and Fleiss' kappa among
 * the examiners. The readings of one case belong together, so the intervals resample cases, not readings
 * (percentile bootstrap, 1,000 resamples, fixed seed: the same readings give the same interval).
 */
export function panelFigures(examiners: readonly (readonly ShownItem[])[]): PanelFigures {
  const cases = panelCases(examiners);
  const table = sumTables(
    cases,
    cases.map((_, index) => index),
  );
  return {
    examinerCount: examiners.filter((shown) => shown.some(({ reading }) => reading)).length,
    readCount: cases.reduce((total, { labels }) => total + labels.reduce((sum, count) => sum + count, 0), 0),
    kappa: pooledKappa(cases, table),
    horizontal: pooledLimits(cases.map(({ horizontal }) => horizontal)),
    vertical: pooledLimits(cases.map(({ vertical }) => vertical)),
    size: pooledLimits(cases.map(({ size }) => size)),
    amongExaminers: amongExaminers(cases),
    confusion: usedCategories(table),
  };
}

function panelCases(examiners: readonly (readonly ShownItem[])[]): PanelCase[] {
  const cases = new Map<string, PanelCase>();
  for (const item of examiners.flat()) {
    if (item.kind !== "first") continue;
    const known = cases.get(item.itemId);
    const entry = known ?? {
      labels: DIRECTION_LABELS.map(() => 0),
      referenceLabel: DIRECTION_LABELS.indexOf(directionLabel(item.reference)),
      horizontal: [],
      vertical: [],
      size: [],
    };
    if (!known) cases.set(item.itemId, entry);
    if (!item.reading) continue;
    const label = DIRECTION_LABELS.indexOf(directionLabel(onReferenceEye(item.reading, item.reference)));
    entry.labels[label] = (entry.labels[label] ?? 0) + 1;
    for (const measure of DEGREES_MEASURES) {
      const compared = compareDegrees(item, measure);
      if (typeof compared !== "string") entry[measure].push(compared.reading - compared.reference);
    }
  }
  return [...cases.values()];
}

/** Rows = reference, columns = readings, over the cases named (a case may be named more than once). */
function sumTables(cases: readonly PanelCase[], indices: readonly number[]): number[][] {
  const table = DIRECTION_LABELS.map(() => DIRECTION_LABELS.map(() => 0));
  for (const index of indices) {
    const entry = cases[index];
    const row = entry && table[entry.referenceLabel];
    entry?.labels.forEach((count, column) => {
      if (row) row[column] = (row[column] ?? 0) + count;
    });
  }
  return table;
}

function pooledKappa(cases: readonly PanelCase[], table: number[][]): PanelFigures["kappa"] {
  const pooled = cohenKappa(table);
  if (!pooled.ok) return pooled;
  const interval = bootstrapInterval(
    cases.length,
    (indices) => estimateOf(cohenKappa(sumTables(cases, indices))),
    BOOTSTRAP,
  );
  return { ok: true, n: pooled.n, kappa: withInterval(pooled.kappa.estimate, interval) };
}

function estimateOf(result: Result<{ kappa: Estimate }>): number {
  return result.ok ? result.kappa.estimate : Number.NaN;
}

/** Bias and limits over the differences (degrees) of all cases, one array of differences a case. */
function pooledLimits(differences: readonly number[][]): PanelFigures["horizontal"] {
  const sums = differences.map(runningSums);
  const n = sums.reduce((total, each) => total + each.n, 0);
  if (n < 3) return { ok: false, n, reason: "fewer than three pairs" };
  const pooled = moments(
    sums,
    sums.map((_, index) => index),
  );
  const of = (part: "bias" | "lower" | "upper") =>
    withInterval(
      pooled[part],
      bootstrapInterval(sums.length, (indices) => moments(sums, indices)[part], BOOTSTRAP),
    );
  return { ok: true, n, sd: pooled.sd, bias: of("bias"), lower: of("lower"), upper: of("upper") };
}

type Sums = { n: number; sum: number; squares: number };

/** What the moments need of one case, so that a resample of the cases need not go through its readings again. */
function runningSums(differences: readonly number[]): Sums {
  const sum = differences.reduce((total, difference) => total + difference, 0);
  const squares = differences.reduce((total, difference) => total + difference * difference, 0);
  return { n: differences.length, sum, squares };
}

type Moments = { bias: number; sd: number; lower: number; upper: number };

function moments(cases: readonly Sums[], indices: readonly number[]): Moments {
  let [n, sum, squares] = [0, 0, 0];
  for (const index of indices) {
    const each = cases[index];
    if (!each) continue;
    n += each.n;
    sum += each.sum;
    squares += each.squares;
  }
  const bias = sum / n;
  const sd = Math.sqrt(Math.max(0, (squares - n * bias * bias) / (n - 1)));
  return { bias, sd, lower: bias - 1.96 * sd, upper: bias + 1.96 * sd };
}

function amongExaminers(cases: readonly PanelCase[]): PanelFigures["amongExaminers"] {
  const result = fleissKappa(cases.map(({ labels }) => labels));
  return result.ok ? { ok: true, n: result.n, kappa: result.kappa } : result;
}

function withInterval(estimate: number, interval: Result<Estimate>): Estimate {
  if (!interval.ok) return { estimate };
  return { estimate, standardError: interval.standardError, low: interval.low, high: interval.high };
}
