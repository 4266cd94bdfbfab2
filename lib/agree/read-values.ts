import type { Label } from "@/lib/statistics/labels";
import type { LongReading } from "./long-table";
import type { TableRows } from "./table-columns";
import { TableError, type TableFault } from "./table-error";

export const SCALES = ["nominal", "ordinal", "interval"] as const;
export type Scale = (typeof SCALES)[number];

const NUMBER = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/**
 * Ratings from the rows of a table: any text where the scale is nominal, else numbers with a decimal point. An empty
 * value is a missing rating. Throws TableError with every fault of every row.
 */
export function readValues<Value extends Label>(
  { rows }: TableRows,
  readValue: (text: string) => Value | null,
): LongReading<Value>[] {
  const faults: TableFault[] = [];
  const readings = rows.map((row): LongReading<Value> => {
    const report = (column: string, message: string) => faults.push({ line: row.line, column, message });
    const [subject, rater, text] = [row.cell("subject"), row.cell("rater"), row.cell("value")];
    if (subject === "") report("subject", "Name the subject.");
    if (rater === "") report("rater", "Name the rater, or write reference.");
    const value = text === "" ? null : readValue(text);
    if (text !== "" && value === null) {
      report("value", `Write a number with a decimal point, or leave it empty where there is none; got "${text}".`);
    }
    return { line: row.line, case: subject, examiner: rater, round: null, value };
  });
  if (faults.length > 0) throw new TableError(faults);
  return readings;
}

/** The number a text writes out, or null. */
export function readNumber(text: string): number | null {
  const number = NUMBER.test(text) ? Number(text) : Number.NaN;
  return Number.isFinite(number) ? number : null;
}
