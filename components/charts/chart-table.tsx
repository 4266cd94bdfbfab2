import { joinClasses } from "@/components/ui/join-classes";

export type ChartColumn = { label: string; isNumber?: boolean };
export type ChartRow = { id: string; cells: readonly string[] };

const CELL = "border-b border-hair py-2 pr-4 text-left align-top last:pr-0";
const HEAD = "border-b border-edge py-2 pr-4 text-left align-bottom text-small font-semibold text-ink-2 last:pr-0";

/** The data of a figure as a table. The first cell of a row names it; a cell without a value is said in words. */
export function ChartTable({ caption, columns, rows }: { caption: string; columns: ChartColumn[]; rows: ChartRow[] }) {
  const [head, ...rest] = columns;
  return (
    <div className="overflow-x-auto [contain:inline-size]">
      <table className="w-full border-collapse border-t-2 border-b border-ink text-table">
        <caption className="pb-2 text-left text-small text-ink-2">{caption}</caption>
        <thead>
          <tr>
            <th scope="col" className={HEAD}>
              {head?.label}
            </th>
            {rest.map(({ label, isNumber }) => (
              <th key={label} scope="col" className={joinClasses(HEAD, isNumber && "text-right")}>
                {label}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(({ id, cells: [name, ...cells] }) => (
            <tr key={id} className="last:*:border-b-0">
              <th scope="row" className={joinClasses(CELL, "font-medium")}>
                {name}
              </th>
              {rest.map(({ label, isNumber }, i) => (
                <td
                  key={label}
                  className={joinClasses(CELL, isNumber && "text-right font-mono text-small whitespace-nowrap")}
                >
                  {cells[i]}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
