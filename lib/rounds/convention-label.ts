import { type ConventionName, namedConvention } from "@/lib/reflex/named-convention";

type ConventionColumns = { convention: ConventionName; own_degrees_per_mm: string | null };

/** A round's convention as it is named wherever converted values are shown. */
export function conventionLabel({ convention, own_degrees_per_mm: own }: ConventionColumns): string {
  return namedConvention(convention, own === null ? null : Number(own)).label;
}
