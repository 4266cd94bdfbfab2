import { BEYOND_LIMBUS, type Degrees, type Finding } from "@/lib/reflex/finding";
import { FindingSchema } from "./schema";

/** A finding as the tables of references and readings hold it. */
export type FindingColumns = {
  readable: boolean;
  unreadable_reason: string | null;
  eye: string | null;
  horizontal: string | null;
  horizontal_degrees: number | null;
  horizontal_beyond: boolean | null;
  vertical: string | null;
  vertical_degrees: number | null;
  vertical_beyond: boolean | null;
};

const COLUMN_NAMES = [
  "readable",
  "unreadable_reason",
  "eye",
  "horizontal",
  "horizontal_degrees",
  "horizontal_beyond",
  "vertical",
  "vertical_degrees",
  "vertical_beyond",
] as const satisfies readonly (keyof FindingColumns)[];

/** The finding's columns of one table or alias, to select. */
export function findingColumnsOf(table: string): string[] {
  return COLUMN_NAMES.map((column) => `${table}.${column}`);
}

export function toFindingColumns(finding: Finding): FindingColumns {
  if (!finding.readable) {
    return {
      readable: false,
      unreadable_reason: finding.reason,
      eye: null,
      horizontal: null,
      horizontal_degrees: null,
      horizontal_beyond: null,
      vertical: null,
      vertical_degrees: null,
      vertical_beyond: null,
    };
  }
  return {
    readable: true,
    unreadable_reason: null,
    eye: finding.eye,
    horizontal: finding.horizontal,
    horizontal_degrees: countedDegrees(finding.horizontalDegrees),
    horizontal_beyond: finding.horizontalDegrees === BEYOND_LIMBUS,
    vertical: finding.vertical,
    vertical_degrees: countedDegrees(finding.verticalDegrees),
    vertical_beyond: finding.verticalDegrees === BEYOND_LIMBUS,
  };
}

/** Reads a finding back; throws when a row breaks the rules, which the database itself forbids. */
export function fromFindingColumns(row: FindingColumns): Finding {
  if (!row.readable) return FindingSchema.parse({ readable: false, reason: row.unreadable_reason });
  return FindingSchema.parse({
    readable: true,
    eye: row.eye,
    horizontal: row.horizontal,
    horizontalDegrees: row.horizontal_beyond ? BEYOND_LIMBUS : row.horizontal_degrees,
    vertical: row.vertical,
    verticalDegrees: row.vertical_beyond ? BEYOND_LIMBUS : row.vertical_degrees,
  });
}

function countedDegrees(degrees: Degrees | null): number | null {
  return degrees === BEYOND_LIMBUS ? null : degrees;
}
