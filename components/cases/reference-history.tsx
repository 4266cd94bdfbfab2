import { DataTable } from "@/components/ui/data-table";
import { Time } from "@/components/ui/time";
import { REFERENCE_BASIS_NAMES, type Reference } from "@/lib/cases/schema";
import { describeFinding } from "@/lib/reflex/describe-finding";

const COLUMNS = [
  { key: "revision", head: "Revision" },
  { key: "finding", head: "Reference", phone: "plain" as const },
  { key: "basis", head: "Rests on" },
  { key: "reason", head: "Reason" },
  { key: "when", head: "Given", phone: "end" as const },
];

/** Every reference the case has had; none is ever overwritten. */
export function ReferenceHistory({ references, zone }: { references: Reference[]; zone: string }) {
  return (
    <section>
      <h2 className="mb-3 text-h2">References over time</h2>
      <DataTable
        caption="References of this case, newest first"
        isCaptionHidden
        columns={COLUMNS}
        rows={references.map((each) => ({
          id: String(each.revision),
          cells: {
            revision: each.revision,
            finding: describeFinding(each.finding),
            basis: REFERENCE_BASIS_NAMES[each.basis],
            reason: each.reason || "first reference",
            when: (
              <>
                <Time iso={each.createdAt} zone={zone} form="date" />
                {each.createdBy && `, ${each.createdBy}`}
              </>
            ),
          },
        }))}
      />
    </section>
  );
}
