import { type Label, labelsUsed } from "@/lib/statistics/labels";
import { limitsWithReplicates } from "@/lib/statistics/limits-with-replicates";
import { compareAmong, compareLabels, describeCases, type LabelScale } from "./label-statistics";
import { arrangePanel, type LongReading, type Panel } from "./long-table";
import { measureAgainst, measureAmong, measureBias, measureRepeats } from "./measurement-statistics";
import { againstOwnRepeats, againstReference, amongExaminers, column, toReport } from "./panel-sections";
import type { Report, Statistic } from "./report";

const OF = "values";

/** Every statistic that applies to labels: names, or numbers that stand for an order. Throws TableError. */
export function reportLabels(readings: readonly LongReading<Label>[], metric: "nominal" | "ordinal"): Report {
  const panel = arrangePanel(readings);
  const categories = labelsUsed([...panel.repeats.flat(2), ...(panel.references ?? [])]);
  const scale: LabelScale = { of: OF, metric, categories };
  return toReport(panel, { table: "values", scale: metric }, [
    ...againstReference(panel, (index, references) => compareLabels(references, column(panel.readings, index), scale)),
    ...amongExaminers(panel, () => [
      ...compareAmong(panel.readings, panel.examiners, scale),
      describeCases(
        panel.readings,
        panel.rows.map((row) => row.case),
        OF,
      ),
    ]),
    ...againstOwnRepeats(panel, (own) => compareLabels(column(own, 0), column(own, 1), scale)),
  ]);
}

/** Every statistic that applies to measurements. Throws TableError. */
export function reportMeasurements(readings: readonly LongReading<number>[]): Report {
  const panel = arrangePanel(readings);
  const { references, examiners } = panel;
  const sections = [
    ...againstReference(panel, (index, known) => measureAgainst(column(panel.readings, index), known, OF)),
    ...amongExaminers(panel, () => [
      ...measureAmong(panel.readings, examiners, OF),
      ...limitsFromRepeats(panel),
      ...(references ? [measureBias(differencesOf(panel, references), OF)] : []),
    ]),
    ...againstOwnRepeats(panel, (own) => [measureRepeats(own, OF)]),
  ];
  return toReport(panel, { table: "values", scale: "interval" }, sections);
}

/** Of two examiners, where both read cases again. */
function limitsFromRepeats({ examiners, repeats }: Panel<number>): Statistic[] {
  const isRepeated = (index: number) => repeats.some((row) => (row[index]?.length ?? 0) > 1);
  if (examiners.length !== 2 || !isRepeated(0) || !isRepeated(1)) return [];
  const [first, second] = [0, 1].map((index) => repeats.map((row) => row[index] ?? []));
  if (!first || !second) return [];
  const variant = `${examiners[0]} minus ${examiners[1]}`;
  return [{ statistic: "limitsWithReplicates", of: OF, variant, result: limitsWithReplicates(first, second) }];
}

function differencesOf({ rows, examiners, readings }: Panel<number>, references: readonly (number | null)[]) {
  return rows.flatMap((row, index) =>
    examiners.map((examiner, own) => {
      const reading = readings[index]?.[own] ?? null;
      const reference = references[index] ?? null;
      const difference = reading === null || reference === null ? null : reading - reference;
      return { examiner, case: row.case, difference };
    }),
  );
}
