import { CsvError, type CsvRecord, parseCsv } from "@/lib/csv/parse-csv";
import { TableError, type TableFault } from "./table-error";

/** A record by the names of its columns; what is around a value is trimmed, and a column that is not there is empty. */
export type TableRow = { line: number; cell: (column: string) => string };

export const FINDING_COLUMNS = [
  "case",
  "examiner",
  "eye",
  "horizontal",
  "horizontal_degrees",
  "vertical",
  "vertical_degrees",
  "readable",
] as const;
export const VALUE_COLUMNS = ["subject", "rater", "value"] as const;
const ROUND = "round";

export type TableRows = { kind: "findings" | "values"; hasRounds: boolean; rows: TableRow[] };

/**
 * Reads comma-separated text whose first line names its columns, in any order and case: those of findings (with or
 * without a round), or subject, rater and value. Throws TableError for text that is not CSV and other columns.
 */
export function readRows(text: string): TableRows {
  const [header, ...records] = readRecords(text);
  if (!header) throw new TableError([{ line: 1, column: "header", message: "The file is empty." }]);
  const names = header.map(({ text: name }) => name.trim().toLowerCase());
  const kind = names.includes("subject") || names.includes("rater") ? "values" : "findings";
  const faults = headerFaults(names, kind);
  if (faults.length > 0) throw new TableError(faults);
  if (records.length === 0) throw new TableError([{ line: 2, column: "header", message: "There are no readings." }]);
  return { kind, hasRounds: names.includes(ROUND), rows: records.map((record) => toRow(record, names)) };
}

function readRecords(text: string): CsvRecord[] {
  try {
    return parseCsv(text);
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    throw new TableError([{ line: error.line, column: String(error.column), message: error.message }]);
  }
}

function headerFaults(names: readonly string[], kind: TableRows["kind"]): TableFault[] {
  const needed: readonly string[] = kind === "values" ? VALUE_COLUMNS : FINDING_COLUMNS;
  const allowed = kind === "values" ? needed : [...needed, ROUND];
  const expected = `The first line names the columns: ${needed.join(",")}${kind === "values" ? "" : "[,round]"}.`;
  if (names.length === 1 && names[0]?.includes(";")) {
    return [{ line: 1, column: "header", message: `Fields are separated by commas, not by semicolons. ${expected}` }];
  }
  const fault = (column: string, what: string) => ({ line: 1, column, message: `${what} ${expected}` });
  return [
    ...names
      .filter((name) => !allowed.includes(name))
      .map((name) => fault(name || "header", "This column is not known.")),
    ...names
      .filter((name, index) => names.indexOf(name) !== index)
      .map((name) => fault(name, "This column is there twice.")),
    ...needed.filter((name) => !names.includes(name)).map((name) => fault(name, "This column is missing.")),
  ];
}

function toRow(record: CsvRecord, names: readonly string[]): TableRow {
  return { line: record[0]?.line ?? 0, cell: (column) => record[names.indexOf(column)]?.text.trim() ?? "" };
}
