import { formatInterval, formatNumber } from "@/lib/format/numbers";
import { ChartTable } from "./chart-table";
import { isUnderFloor, type KappaRow, TOO_FEW } from "./kappa-row";

type KappaIntervalsTableProps = { rows: KappaRow[]; floor?: number; caption?: string };

/** The same figures as KappaIntervals, as a table. */
export function KappaIntervalsTable({ rows, floor, caption = "Kappa of each examiner" }: KappaIntervalsTableProps) {
  const columns = [
    { label: "Examiner" },
    { label: "Readings", isNumber: true },
    { label: "Kappa", isNumber: true },
    { label: "95 % interval", isNumber: true },
    { label: "Note" },
  ];
  const cells = (row: KappaRow) => [
    row.isOwn ? `${row.label} (you)` : row.label,
    String(row.n),
    row.estimate === undefined ? "none" : formatNumber(row.estimate, 2),
    row.low === undefined || row.high === undefined ? "none" : formatInterval(row.low, row.high),
    remarks(row, floor).join("; "),
  ];
  return (
    <ChartTable caption={caption} columns={columns} rows={rows.map((row) => ({ id: row.id, cells: cells(row) }))} />
  );
}

function remarks(row: KappaRow, floor: number | undefined): string[] {
  const found: string[] = [];
  if (row.note) found.push(row.note);
  if (row.estimate === undefined && row.reason) found.push(row.reason);
  if (row.isTooFew) found.push(TOO_FEW);
  if (isUnderFloor(row, floor)) found.push(`under the floor of ${formatNumber(floor ?? 0, 2)}`);
  return found;
}
