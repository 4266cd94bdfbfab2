/** Something in the table to be mended: its line from 1 (0: the table as a whole) and the name of its column. */
export type TableFault = { line: number; column: string; message: string };

/** A table that cannot be read, with every fault found in it in the order of its lines. */
export class TableError extends Error {
  override readonly name = "TableError";

  constructor(readonly faults: readonly TableFault[]) {
    super("The table cannot be read.");
  }
}
