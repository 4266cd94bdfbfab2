import type { ControlPoint } from "./control-point";
import type { PlotScale } from "./plot";
import { columnBounds } from "./stepped-limits";

type Columns = { xs: readonly number[]; scale: PlotScale };

/** The interval of each value, thin enough to leave the limits readable; an upright through the round looked at. */
export function ControlWhiskers({
  points,
  xs,
  scale,
  active,
}: Columns & { points: readonly ControlPoint[]; active: number | null }) {
  const path = points.map(({ low, high }, i) => {
    const x = xs[i];
    if (x === undefined || low === undefined || high === undefined) return "";
    const [top, bottom] = [Math.max(scale.top, scale.y(high)), Math.min(scale.bottom, scale.y(low))];
    return `M${x} ${top}V${bottom}M${x - 4} ${top}h8M${x - 4} ${bottom}h8`;
  });
  const at = active === null ? undefined : xs[active];
  return (
    <g pointerEvents="none">
      {at !== undefined && <path d={`M${at} ${scale.top}V${scale.bottom + 8}`} stroke="var(--tick)" />}
      <path d={path.join("")} stroke="var(--edge)" strokeWidth={1.2} fill="none" />
    </g>
  );
}

type HoverColumnsProps = Columns & { points: readonly ControlPoint[]; onActive: (index: number) => void };

/** The pointer finds a round anywhere in its column, so that nobody has to hit a dot. */
export function HoverColumns({ points, xs, scale, onActive }: HoverColumnsProps) {
  const columns = columnBounds(xs, scale.left, scale.right);
  return (
    <g>
      {points.map(({ id }, i) => {
        const { from, to } = columns[i] ?? { from: 0, to: 0 };
        return (
          <rect
            key={id}
            x={from}
            y={scale.top}
            width={Math.max(0, to - from)}
            height={scale.bottom - scale.top + 34}
            fill="transparent"
            onPointerEnter={() => onActive(i)}
          />
        );
      })}
    </g>
  );
}
