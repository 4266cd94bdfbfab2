import { groupBy } from "@/lib/group-by";
import { TableError, type TableFault } from "./table-error";

/** One line of a table: what an examiner (or the reference) made of a case; `value` null where the reading is missing. */
export type LongReading<Value> = {
  line: number;
  case: string;
  examiner: string;
  /** Null in a table without rounds, and of a reference that holds in every round. */
  round: string | null;
  value: Value | null;
};

/** The same as tables: rows are cases (of one round), columns examiners; references have a place for each row. */
export type Panel<Value> = {
  examiners: string[];
  rounds: string[];
  rows: { case: string; round: string | null }[];
  /** The first reading of each examiner; null where there is none. */
  readings: (Value | null)[][];
  /** All readings of each examiner that are there, in the order of the table. */
  repeats: Value[][][];
  /** Null in a table without a reference. */
  references: (Value | null)[] | null;
};

export function isReference(examiner: string): boolean {
  return examiner.toLowerCase() === "reference";
}

/**
 * Turns the lines of a table into rows of cases and columns of examiners, both in order of appearance, and rounds by
 * number where they are numbers. Who reads a case a second time in one round repeats it.
 * Throws TableError where a case has two references, and where nobody but the reference reads.
 */
export function arrangePanel<Value>(table: readonly LongReading<Value>[]): Panel<Value> {
  const own = table.filter(({ examiner }) => !isReference(examiner));
  const references = table.filter(({ examiner }) => isReference(examiner));
  if (own.length === 0) throw new TableError([{ line: 0, column: "examiner", message: "No examiner has a reading." }]);
  const examiners = [...new Set(own.map(({ examiner }) => examiner))];
  const rounds = inOrder([...new Set(own.flatMap(({ round }) => round ?? []))]);
  const groups = [...groupBy(own, rowKey).values()];
  const rows = groups.flatMap(([line]) => (line ? [{ case: line.case, round: line.round }] : []));
  const repeats = groups.map((lines) => {
    const byExaminer = groupBy(lines, ({ examiner }) => examiner);
    return examiners.map((examiner) =>
      (byExaminer.get(examiner) ?? []).flatMap(({ value }) => (value === null ? [] : [value])),
    );
  });
  const known = indexReferences(references);
  return {
    examiners,
    rounds,
    rows,
    readings: repeats.map((row) => row.map(([first]) => first ?? null)),
    repeats,
    references:
      references.length > 0 ? rows.map((row) => known.get(rowKey(row)) ?? known.get(caseKey(row)) ?? null) : null,
  };
}

function indexReferences<Value>(references: readonly LongReading<Value>[]): Map<string, Value | null> {
  const groups = groupBy(references, rowKey);
  const faults = [...groups.values()].flatMap(([first, second]): TableFault[] =>
    first && second
      ? [
          {
            line: second.line,
            column: "examiner",
            message: `Case "${second.case}" has its reference on line ${first.line} already.`,
          },
        ]
      : [],
  );
  if (faults.length > 0) throw new TableError(faults);
  return new Map([...groups].map(([key, [reference]]) => [key, reference?.value ?? null]));
}

function rowKey(row: { case: string; round: string | null }): string {
  return JSON.stringify([row.case, row.round]);
}

function caseKey(row: { case: string }): string {
  return rowKey({ case: row.case, round: null });
}

function inOrder(rounds: string[]): string[] {
  return rounds.every((round) => Number.isFinite(Number(round)))
    ? rounds.toSorted((a, b) => Number(a) - Number(b))
    : rounds;
}
