import { joinClasses } from "./join-classes";
import { TABLE_ROLES, type TableColumn, type TableRow } from "./table-types";

const PHONE_PLACES = {
  lead: "max-sm:order-1 max-sm:flex-[1_1_0] max-sm:min-w-0",
  end: "max-sm:order-1",
  line: "max-sm:order-3 max-sm:text-small max-sm:text-ink-2",
  plain: "max-sm:order-3 max-sm:text-small max-sm:text-ink-2",
  hidden: "max-sm:hidden",
};

/** One row; on a phone an entry of two lines. */
export function DataTableRow({ row, columns }: { row: TableRow; columns: readonly TableColumn[] }) {
  return (
    <tr
      {...TABLE_ROLES.row}
      className={joinClasses(
        "border-b border-hair last:border-b-0 max-sm:flex max-sm:flex-wrap max-sm:items-baseline max-sm:gap-x-4 max-sm:gap-y-0.5 max-sm:py-2.5",
        // An empty item as wide as the row starts the second line of the entry.
        "max-sm:after:order-2 max-sm:after:basis-full",
        row.isOwn && "bg-brass-wash max-sm:px-2",
      )}
    >
      {columns.map((column, index) => {
        const isRowHead = index === 0;
        const place = column.phone ?? (isRowHead ? "lead" : "line");
        const Cell = isRowHead ? "th" : "td";
        return (
          <Cell
            key={column.key}
            {...(isRowHead ? { ...TABLE_ROLES.rowHead, scope: "row" } : TABLE_ROLES.cell)}
            className={joinClasses(
              "py-2 pr-3 align-middle max-sm:p-0",
              isRowHead && "text-left font-semibold",
              row.isOwn && isRowHead && "sm:pl-2",
              column.isNumeric && "font-mono text-[0.93em] sm:pr-5 sm:text-right",
              PHONE_PLACES[place],
              column.className,
            )}
          >
            {row.isOwn && isRowHead && <span className="glint mr-2 inline-block size-2.5 bg-brass-dot" />}
            {place === "line" && (
              <span aria-hidden="true" className="font-sans text-ink-3 sm:hidden">
                {column.head}{" "}
              </span>
            )}
            {row.cells[column.key]}
          </Cell>
        );
      })}
    </tr>
  );
}
