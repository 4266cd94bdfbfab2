import { formatInterval, formatNumber } from "@/lib/format/numbers";
import type { Tip } from "./point-tip";

export type KappaRow = {
  id: string;
  label: string;
  /** A word under the name, such as "trainee". */
  note?: string;
  /** Readings behind the figure. */
  n: number;
  estimate?: number;
  low?: number;
  high?: number;
  /** Why there is no estimate. */
  reason?: string;
  isOwn?: boolean;
  isTooFew?: boolean;
};

export const TOO_FEW = "too few to say";
const NO_REASON = "not computed";

/** Below the floor of the department; never said of a figure that is too uncertain to be said at all. */
export function isUnderFloor(row: KappaRow, floor: number | undefined): boolean {
  return floor !== undefined && row.estimate !== undefined && !row.isTooFew && row.estimate < floor;
}

/** The figure and its interval, apart, because they are set in different weights. */
export function kappaText(row: KappaRow): { figure: string; interval: string } {
  if (row.estimate === undefined) return { figure: "", interval: row.reason ?? NO_REASON };
  if (row.isTooFew) return { figure: "", interval: TOO_FEW };
  const interval = row.low !== undefined && row.high !== undefined ? `(${formatInterval(row.low, row.high)})` : "";
  return { figure: formatNumber(row.estimate, 2), interval };
}

export function kappaTip(row: KappaRow, floor: number | undefined): Tip {
  const lines: string[] = [];
  if (row.estimate === undefined) lines.push(row.reason ?? NO_REASON);
  else {
    lines.push(`kappa ${formatNumber(row.estimate, 2)}`);
    if (row.low !== undefined && row.high !== undefined)
      lines.push(`95 % interval ${formatInterval(row.low, row.high)}`);
  }
  lines.push(row.isTooFew ? `${row.n} readings, ${TOO_FEW}` : `${row.n} readings`);
  if (isUnderFloor(row, floor)) lines.push(`under the floor of ${formatNumber(floor ?? 0, 2)}`);
  return { title: row.isOwn ? `${row.label} (you)` : row.label, lines };
}

/** One sentence for the whole figure, for those who do not see it. */
export function kappaSummary(rows: readonly KappaRow[], floor: number | undefined, median: number | undefined): string {
  const said = rows.flatMap((row) => (row.estimate !== undefined && !row.isTooFew ? [row.estimate] : []));
  const parts = [`Kappa with 95 % interval of ${rows.length} ${rows.length === 1 ? "examiner" : "examiners"}.`];
  if (said.length > 0) parts.push(`From ${formatInterval(Math.min(...said), Math.max(...said))}.`);
  if (median !== undefined) parts.push(`Median ${formatNumber(median, 2)}.`);
  if (floor !== undefined) {
    const under = rows.filter((row) => isUnderFloor(row, floor)).map((row) => row.label);
    parts.push(`Under the floor of ${formatNumber(floor, 2)}: ${under.length > 0 ? under.join(", ") : "nobody"}.`);
  }
  if (said.length < rows.length) parts.push(`Not to be said: ${rows.length - said.length}.`);
  return parts.join(" ");
}
