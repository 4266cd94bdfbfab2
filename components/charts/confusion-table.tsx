import { joinClasses } from "@/components/ui/join-classes";
import { formatShare } from "@/lib/format/numbers";
import { cellMix, usedCategories } from "./confusion";

type ConfusionTableProps = {
  categories: string[];
  /** counts[i][j]: how often category i of the rows met category j of the columns. */
  counts: number[][];
  rowTitle: string;
  columnTitle: string;
};

const CELL = "h-9 min-w-11 p-0 text-center font-mono text-table";
const FRAME = "font-semibold outline-[1.5px] -outline-offset-[4px]";
const HEAD = "px-1 pb-2 align-bottom text-small leading-tight font-medium text-ink-2";
const ROW_HEAD = "sticky left-0 z-10 bg-surface pr-3 text-left text-small font-medium whitespace-nowrap text-ink-2";

/** What was read against what it was. Agreement is cobalt in a frame, disagreement tawny; the count is always text. */
export function ConfusionTable({ categories, counts, rowTitle, columnTitle }: ConfusionTableProps) {
  const used = usedCategories(counts);
  const unusedCount = categories.length - used.length;
  return (
    <div>
      <section
        aria-label={`${rowTitle} against ${columnTitle}`}
        // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reached by the keyboard
        tabIndex={0}
        className="relative overflow-x-auto pb-1 [contain:inline-size]"
      >
        <table className="border-separate border-spacing-0.5">
          <thead>
            <tr>
              <th scope="col" className={joinClasses(ROW_HEAD, "pb-2 font-normal italic")}>
                <span className="block">{rowTitle}</span>
                <span className="block text-right">{columnTitle}</span>
              </th>
              {used.map((column) => (
                <th key={column} scope="col" className={HEAD}>
                  {categories[column]}
                </th>
              ))}
              <th scope="col" className={joinClasses(HEAD, "pl-2 italic")}>
                agreed
              </th>
            </tr>
          </thead>
          <tbody>
            {used.map((row) => (
              <ConfusionRow key={row} row={row} used={used} label={categories[row] ?? ""} counts={counts[row] ?? []} />
            ))}
          </tbody>
        </table>
      </section>
      {unusedCount > 0 && (
        <p className="mt-3 text-small text-ink-2">
          {unusedCount} {unusedCount === 1 ? "category that never occurs is" : "categories that never occur are"} not
          shown.
        </p>
      )}
    </div>
  );
}

function ConfusionRow({ row, used, label, counts }: { row: number; used: number[]; label: string; counts: number[] }) {
  const total = counts.reduce((sum, n) => sum + n, 0);
  return (
    <tr>
      <th scope="row" className={ROW_HEAD}>
        {label}
      </th>
      {used.map((column) => (
        <ConfusionCell key={column} count={counts[column] ?? 0} total={total} isAgreement={row === column} />
      ))}
      <td className="pl-2 text-right font-mono text-small whitespace-nowrap text-ink-2">
        {total > 0 ? formatShare((counts[row] ?? 0) / total) : "none"}
      </td>
    </tr>
  );
}

function ConfusionCell({ count, total, isAgreement }: { count: number; total: number; isAgreement: boolean }) {
  if (count === 0) {
    return (
      <td className={joinClasses(CELL, isAgreement && FRAME, isAgreement && "outline-cobalt", "text-edge")}>
        <span aria-hidden="true">·</span>
        <span className="sr-only">0</span>
      </td>
    );
  }
  const { percent, isReversed } = cellMix(count / total, isAgreement);
  const colour = isAgreement ? "var(--cobalt)" : "var(--tawny)";
  return (
    <td
      className={joinClasses(
        CELL,
        isAgreement && FRAME,
        isAgreement && (isReversed ? "outline-on-ink" : "outline-cobalt"),
        isReversed && "text-on-ink",
        "print:[print-color-adjust:exact]",
      )}
      style={{ backgroundColor: `color-mix(in srgb, ${colour} ${percent}%, var(--sheet))` }}
    >
      {count}
    </td>
  );
}
