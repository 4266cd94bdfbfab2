"use client";

import { type ReactNode, useState } from "react";
import { DataTableHead } from "./data-table-head";
import { DataTableRow } from "./data-table-row";
import { joinClasses } from "./join-classes";
import { nextSort, type Sort, sortRows } from "./sort-rows";
import { TABLE_ROLES, type TableColumn, type TableRow } from "./table-types";

type DataTableProps = {
  /** What the table holds; with `label`, its number: "Table 1". */
  caption: ReactNode;
  label?: string;
  isCaptionHidden?: boolean;
  /** The first column heads its rows. */
  columns: readonly TableColumn[];
  rows: readonly TableRow[];
  initialSort?: Sort;
  /** Shown in place of rows when there are none. */
  empty?: ReactNode;
  /** Lets a table with many columns be moved sideways instead of widening the page. */
  isWide?: boolean;
  className?: string;
};

/** A table as a journal sets it: a heavy rule above, a light one below, no uprights, no stripes. */
export function DataTable(props: DataTableProps) {
  const { caption, label, columns, rows, empty, isWide = false } = props;
  const [sort, setSort] = useState<Sort | null>(props.initialSort ?? null);
  const table = (
    <table
      {...TABLE_ROLES.table}
      className={joinClasses("w-full border-collapse text-table max-sm:block", props.className)}
    >
      <caption
        className={joinClasses(
          "mb-3 max-w-read text-left font-serif text-body leading-[1.35] max-sm:block",
          props.isCaptionHidden && "sr-only",
        )}
      >
        {label && <b>{label} </b>}
        {caption}
      </caption>
      <DataTableHead columns={columns} sort={sort} onSort={(key) => setSort(nextSort(sort, key))} isSticky={!isWide} />
      <tbody {...TABLE_ROLES.group} className="border-y border-y-ink max-sm:block">
        {sortRows(rows, sort).map((row) => (
          <DataTableRow key={row.id} row={row} columns={columns} />
        ))}
        {rows.length === 0 && empty && (
          <tr {...TABLE_ROLES.row} className="max-sm:block">
            <td {...TABLE_ROLES.cell} colSpan={columns.length} className="py-6 text-center text-ink-2 max-sm:block">
              {empty}
            </td>
          </tr>
        )}
      </tbody>
    </table>
  );
  if (!isWide) return table;
  return (
    // biome-ignore lint/a11y/noNoninteractiveTabindex: a region that scrolls must be reachable from the keyboard
    <section aria-label={label ?? "Table, scrolls sideways"} tabIndex={0} className="overflow-x-auto">
      {table}
    </section>
  );
}
