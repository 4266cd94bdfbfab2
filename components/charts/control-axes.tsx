import { RuleUp } from "./axis";
import type { AxisRange } from "./axis-range";
import { ChartText } from "./chart-text";
import type { ControlPoint } from "./control-point";
import { keepReadable, spreadLabels } from "./place-labels";
import type { PlotScale } from "./plot";
import type { Measure } from "./use-chart-box";

/** Something that happened between rounds and may explain a change. */
export type ControlEvent = { at: string; label: string };

type AxesProps = {
  points: readonly ControlPoint[];
  xs: readonly number[];
  axis: AxisRange;
  valueLabel: string;
  format: (value: number) => string;
  scale: PlotScale;
  measure: Measure;
};

/** The value rule, and a time line with a tick at every round; names that would touch are left out, never the newest. */
export function ControlAxes({ points, xs, axis, valueLabel, format, scale, measure }: AxesProps) {
  const y = scale.bottom + 8;
  const kept = keepReadable(points.map(({ label }, i) => ({ centre: xs[i] ?? 0, size: measure(label, 13) })));
  return (
    <g pointerEvents="none">
      <ChartText x={0} y={12}>
        {valueLabel}
      </ChartText>
      <RuleUp scale={scale.y} {...axis} format={format} x={scale.left} />
      <path
        d={`M${scale.left} ${scale.bottom}V${y}H${scale.right}${xs.map((x) => `M${x} ${y}v6`).join("")}`}
        stroke="var(--edge)"
        fill="none"
      />
      {points.map(({ id, label }, i) =>
        kept[i] ? (
          <ChartText key={id} x={xs[i] ?? 0} y={y + 21} anchor="middle" hasHalo>
            {label}
          </ChartText>
        ) : null,
      )}
    </g>
  );
}

type EventsProps = { events: readonly ControlEvent[]; scale: PlotScale; measure: Measure; width: number };

/** Dotted uprights where something happened, each with its note under the axis. */
export function ControlEvents({ events, scale, measure, width }: EventsProps) {
  const marks = events.map(({ at, label }) => ({
    label,
    x: scale.x(Date.parse(at)),
    size: measure(label, 14, "serif"),
  }));
  const centres = spreadLabels(
    marks.map(({ x, size }) => ({ centre: x, size })),
    0,
    width,
    12,
  );
  return (
    <g pointerEvents="none">
      {marks.map(({ label, x }, i) => (
        <g key={`${label} ${x}`}>
          <path d={`M${x} ${scale.top}V${scale.bottom + 40}`} stroke="var(--cobalt)" strokeDasharray="2 4" />
          <ChartText x={centres[i] ?? x} y={scale.bottom + 56} size={14} face="note" tone="cobalt" anchor="middle">
            {label}
          </ChartText>
        </g>
      ))}
    </g>
  );
}
