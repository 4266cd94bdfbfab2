import {
  ALIGNED,
  BEYOND_LIMBUS,
  type Degrees,
  type Eye,
  type Finding,
  findingFaults,
  type Horizontal,
  type ReadableFinding,
  type Vertical,
} from "@/lib/reflex/finding";
import { isReference, type LongReading } from "./long-table";
import { FINDING_COLUMNS, type TableRow, type TableRows } from "./table-columns";
import { TableError, type TableFault } from "./table-error";

const READING_COLUMNS = FINDING_COLUMNS.slice(2);
const COLUMN_OF_FIELD: Record<string, string> = {
  horizontalDegrees: "horizontal_degrees",
  verticalDegrees: "vertical_degrees",
};

/**
 * Findings from the rows of a table. A row with nothing in its reading columns is a missing reading; an empty direction
 * or size is none. Why something is not readable is not in the table. Throws TableError with every fault of every row.
 */
export function readFindings({ rows, hasRounds }: TableRows): LongReading<Finding>[] {
  const faults: TableFault[] = [];
  const readings = rows.map((row): LongReading<Finding> => {
    const report = (column: string, message: string) => faults.push({ line: row.line, column, message });
    const [name, examiner, round] = [row.cell("case"), row.cell("examiner"), row.cell("round")];
    if (name === "") report("case", "Name the case.");
    if (examiner === "") report("examiner", "Name the examiner, or write reference.");
    if (hasRounds && round === "" && !isReference(examiner)) report("round", "Name the round.");
    const value = READING_COLUMNS.every((column) => row.cell(column) === "") ? null : readFinding(row, report);
    return { line: row.line, case: name, examiner, round: round === "" ? null : round, value };
  });
  if (faults.length > 0) throw new TableError(faults);
  return readings;
}

type Report = (column: string, message: string) => void;

/** The finding of one row; aligned where a fault was reported instead. */
function readFinding(row: TableRow, report: Report): Finding {
  const choose = <Choice extends string>(column: string, choices: readonly Choice[], empty?: Choice): Choice | null => {
    const text = row.cell(column).toLowerCase();
    const choice = text === "" ? empty : choices.find((candidate) => candidate === text);
    if (choice === undefined) report(column, `Write ${choices.join(", ")}; got "${row.cell(column)}".`);
    return choice ?? null;
  };
  const isReadable = choose("readable", ["yes", "no", "true", "false"]);
  if (isReadable === "no" || isReadable === "false") {
    for (const column of READING_COLUMNS.filter((name) => name !== "readable")) {
      const text = row.cell(column).toLowerCase();
      if (text !== "" && text !== "none") report(column, "Leave this empty where the photograph is not readable.");
    }
    return { readable: false, reason: "other" };
  }
  const eye = choose<Eye | "none">("eye", ["right", "left", "none"]);
  const horizontal = choose<Horizontal | "none">("horizontal", ["eso", "exo", "none"], "none");
  const vertical = choose<Vertical | "none">("vertical", ["hyper", "hypo", "none"], "none");
  const horizontalDegrees = readDegrees(row.cell("horizontal_degrees"));
  const verticalDegrees = readDegrees(row.cell("vertical_degrees"));
  if (!isReadable || !eye || !horizontal || !vertical) return ALIGNED;
  const finding: ReadableFinding = { readable: true, eye, horizontal, horizontalDegrees, vertical, verticalDegrees };
  const faults = findingFaults(finding);
  for (const { field, message } of faults) report(COLUMN_OF_FIELD[field] ?? field, message);
  return faults.length > 0 ? ALIGNED : finding;
}

/** What is no number at all becomes one that no finding may have, so that the rules of findings report it. */
function readDegrees(text: string): Degrees | null {
  if (text === "" || text.toLowerCase() === "none") return null;
  if (text === BEYOND_LIMBUS) return BEYOND_LIMBUS;
  return /^\d+$/.test(text) ? Number(text) : Number.NaN;
}
