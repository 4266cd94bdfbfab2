import Link from "next/link";
import { DataTable } from "@/components/ui/data-table";
import type { TableColumn } from "@/components/ui/table-types";
import { Tag } from "@/components/ui/tag";
import { formatShare } from "@/lib/format/numbers";
import { describeFinding } from "@/lib/reflex/describe-finding";
import type { RoundResults } from "@/lib/results/schema";

const COLUMNS: TableColumn[] = [
  { key: "code", head: "Case", isSortable: true },
  { key: "kind", head: "Shown", phone: "plain" },
  { key: "reference", head: "Reference, as shown", phone: "plain" },
  { key: "read", head: "Read", isNumeric: true },
  { key: "agreed", head: "Same direction", isNumeric: true, isSortable: true, phone: "end" },
];

const KIND_WORDS = { first: "once", repeat: "again", mirrored: "mirrored" };
/** A case most people read otherwise is a question about the case first. */
const SPLIT_SHARE = 0.5;

/** Case by case, the least agreed first: a split case is a question about the case. */
export function CaseTable({ cases, canOpen }: { cases: RoundResults["cases"]; canOpen: boolean }) {
  const share = ({ agreedCount, readCount }: RoundResults["cases"][number]) =>
    readCount > 0 ? agreedCount / readCount : null;
  return (
    <DataTable
      label="Table 4"
      caption="Cases, the least agreed first. Under half: a question about the case, its photograph or its reference."
      columns={COLUMNS}
      initialSort={{ key: "agreed", direction: "ascending" }}
      rows={cases.map((each) => {
        const agreed = share(each);
        return {
          id: each.itemId,
          sortValues: { code: each.code, agreed },
          cells: {
            code: canOpen ? (
              <Link href={`/cases/${each.caseId}`} className="font-mono">
                {each.code}
              </Link>
            ) : (
              <span className="font-mono">{each.code}</span>
            ),
            kind: KIND_WORDS[each.kind],
            reference: describeFinding(each.reference),
            read: each.readCount,
            agreed: (
              <span className="inline-flex items-center gap-2">
                {agreed !== null && agreed < SPLIT_SHARE && <Tag tone="warn">split</Tag>}
                {agreed === null ? "not read" : formatShare(agreed)}
              </span>
            ),
          },
        };
      })}
    />
  );
}
