import type { Panel } from "./long-table";
import type { Report, Section, Statistic } from "./report";

/** One column of a table: everything of one examiner, null where there is nothing. */
export function column<Value>(rows: readonly (readonly (Value | null)[])[], index: number): (Value | null)[] {
  return rows.map((row) => row[index] ?? null);
}

/** One section for each examiner, where there is a reference. */
export function againstReference<Value>(
  panel: Panel<Value>,
  statisticsOf: (index: number, references: (Value | null)[]) => Statistic[],
): Section[] {
  const { examiners, references } = panel;
  if (!references) return [];
  return examiners.map((examiner, index) => ({
    title: `${examiner} against the reference`,
    statistics: statisticsOf(index, references),
  }));
}

/** One section where there are several examiners. */
export function amongExaminers<Value>({ examiners }: Panel<Value>, statisticsOf: () => Statistic[]): Section[] {
  return examiners.length > 1 ? [{ title: "Among the examiners", statistics: statisticsOf() }] : [];
}

/** One section for each examiner who read a case again: `own` has one row of readings for each case. */
export function againstOwnRepeats<Value>(
  { examiners, repeats }: Panel<Value>,
  statisticsOf: (own: Value[][]) => Statistic[],
): Section[] {
  return examiners.flatMap((examiner, index) => {
    const own = repeats.map((row) => row[index] ?? []);
    const isRepeated = own.some((readings) => readings.length > 1);
    return isRepeated ? [{ title: `${examiner} against own repeats`, statistics: statisticsOf(own) }] : [];
  });
}

export function toReport<Value>(
  panel: Panel<Value>,
  head: Pick<Report, "table" | "scale">,
  sections: Section[],
): Report {
  return {
    ...head,
    caseCount: new Set(panel.rows.map((row) => row.case)).size,
    readingCount: panel.repeats.flat(2).length,
    examiners: panel.examiners,
    rounds: panel.rounds,
    hasReference: panel.references !== null,
    sections: sections.filter(({ statistics }) => statistics.length > 0),
  };
}
