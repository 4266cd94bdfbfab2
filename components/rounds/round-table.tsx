import Link from "next/link";
import { DataTable } from "@/components/ui/data-table";
import type { TableColumn } from "@/components/ui/table-types";
import { Time } from "@/components/ui/time";
import type { RoundSummary } from "@/lib/rounds/schema";
import { RoundStateTag } from "./round-state-tag";

const COLUMNS: TableColumn[] = [
  { key: "title", head: "Round" },
  { key: "state", head: "State", phone: "end" },
  { key: "opens", head: "Opens", isSortable: true },
  { key: "closes", head: "Closes", isSortable: true },
  { key: "items", head: "Cases", isNumeric: true },
  { key: "examiners", head: "Handed in", isNumeric: true },
  { key: "readings", head: "Readings", isNumeric: true, isSortable: true },
];

/** Where a round is worked on in its state. */
export function roundHref({ id, state }: Pick<RoundSummary, "id" | "state">): string {
  if (state === "draft") return `/rounds/${id}/compose`;
  return state === "open" ? `/rounds/${id}` : `/rounds/${id}/results`;
}

export function RoundTable({ rounds, zone }: { rounds: RoundSummary[]; zone: string }) {
  const day = (iso: string | null) => (iso ? <Time iso={iso} zone={zone} form="date" /> : "not set");
  return (
    <DataTable
      caption="Rounds, newest first"
      isCaptionHidden
      columns={COLUMNS}
      empty="There is no round yet. Start one above."
      rows={rounds.map((round) => ({
        id: round.id,
        sortValues: { opens: round.opensAt, closes: round.closesAt, readings: round.readingCount },
        cells: {
          title: (
            <Link href={roundHref(round)} className="font-semibold">
              {round.number}. {round.title}
            </Link>
          ),
          state: <RoundStateTag state={round.state} />,
          opens: day(round.opensAt),
          closes: day(round.closesAt),
          items: round.itemCount,
          examiners: `${round.submittedCount} of ${round.examinerCount}`,
          readings: round.readingCount,
        },
      }))}
    />
  );
}
