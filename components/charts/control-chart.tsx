"use client";

import { useState } from "react";
import { Line } from "recharts";
import { multiplesBetween } from "./axis-range";
import { ChartFrame } from "./chart-frame";
import type { ControlEvent } from "./control-axes";
import { ControlGround } from "./control-ground";
import { ControlLimits } from "./control-limits";
import { ControlKey, ControlMark } from "./control-marks";
import {
  type ControlFormat,
  type ControlPoint,
  controlFormatter,
  controlTip,
  describeControl,
  timeSpan,
  valueAxis,
} from "./control-point";
import { HoverColumns } from "./control-whiskers";
import { Plot, PlotLayer } from "./plot";
import { PointTip } from "./point-tip";

type ControlChartProps = {
  /** In order of time. */
  points: ControlPoint[];
  centre?: number;
  centreLabel?: string;
  valueLabel: string;
  format: ControlFormat;
  height?: number;
  /** A small multiple: marks and lines only. Its numbers and its link stand beside it. */
  isSmall?: boolean;
  events?: ControlEvent[];
  /** Value axis and time axis shared by several charts; each fits its own points otherwise. */
  valueSpan?: [low: number, high: number];
  dateSpan?: [from: string, to: string];
};

/** A value round by round on a true time axis, against its centre, warning and action limits. */
export function ControlChart({
  points,
  centre,
  centreLabel = "centre",
  valueLabel,
  format,
  ...rest
}: ControlChartProps) {
  const { isSmall = false, height = isSmall ? 84 : 380, events = [], valueSpan, dateSpan } = rest;
  const [active, setActive] = useState<number | null>(null);
  const formatter = controlFormatter(points, format);
  const fitted = valueAxis(points, centre, format, isSmall);
  const axis = valueSpan ? { low: valueSpan[0], high: valueSpan[1], ticks: ticksIn(valueSpan, fitted.ticks) } : fitted;
  const times = points.map(({ at }) => Date.parse(at));
  const tips = isSmall ? [] : points.map((point) => controlTip(point, formatter));
  return (
    <ChartFrame
      heightPx={height}
      tips={tips}
      pointsName="rounds"
      active={active}
      onActive={setActive}
      below={isSmall ? null : <ControlKey />}
    >
      {(box) => {
        const hasWords = box.width >= 480;
        const wide = {
          top: 30,
          right: hasWords ? 128 : 62,
          bottom: events.length > 0 ? 70 : 40,
          left: format === "kappa" ? 46 : 54,
        };
        const [point, tip] = active === null ? [] : [points[active], tips[active]];
        return (
          <Plot
            width={box.width}
            height={height}
            margin={isSmall ? { top: 8, right: 2, bottom: 8, left: 2 } : wide}
            xDomain={timeSpan(dateSpan ? dateSpan.map((at) => Date.parse(at)) : times)}
            yDomain={[axis.low, axis.high]}
            data={points.map(({ value }, i) => ({ x: times[i], y: value }))}
            label={describeControl(points, valueLabel, formatter)}
          >
            <PlotLayer level="ground">
              {(scale) => {
                const ground = { points, xs: times.map(scale.x), centre, scale };
                if (isSmall) return <ControlLimits {...ground} />;
                const named = { axis, centreLabel, valueLabel, format: formatter.one, events };
                return <ControlGround {...ground} {...named} active={active} box={box} hasWords={hasWords} />;
              }}
            </PlotLayer>
            <Line
              dataKey="y"
              type="linear"
              stroke="var(--ink)"
              strokeWidth={isSmall ? 1.5 : 2}
              isAnimationActive={false}
              activeDot={false}
              dot={({ key, cx, cy, index }) => (
                <g key={key}>
                  {typeof cx === "number" && typeof cy === "number" && (
                    <ControlMark x={cx} y={cy} state={points[index]?.state ?? "none"} isSmall={isSmall} />
                  )}
                </g>
              )}
            />
            <PlotLayer level="text">
              {(scale) =>
                isSmall ? null : (
                  <HoverColumns points={points} xs={times.map(scale.x)} scale={scale} onActive={setActive} />
                )
              }
            </PlotLayer>
            <PlotLayer level="tip">
              {(scale) =>
                point && tip ? (
                  <PointTip
                    x={scale.x(Date.parse(point.at))}
                    y={point.value === undefined ? scale.bottom : scale.y(point.value)}
                    tip={tip}
                    box={box}
                    height={height}
                  />
                ) : null
              }
            </PlotLayer>
          </Plot>
        );
      }}
    </ChartFrame>
  );
}

/** Ticks of a shared axis at the distance the chart's own axis would use. */
function ticksIn([low, high]: [number, number], fitted: readonly number[]): number[] {
  const [first = low, second = high] = fitted;
  return multiplesBetween(low, high, second - first);
}
