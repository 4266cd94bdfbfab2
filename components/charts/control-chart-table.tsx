import { ChartTable } from "./chart-table";
import { type ControlFormat, type ControlPoint, controlFormatter, formatDay, STATE_WORDS } from "./control-point";

type ControlChartTableProps = { points: ControlPoint[]; valueLabel: string; format: ControlFormat };

/** The same figures as ControlChart, round by round. */
export function ControlChartTable({ points, valueLabel, format }: ControlChartTableProps) {
  const { one, interval } = controlFormatter(points, format);
  const limits = (low: number | undefined, high: number | undefined) => {
    if (low === undefined && high === undefined) return "none";
    if (low === undefined) return high === undefined ? "none" : `above ${one(high)}`;
    return high === undefined ? `below ${one(low)}` : `outside ${interval(low, high)}`;
  };
  const columns = [
    { label: "Round" },
    { label: "Date" },
    { label: "Readings", isNumber: true },
    { label: valueLabel, isNumber: true },
    { label: "95 % interval", isNumber: true },
    { label: "Warning", isNumber: true },
    { label: "Action", isNumber: true },
    { label: "State" },
  ];
  const rows = points.map((p) => ({
    id: p.id,
    cells: [
      p.label,
      formatDay(p.at),
      String(p.n),
      p.value === undefined ? "none" : one(p.value),
      p.low === undefined || p.high === undefined ? "none" : interval(p.low, p.high),
      limits(p.lowerWarning, p.upperWarning),
      limits(p.lowerAction, p.upperAction),
      [p.value === undefined ? null : STATE_WORDS[p.state], p.reason].filter(Boolean).join("; "),
    ],
  }));
  return <ChartTable caption={`${valueLabel}, round by round`} columns={columns} rows={rows} />;
}
