import { DIRECTION_LABELS, directionLabel } from "@/lib/reflex/direction-label";
import { ERROR_KINDS, errorKind, isNamedOnOtherEye } from "@/lib/reflex/error-kind";
import type { Finding } from "@/lib/reflex/finding";
import { nameVerticalOnEye } from "@/lib/reflex/name-vertical-on-eye";
import { STEPS, stepOfFinding } from "@/lib/reflex/step";
import { cohenKappa, crossTable, wilsonInterval } from "@/lib/statistics";
import { degreesFigures } from "./degrees-figures";
import type { ExaminerFigures } from "./schema";

/** One showing in the eyes of one examiner: what was read (null: nothing) and the reference as shown, mirrored or not. */
export type ShownItem = {
  itemId: string;
  kind: "first" | "repeat" | "mirrored";
  reading: Finding | null;
  reference: Finding;
};

/**
 * Every figure of one examiner in one round. Pure: the same readings and references give the same figures.
 *
 * Each case counts once against its reference, so repeats are left out of everything but their own count: two showings
 * of one case are not two independent cases.
 */
export function examinerFigures(shown: readonly ShownItem[]): ExaminerFigures {
  const items = shown.filter(({ kind }) => kind === "first");
  const pairs = items.flatMap(({ reading, reference }) => (reading ? [{ reading, reference }] : []));
  const errors = items.map(({ reading, reference }) => reading && errorKind(reading, reference));
  const labels = crossTable(
    items.map(({ reference }) => directionLabel(reference)),
    items.map(({ reading, reference }) => reading && directionLabel(onReferenceEye(reading, reference))),
    DIRECTION_LABELS,
  );
  const agreed = pairs.filter(({ reading, reference }) => sameLabel(reading, reference)).length;
  const correct = items.filter(({ reading }, index) => reading && errors[index] === null).length;
  const horizontal = degreesFigures(items, "horizontal");
  const vertical = degreesFigures(items, "vertical");
  const size = degreesFigures(items, "size");
  return {
    caseCount: items.length,
    readCount: pairs.length,
    repeatCount: shown.length - items.length,
    kappa: labels.ok ? cohenKappa(labels.counts) : labels,
    observedAgreement: shareOf(agreed, pairs.length),
    stepsLinear: stepsKappa(items, "linear"),
    stepsQuadratic: stepsKappa(items, "quadratic"),
    horizontal: horizontal.figures,
    vertical: vertical.figures,
    size: size.figures,
    withinTolerance: shareOf(correct, pairs.length),
    confusion: labels.ok ? usedCategories(labels.counts) : { categories: [], counts: [] },
    errorCounts: Object.fromEntries(
      ERROR_KINDS.map((kind) => [kind, errors.filter((error) => error === kind).length]).filter(([, count]) => count),
    ),
    namedOnOtherEye: pairs.filter(({ reading, reference }) => isNamedOnOtherEye(reading, reference)).length,
    items: items.map(({ itemId }, index) => ({
      itemId,
      error: errors[index] ?? null,
      horizontal: horizontal.pairs[index] ?? null,
      vertical: vertical.pairs[index] ?? null,
      size: size.pairs[index] ?? null,
    })),
  };
}

/** A purely vertical deviation may be named on either eye; for comparison it is named as the reference names it. */
export function onReferenceEye(reading: Finding, reference: Finding): Finding {
  if (!reference.readable || reference.eye === "none") return reading;
  return isNamedOnOtherEye(reading, reference) ? nameVerticalOnEye(reading, reference.eye) : reading;
}

export function sameLabel(reading: Finding, reference: Finding): boolean {
  return directionLabel(onReferenceEye(reading, reference)) === directionLabel(reference);
}

function stepsKappa(items: readonly ShownItem[], weights: "linear" | "quadratic") {
  const table = crossTable(
    items.map(({ reference }) => stepOfFinding(reference)),
    items.map(({ reading }) => reading && stepOfFinding(reading)),
    STEPS,
  );
  return table.ok ? cohenKappa(table.counts, { weights }) : table;
}

function shareOf(count: number, n: number): ExaminerFigures["withinTolerance"] {
  const interval = wilsonInterval(count, n);
  if (!interval.ok) return interval;
  const { estimate, low, high } = interval;
  return { ok: true, n, share: { estimate, low, high } };
}

/** The table without the categories that neither side used. */
export function usedCategories(counts: readonly (readonly number[])[]): ExaminerFigures["confusion"] {
  const isUsed = (index: number) => counts.some((row, i) => (i === index ? row.some(Boolean) : row[index]));
  const kept = DIRECTION_LABELS.map((_, index) => index).filter(isUsed);
  return {
    categories: kept.map((index) => DIRECTION_LABELS[index] ?? ""),
    counts: kept.map((row) => kept.map((column) => counts[row]?.[column] ?? 0)),
  };
}
