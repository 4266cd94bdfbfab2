import { formatInterval, formatNumber, formatSigned, formatSignedInterval } from "@/lib/format/numbers";
import { type AxisRange, paddedAxis } from "./axis-range";
import type { Tip } from "./point-tip";

export type ControlState = "in" | "warning" | "action" | "none";
export type ControlFormat = "kappa" | "degrees";

export type ControlPoint = {
  id: string;
  /** Short name under the axis: "R12". */
  label: string;
  /** When it was measured, ISO 8601. */
  at: string;
  /** Left out when it could not be computed: the line has a gap there. */
  value?: number;
  low?: number;
  high?: number;
  n: number;
  /** `none`: no limits apply, or too few readings to say. */
  state: ControlState;
  lowerWarning?: number;
  upperWarning?: number;
  lowerAction?: number;
  upperAction?: number;
  reason?: string;
};

export const STATE_WORDS: Record<ControlState, string> = {
  in: "within limits",
  warning: "beyond a warning limit",
  action: "beyond an action limit",
  none: "not judged",
};

const limitsOf = (p: ControlPoint) => [p.lowerWarning, p.upperWarning, p.lowerAction, p.upperAction];
const isNumber = (value: number | undefined): value is number => value !== undefined;

/** The value axis: every value, limit and, unless it is a small multiple, every interval. */
export function valueAxis(
  points: readonly ControlPoint[],
  centre: number | undefined,
  format: ControlFormat,
  isSmall: boolean,
): AxisRange {
  const values = [centre, ...points.flatMap((p) => [p.value, ...limitsOf(p), ...(isSmall ? [] : [p.low, p.high])])];
  const scale = format === "kappa" ? { steps: [0.05, 0.1, 0.2, 0.5], highest: 1 } : { steps: [1, 2, 5, 10, 20] };
  return paddedAxis(values.filter(isNumber), { ...scale, tickCountMax: 6 });
}

export type ControlFormatter = { one: (value: number) => string; interval: (low: number, high: number) => string };

/** Kappa has two decimals; degrees carry a sign when the figure has both sides of zero, as differences do. */
export function controlFormatter(points: readonly ControlPoint[], format: ControlFormat): ControlFormatter {
  if (format === "kappa")
    return { one: (value) => formatNumber(value, 2), interval: (low, high) => formatInterval(low, high, 2) };
  const isSigned = points.some((p) => [p.value, p.low, ...limitsOf(p)].some((value) => isNumber(value) && value < 0));
  return isSigned
    ? { one: (value) => `${formatSigned(value)}°`, interval: (low, high) => `${formatSignedInterval(low, high)}°` }
    : { one: (value) => `${formatNumber(value, 1)}°`, interval: (low, high) => `${formatInterval(low, high, 1)}°` };
}

/** Ends of the time axis in ms, with room beyond the first and the last point. */
export function timeSpan(times: readonly number[], roomShare = 0.045): [from: number, to: number] {
  const DAY_MS = 86_400_000;
  const [first, last] = times.length > 0 ? [Math.min(...times), Math.max(...times)] : [0, 0];
  const room = Math.max(DAY_MS, (last - first) * roomShare);
  return [first - room, last + room];
}

const DAY = new Intl.DateTimeFormat("en-GB", { dateStyle: "medium", timeZone: "UTC" });
export const formatDay = (at: string) => DAY.format(new Date(at));

export function controlTip(point: ControlPoint, { one, interval }: ControlFormatter): Tip {
  const title = `${point.label}, ${formatDay(point.at)}`;
  const readings = `${point.n} ${point.n === 1 ? "reading" : "readings"}`;
  if (point.value === undefined) return { title, lines: [point.reason ?? "not computed", readings] };
  const lines = [`${one(point.value)}, ${STATE_WORDS[point.state]}`];
  if (isNumber(point.low) && isNumber(point.high)) lines.push(`95 % interval ${interval(point.low, point.high)}`);
  return { title, lines: [...lines, readings, ...(point.reason ? [point.reason] : [])] };
}

/** One sentence for the whole figure, for those who do not see it. */
export function describeControl(
  points: readonly ControlPoint[],
  valueLabel: string,
  { one }: ControlFormatter,
): string {
  const [first, last] = [points[0], points.at(-1)];
  if (!first || !last) return `${valueLabel}: no rounds yet.`;
  const latest =
    last.value === undefined ? (last.reason ?? "not computed") : `${one(last.value)}, ${STATE_WORDS[last.state]}`;
  const beyond = (["warning", "action"] as const)
    .map((state) => ({ state, count: points.filter((p) => p.state === state).length }))
    .filter(({ count }) => count > 0)
    .map(({ state, count }) => `${count} ${STATE_WORDS[state]}`);
  const range = points.length === 1 ? first.label : `${points.length} rounds from ${first.label} to ${last.label}`;
  return `${valueLabel}: ${range}. Latest ${latest}. ${beyond.length > 0 ? `In all ${beyond.join(", ")}.` : "None beyond a limit."}`;
}
