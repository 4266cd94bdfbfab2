import { ChartText } from "./chart-text";
import { KAPPA_PX, type KappaLayout } from "./kappa-layout";
import { isUnderFloor, type KappaRow, kappaText } from "./kappa-row";
import { Dot, intervalPath, OpenDot, Triangle } from "./marks";
import { fitText } from "./place-labels";
import type { PlotScale } from "./plot";
import type { ChartBox } from "./use-chart-box";

type RowProps = { row: KappaRow; top: number; layout: KappaLayout; box: ChartBox; floor?: number };

/** Name left and value right of one row; a refusal says its reason where the whisker would stand. */
export function KappaRowText({ row, top, layout, box, floor }: RowProps) {
  const { figure, interval } = kappaText(row);
  const isStrong = row.isOwn || isUnderFloor(row, floor);
  const you = row.isOwn && row.label.toLowerCase() !== "you" ? " you" : "";
  const nameMax = layout.nameMax(row) - box.measure(you, KAPPA_PX.note);
  const name = fitText(row.label, nameMax, (text) => box.measure(text, KAPPA_PX.name, "sans", isStrong ? 600 : 400));
  const isRefused = row.estimate === undefined;
  const baseline = top + layout.nameAt;
  const valueAt = layout.isNarrow ? baseline : top + layout.whiskerAt + 5;
  const reasonAt = layout.isNarrow ? { x: 0, y: top + layout.whiskerAt + 5 } : { x: layout.left + 8, y: valueAt };
  return (
    <g>
      <ChartText
        x={0}
        y={baseline}
        size={KAPPA_PX.name}
        tone={row.isTooFew || isRefused ? "hint" : "ink"}
        isStrong={isStrong}
      >
        {name !== row.label && <title>{row.label}</title>}
        {name}
        {you && <tspan className="fill-brass text-[13px] font-semibold">{you}</tspan>}
      </ChartText>
      {row.note && (
        <ChartText x={0} y={baseline + 16} size={KAPPA_PX.note} tone="hint">
          {row.note}
        </ChartText>
      )}
      {isRefused ? (
        <ChartText {...reasonAt} size={KAPPA_PX.value} tone="hint" hasHalo>
          {fitText(interval, box.width - reasonAt.x, (text) => box.measure(text, KAPPA_PX.value))}
        </ChartText>
      ) : (
        <ChartText
          x={box.width}
          y={valueAt}
          size={KAPPA_PX.value}
          anchor="end"
          tone={figure ? "ink" : "hint"}
          face={figure ? "mono" : "sans"}
        >
          <tspan className={isStrong ? "font-semibold" : undefined}>{figure}</tspan>{" "}
          <tspan className={figure ? "fill-ink-2" : undefined}>{interval}</tspan>
        </ChartText>
      )}
    </g>
  );
}

/** Whisker and dot of one row. An end outside the axis becomes an arrow at the axis end. */
export function KappaRowMark({ row, top, layout, floor, scale }: Omit<RowProps, "box"> & { scale: PlotScale }) {
  if (row.estimate === undefined) return null;
  const y = top + layout.whiskerAt;
  const isUnder = isUnderFloor(row, floor);
  const colour = row.isTooFew ? "var(--tick)" : isUnder ? "var(--tawny)" : row.isOwn ? "var(--brass)" : "var(--ink)";
  const x = scale.x(row.estimate);
  return (
    <g>
      {row.low !== undefined && row.high !== undefined && (
        <path
          d={intervalPath(scale.x(row.low), scale.x(row.high), y, scale)}
          stroke={colour}
          strokeWidth={1.6}
          fill="none"
        />
      )}
      {row.isTooFew ? (
        <OpenDot x={x} y={y} r={4.8} colour={colour} />
      ) : isUnder ? (
        <Triangle x={x} y={y} r={5.6} />
      ) : (
        <Dot x={x} y={y} r={5.6} colour={row.isOwn ? "var(--brass-dot)" : colour} />
      )}
    </g>
  );
}
