import { DataTable } from "@/components/ui/data-table";
import { ProgressTicks } from "@/components/ui/progress-ticks";
import type { TableColumn } from "@/components/ui/table-types";
import { Tag } from "@/components/ui/tag";
import { Time } from "@/components/ui/time";
import type { RoundProgress } from "@/lib/rounds/schema";

type ExaminerProgress = RoundProgress["examiners"][number];

export function ProgressTable({ progress, zone }: { progress: RoundProgress; zone: string }) {
  const columns: TableColumn[] = [
    { key: "name", head: "Examiner", isSortable: true },
    { key: "ticks", head: `Cases 1 to ${progress.itemCount}`, phone: "hidden" },
    { key: "count", head: "In", isNumeric: true, isSortable: true, phone: "end" },
    { key: "last", head: "Last reading", isSortable: true, phone: "plain" },
    { key: "state", head: "State", isHeadHidden: true, phone: "end" },
  ];
  return (
    <DataTable
      label="Table 1"
      caption="Readings by examiner. The order of cases differs from one examiner to the next, so positions say nothing of the cases."
      columns={columns}
      empty="Nobody was chosen for this round."
      rows={progress.examiners.map((examiner) => ({
        id: examiner.personId,
        sortValues: { name: examiner.name, count: examiner.readCount, last: examiner.lastSavedAt },
        cells: {
          name: (
            <>
              {examiner.name}{" "}
              {examiner.assignedAs === "trainee" && <span className="font-normal text-ink-2">trainee</span>}
            </>
          ),
          ticks: <ProgressTicks count={progress.itemCount} done={examiner.readCount} />,
          count: examiner.readCount,
          last: examiner.lastSavedAt ? <Time iso={examiner.lastSavedAt} zone={zone} /> : "–",
          state: <ExaminerState examiner={examiner} />,
        },
      }))}
    />
  );
}

function ExaminerState({ examiner }: { examiner: ExaminerProgress }) {
  if (examiner.submittedAt) return <Tag tone="ok">handed in</Tag>;
  if (examiner.readCount > 0) return <span className="text-small text-ink-2">reading</span>;
  return examiner.openedAt ? <span className="text-small text-ink-2">opened</span> : <Tag tone="warn">not begun</Tag>;
}
