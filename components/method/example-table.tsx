import { joinClasses } from "@/components/ui/join-classes";
import type { ExampleTable as Table } from "@/lib/method/worked-example";

/** Published data as a small table with its caption; a long one opens on request. */
export function ExampleTable({ table }: { table: Table }) {
  if (!table.isLong) {
    return (
      <figure>
        <figcaption className="mb-1.5 text-small text-ink-2">{table.caption}</figcaption>
        <Data table={table} />
      </figure>
    );
  }
  return (
    <details className="border-b border-hair">
      <summary className="flex min-h-touch items-center text-small text-cobalt underline underline-offset-3">
        {table.caption}
      </summary>
      <div className="pb-3">
        <Data table={table} />
      </div>
    </details>
  );
}

const PLACE = "pr-2 last:pr-0 sm:pr-4 sm:last:pr-0";

// Heads, rows and cells of published data never move, and may be alike or empty: their place is their key.
function Data({ table: { caption, heads, rows, isText = false } }: { table: Table }) {
  const side = isText ? "text-left" : "text-right";
  return (
    <div className="relative overflow-x-auto">
      <table className="border-collapse text-small">
        <caption className="sr-only">{caption}</caption>
        {heads && (
          <thead>
            <tr className="border-b border-edge">
              {heads.map((head, column) => {
                const Cell = head ? "th" : "td"; // over the heads of the rows there may be nothing to say
                return (
                  <Cell
                    // biome-ignore lint/suspicious/noArrayIndexKey: see above
                    key={column}
                    scope={head ? "col" : undefined}
                    className={joinClasses(
                      PLACE,
                      "pb-1 align-bottom font-medium text-ink-2",
                      column === 0 ? "text-left" : side,
                    )}
                  >
                    {head}
                  </Cell>
                );
              })}
            </tr>
          </thead>
        )}
        <tbody>
          {rows.map(({ head, cells }, row) => (
            // biome-ignore lint/suspicious/noArrayIndexKey: see above
            <tr key={row} className="border-b border-hair align-baseline last:border-b-0">
              {head !== undefined && (
                <th scope="row" className={joinClasses(PLACE, "py-1 text-left font-medium")}>
                  {head}
                </th>
              )}
              {cells.map((cell, column) => (
                <td
                  // biome-ignore lint/suspicious/noArrayIndexKey: see above
                  key={column}
                  className={joinClasses(PLACE, "py-1", side, !isText && "font-mono")}
                >
                  {cell}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
