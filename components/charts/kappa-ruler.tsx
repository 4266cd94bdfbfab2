import { formatNumber } from "@/lib/format/numbers";
import { RuleAcross } from "./axis";
import type { AxisRange } from "./axis-range";
import { ChartText } from "./chart-text";
import type { KappaLayout } from "./kappa-layout";
import { spreadLabels } from "./place-labels";
import type { PlotScale } from "./plot";
import type { ChartBox } from "./use-chart-box";

type KappaRulerProps = {
  rowCount: number;
  axis: AxisRange;
  layout: KappaLayout;
  box: ChartBox;
  scale: PlotScale;
  unitLabel: string;
  floor?: number;
  median?: number;
};

/** The axis of the kappa figure, its column heads, and floor and median as labelled uprights. */
export function KappaRuler({ rowCount, axis, layout, box, scale, unitLabel, floor, median }: KappaRulerProps) {
  const bottom = layout.height - 34;
  const labelAt = layout.top - 14;
  const headAt = layout.isNarrow ? 14 : labelAt;
  const lines = [
    ...(median === undefined
      ? []
      : [{ text: `median ${formatNumber(median, 2)}`, x: scale.x(median), isFloor: false }]),
    ...(floor === undefined ? [] : [{ text: `floor ${formatNumber(floor, 2)}`, x: scale.x(floor), isFloor: true }]),
  ];
  const wishes = lines.map(({ text, x }) => ({ centre: x, size: box.measure(text, 13) }));
  const centres = spreadLabels(wishes, layout.left - 8, layout.right + 10, 14);
  return (
    <g pointerEvents="none">
      <ChartText x={0} y={headAt}>
        Examiner
      </ChartText>
      <ChartText x={box.width} y={headAt} anchor="end">
        {unitLabel}
      </ChartText>
      {lines.map(({ text, x, isFloor }, i) => (
        <g key={text}>
          <path
            d={uprightPath(x, bottom, rowCount, layout)}
            stroke={isFloor ? "var(--tawny)" : "var(--edge)"}
            strokeWidth={isFloor ? 1.5 : 1}
            strokeDasharray={isFloor ? "6 4" : undefined}
          />
          <ChartText x={centres[i] ?? x} y={labelAt} anchor="middle" tone={isFloor ? "tawny" : "quiet"}>
            {text}
          </ChartText>
        </g>
      ))}
      <RuleAcross scale={scale.x} {...axis} minorStep={0.05} format={(value) => formatNumber(value, 1)} y={bottom} />
    </g>
  );
}

/** An upright through all rows. Where names and figures stand above the whiskers it passes behind the whiskers only. */
function uprightPath(x: number, bottom: number, rowCount: number, layout: KappaLayout): string {
  if (!layout.isNarrow) return `M${x} ${layout.top - 7}V${bottom}`;
  const pieces = Array.from({ length: rowCount }, (_, i) => {
    const y = layout.top + i * layout.rowPx + layout.whiskerAt;
    return `M${x} ${y - 13}V${i === rowCount - 1 ? bottom : y + 13}`;
  });
  return `M${x} ${layout.top - 7}v7${pieces.join("")}`;
}
