import type { ReactNode } from "react";
import type { SortValue } from "./sort-rows";

export type TableColumn = {
  key: string;
  head: string;
  /** Keeps the head for assistive technology only, as over a column of buttons. */
  isHeadHidden?: boolean;
  /** Set right, in the face of what is measured. */
  isNumeric?: boolean;
  isSortable?: boolean;
  /**
   * Its place on a phone, where a row becomes an entry of two lines. lead: first line, left (the first column unless
   * said); end: first line, right; line: second line, after its head; plain: second line without its head.
   */
  phone?: "lead" | "end" | "line" | "plain" | "hidden";
  className?: string;
};

/** Plain data and drawn cells, so that a server page can hand rows to the table, which sorts in the browser. */
export type TableRow = {
  id: string;
  cells: Readonly<Record<string, ReactNode>>;
  /** By column, for the sortable ones; `null` where there is nothing to compare. */
  sortValues?: Readonly<Record<string, SortValue>>;
  /** The row of the person who looks: a brass dot on a brass wash. */
  isOwn?: boolean;
};

// On phones rows and cells are laid out as flex items, and some browsers then forget that they are a table.
export const TABLE_ROLES = {
  table: { role: "table" },
  group: { role: "rowgroup" },
  row: { role: "row" },
  head: { role: "columnheader" },
  rowHead: { role: "rowheader" },
  cell: { role: "cell" },
} as const;
