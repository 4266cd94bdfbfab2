import { DataTable } from "@/components/ui/data-table";
import { CASE_KIND_NAMES, caseKind } from "@/lib/cases/case-kind";
import { CASE_KINDS, type CaseSummary } from "@/lib/cases/schema";
import { STEPS, stepOfFinding } from "@/lib/reflex/step";
import { countKind } from "@/lib/rounds/compose-items";
import type { RoundDraft } from "@/lib/rounds/schema";

const COLUMNS = [
  { key: "kind", head: "Kind" },
  ...STEPS.map((step) => ({ key: String(step), head: `${step}°`, isNumeric: true, phone: "line" as const })),
  { key: "all", head: "All", isNumeric: true, phone: "end" as const },
];

/** How the chosen cases spread over directions and landmark steps, so that a gap is seen before publishing. */
export function BalanceTable({ cases, items }: { cases: CaseSummary[]; items: RoundDraft["items"] }) {
  const repeats = countKind(items, "repeat") + countKind(items, "mirrored");
  return (
    <DataTable
      caption={`Balance of the ${cases.length} cases chosen${repeats > 0 ? `, ${repeats} of them shown again` : ""}`}
      columns={COLUMNS}
      rows={CASE_KINDS.map((kind) => {
        const ofKind = cases.filter(({ finding }) => caseKind(finding) === kind);
        const perStep = STEPS.map((step) => {
          const count = ofKind.filter(({ finding }) => stepOfFinding(finding) === step).length;
          return [String(step), count || <span className="text-ink-3">·</span>];
        });
        return { id: kind, cells: { kind: CASE_KIND_NAMES[kind], all: ofKind.length, ...Object.fromEntries(perStep) } };
      })}
    />
  );
}
