import type { AxisRange } from "./axis-range";
import { ControlAxes, type ControlEvent, ControlEvents } from "./control-axes";
import { ControlLimits, LimitLabels } from "./control-limits";
import type { ControlPoint } from "./control-point";
import { ControlWhiskers } from "./control-whiskers";
import type { PlotScale } from "./plot";
import type { ChartBox } from "./use-chart-box";

type ControlGroundProps = {
  points: readonly ControlPoint[];
  xs: readonly number[];
  axis: AxisRange;
  centre?: number;
  centreLabel: string;
  valueLabel: string;
  format: (value: number) => string;
  events: readonly ControlEvent[];
  active: number | null;
  scale: PlotScale;
  box: ChartBox;
  hasWords: boolean;
};

/** All that lies under the points of a control chart at full size. */
export function ControlGround({ points, xs, centre, scale, box, format, ...rest }: ControlGroundProps) {
  const shared = { points, xs, scale };
  return (
    <g>
      <ControlLimits {...shared} centre={centre} />
      <ControlWhiskers {...shared} active={rest.active} />
      <ControlEvents events={rest.events} scale={scale} measure={box.measure} width={box.width} />
      <ControlAxes {...shared} axis={rest.axis} valueLabel={rest.valueLabel} format={format} measure={box.measure} />
      <LimitLabels
        points={points}
        scale={scale}
        centre={centre}
        centreLabel={rest.centreLabel}
        format={format}
        hasWords={rest.hasWords}
      />
    </g>
  );
}
