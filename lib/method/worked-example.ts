import { formatInterval, formatNumber } from "@/lib/format/numbers";
import type { Result } from "@/lib/statistics";

/** One number, or the two ends of an interval. */
export type FigureValue = number | readonly [low: number, high: number];

export type WorkedFigure = {
  label: string;
  /** Computed from the data by the same code that scores a round. */
  value: FigureValue;
  digits: number;
  /** What the source prints. */
  printed?: FigureValue;
  /** Where nothing is printed: the value that another program gives for the same formula and data. */
  recomputed?: FigureValue;
};

export type ExampleTable = {
  caption: string;
  heads?: readonly string[];
  rows: readonly { head?: string; cells: readonly (string | number | null)[] }[];
  /** Opened on request, because it takes more room than it explains. */
  isLong?: boolean;
  /** Words rather than numbers: set left, in the face of what is read. */
  isText?: boolean;
};

export type WorkedExample = {
  /** What was measured, and where it was published. */
  data: string;
  tables?: readonly ExampleTable[];
  figures?: readonly WorkedFigure[];
  /** What to see in it; and where a printed value is quoted from memory or differs, why. */
  note?: string;
};

/** The value of a figure as the page shows it. */
export function formatFigure(value: FigureValue, digits: number): string {
  return typeof value === "number" ? formatNumber(value, digits) : formatInterval(value[0], value[1], digits);
}

/** A result that the published data are known to give. Throws with the reason if they do not. */
export function known<Parts extends object>(result: Result<Parts>): { ok: true; n: number } & Parts {
  if (!result.ok) throw new Error(`The published data gave no figure: ${result.reason}.`);
  return result;
}

/** The two ends of an interval that is known to have both. Throws where it has not. */
export function ends({ low, high }: { low?: number; high?: number }): [low: number, high: number] {
  if (low === undefined || high === undefined) throw new Error("The published data gave no interval.");
  return [low, high];
}

/** A part of a result that the published data are known to have. */
export function present<Part>(part: Part | undefined | null): Part {
  if (part === undefined || part === null) throw new Error("The published data gave no such figure.");
  return part;
}

/** A table of counts with its categories as heads of rows and columns. */
export function countsTable(
  caption: string,
  categories: readonly string[],
  counts: readonly (readonly number[])[],
): ExampleTable {
  return {
    caption,
    heads: ["", ...categories],
    rows: counts.map((cells, row) => ({ head: categories[row], cells })),
  };
}
