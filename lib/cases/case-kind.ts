import type { Finding } from "@/lib/reflex/finding";
import { findingParts } from "@/lib/reflex/finding-parts";
import { shorthand } from "@/lib/reflex/shorthand";
import type { CaseKind } from "./schema";

export const CASE_KIND_NAMES: Record<CaseKind, string> = {
  aligned: "Aligned",
  eso: "Eso",
  exo: "Exo",
  vertical: "Vertical only",
  combined: "Combined",
  "not-readable": "Not readable",
};

/** The kind under which a balance counts a case: combined deviations are a kind of their own. */
export function caseKind(finding: Finding): CaseKind {
  if (!finding.readable) return "not-readable";
  const { horizontal, vertical } = findingParts(finding);
  if (horizontal && vertical) return "combined";
  if (vertical) return "vertical";
  return horizontal?.direction ?? "aligned";
}

/** A finding as it labels a picture in a list: in shorthand; why a picture cannot be read stands on the case's own page. */
export function caseLabel(finding: Finding): string {
  return finding.readable ? shorthand(finding, "tropia") : "not readable";
}
