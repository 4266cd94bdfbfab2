import { ArrowDown, ArrowUp, ChevronsUpDown } from "lucide-react";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";
import type { Sort } from "./sort-rows";
import { TABLE_ROLES, type TableColumn } from "./table-types";

type DataTableHeadProps = {
  columns: readonly TableColumn[];
  sort: Sort | null;
  onSort: (key: string) => void;
  isSticky: boolean;
};

/** The heads of a table. On a phone only the sortable ones are seen, as a row of buttons above the entries. */
export function DataTableHead({ columns, sort, onSort, isSticky }: DataTableHeadProps) {
  const isSortable = columns.some((column) => column.isSortable);
  return (
    <thead {...TABLE_ROLES.group} className={joinClasses("max-sm:block", !isSortable && "max-sm:sr-only")}>
      <tr {...TABLE_ROLES.row} className="max-sm:flex max-sm:flex-wrap max-sm:gap-x-4">
        {columns.map((column) => {
          const direction = sort?.key === column.key ? sort.direction : "none";
          return (
            <th
              key={column.key}
              {...TABLE_ROLES.head}
              scope="col"
              aria-sort={column.isSortable ? direction : undefined}
              className={joinClasses(
                "py-2 align-bottom text-small font-semibold text-ink-2 sm:shadow-[inset_0_-1px_0_var(--edge)]",
                isSticky && "bg-surface sm:sticky sm:top-0 sm:z-1",
                column.isNumeric ? "pr-5 text-right" : "pr-3 text-left",
                column.isSortable ? "max-sm:p-0" : "max-sm:sr-only",
                column.className,
              )}
            >
              {column.isSortable ? (
                <button
                  type="button"
                  onClick={() => onSort(column.key)}
                  className="-my-2 inline-flex min-h-touch items-center gap-1 font-semibold hover:text-ink hover:underline sm:min-h-slim"
                >
                  {column.head}
                  <Icon icon={SIGNS[direction]} className={direction === "none" ? "size-3.5 opacity-70" : "size-3.5"} />
                </button>
              ) : (
                <span className={column.isHeadHidden ? "sr-only" : undefined}>{column.head}</span>
              )}
            </th>
          );
        })}
      </tr>
    </thead>
  );
}

const SIGNS = { ascending: ArrowUp, descending: ArrowDown, none: ChevronsUpDown };
