import { type KappaRow, kappaText } from "./kappa-row";
import type { ChartBox, Measure } from "./use-chart-box";

/** Text sizes of the figure, px. */
export const KAPPA_PX = { name: 15, note: 13, value: 14 } as const;

export type KappaLayout = {
  isNarrow: boolean;
  /** The rule's ends, px from the left. */
  left: number;
  right: number;
  top: number;
  rowPx: number;
  height: number;
  /** From the top of a row to its name's baseline, and to the middle of its whisker. */
  nameAt: number;
  whiskerAt: number;
  /** Room for the name of a row. */
  nameMax: (row: KappaRow) => number;
};

const [GAP_PX, RULE_MIN_PX, AXIS_PX] = [18, 190, 40];

/** Names left, rule between, values right; where that leaves too short a rule, the name stands above its whisker. */
export function layOutKappa(rows: readonly KappaRow[], { width, measure }: ChartBox): KappaLayout {
  const names = rows.map((row) => measure(row.isOwn ? `${row.label} you` : row.label, KAPPA_PX.name, "sans", 600));
  const values = rows.map((row) => valueWidth(row, measure));
  const valueMax = Math.max(140, ...values);
  const nameMax = Math.min(Math.max(80, ...names), 0.3 * width);
  const isNarrow = width - nameMax - valueMax - 2 * GAP_PX < RULE_MIN_PX;
  const hasNotes = rows.some((row) => row.note !== undefined);
  if (isNarrow) {
    const aboveWhisker = (row: KappaRow) => width - valueWidth(row, measure) - GAP_PX;
    const top = 52;
    const rowPx = hasNotes ? 74 : 58;
    const frame = { left: 8, right: width - 8, top, rowPx, height: top + rows.length * rowPx + AXIS_PX };
    return { isNarrow, ...frame, nameAt: 17, whiskerAt: hasNotes ? 54 : 38, nameMax: aboveWhisker };
  }
  const top = 34;
  const rowPx = hasNotes ? 42 : 30;
  const frame = { left: nameMax + GAP_PX, right: width - valueMax - GAP_PX, top, rowPx };
  const height = top + rows.length * rowPx + AXIS_PX;
  return { isNarrow, ...frame, height, nameAt: hasNotes ? 18 : 20, whiskerAt: rowPx / 2, nameMax: () => nameMax };
}

function valueWidth(row: KappaRow, measure: Measure): number {
  const { figure, interval } = kappaText(row);
  if (row.estimate === undefined) return 0; // a reason stands where the whisker would
  if (figure === "") return measure(interval, KAPPA_PX.value);
  return measure(`${figure} ${interval}`, KAPPA_PX.value, "mono", 600);
}
