"use client";

import { useState } from "react";
import { Scatter } from "recharts";
import {
  type Agreement,
  describeAgreement,
  describeLeftOut,
  differenceAxis,
  isOutside,
  type LeftOut,
  meanAxis,
  pointTip,
} from "./bland-altman";
import { AgreementLabels, AgreementLines, DifferenceAxes, DifferenceHistogram } from "./bland-altman-lines";
import { ChartFrame } from "./chart-frame";
import { ChartText } from "./chart-text";
import { type DifferencePoint, mergePoints, spotRadiusPx } from "./merge-points";
import { Plot, PlotLayer } from "./plot";
import { PointTip } from "./point-tip";
import { ReadingSpot } from "./reading-spot";
import type { Interval } from "./types";

type BlandAltmanPlotProps = {
  points: DifferencePoint[];
  bias?: Interval;
  lower?: Interval;
  upper?: Interval;
  unit: "°";
  xLabel: string;
  yLabel: string;
  isTooFew?: boolean;
  /** Pairs that could not be drawn, by reason: "not readable", "beyond the limbus". */
  leftOut?: LeftOut[];
  /** Why there are no limits. */
  reason?: string;
};

const HEIGHT_PX = 430;

/** Difference against mean of two readings, with the mean difference and the limits of agreement. */
export function BlandAltmanPlot({ points, bias, lower, upper, unit, xLabel, yLabel, ...rest }: BlandAltmanPlotProps) {
  const { isTooFew = false, leftOut = [], reason } = rest;
  const [active, setActive] = useState<number | null>(null);
  const agreement: Agreement | null = bias && lower && upper ? { bias, lower, upper } : null;
  const spots = mergePoints(points).sort((a, b) => a.mean - b.mean || a.difference - b.difference);
  const fullest = Math.max(1, ...spots.map((spot) => spot.count));
  const tips = spots.map((spot) => pointTip(spot, unit, agreement));
  const [xAxis, yAxis] = [meanAxis(points), differenceAxis(points, agreement)];
  const remark = agreement ? (isTooFew ? "too few to say" : null) : (reason ?? "no limits computed");
  const notes = [`${points.length} ${points.length === 1 ? "reading" : "readings"} drawn.`, describeLeftOut(leftOut)];
  return (
    <ChartFrame
      heightPx={HEIGHT_PX}
      tips={tips}
      pointsName="readings"
      active={active}
      onActive={setActive}
      below={<p className="mt-3 text-small text-ink-2">{notes.filter(Boolean).join(" ")}</p>}
    >
      {(box) => {
        const isNarrow = box.width < 520;
        const histogram = isNarrow ? 26 : 44;
        const right = histogram + 8 + (isNarrow ? 0 : 98);
        const [spot, tip] = active === null ? [] : [spots[active], tips[active]];
        return (
          <Plot
            width={box.width}
            height={HEIGHT_PX}
            margin={{ top: 26, right, bottom: 56, left: 42 }}
            xDomain={[xAxis.low, xAxis.high]}
            yDomain={[yAxis.low, yAxis.high]}
            label={describeAgreement(points, agreement, unit)}
          >
            <PlotLayer level="ground">
              {(scale) => (
                <g>
                  {agreement && <AgreementLines agreement={agreement} scale={scale} isTooFew={isTooFew} />}
                  <DifferenceHistogram points={points} scale={scale} x={scale.right + 8} width={histogram} />
                  <DifferenceAxes
                    xAxis={xAxis}
                    yAxis={yAxis}
                    xLabel={xLabel}
                    yLabel={yLabel}
                    unit={unit}
                    scale={scale}
                  />
                  {remark && (
                    <ChartText x={scale.right - 6} y={scale.top + 14} size={14} tone="hint" anchor="end" hasHalo>
                      {remark}
                    </ChartText>
                  )}
                </g>
              )}
            </PlotLayer>
            <Scatter
              data={spots.map((each) => ({ x: each.mean, y: each.difference }))}
              isAnimationActive={false}
              shape={({ cx = 0, cy = 0, index }: { cx?: number; cy?: number; index: number }) => (
                <ReadingSpot
                  x={cx}
                  y={cy}
                  r={spotRadiusPx(spots[index]?.count ?? 1, fullest)}
                  isOutside={!isTooFew && isOutside({ difference: spots[index]?.difference ?? 0 }, agreement)}
                  isActive={active === index}
                  onActive={(isOver) => setActive(isOver ? index : null)}
                />
              )}
            />
            <PlotLayer level="text">
              {(scale) =>
                agreement && (
                  <AgreementLabels
                    agreement={agreement}
                    scale={scale}
                    isTooFew={isTooFew}
                    unit={unit}
                    x={isNarrow ? scale.right - 4 : box.width}
                    isNarrow={isNarrow}
                  />
                )
              }
            </PlotLayer>
            <PlotLayer level="tip">
              {(scale) =>
                spot && tip ? (
                  <PointTip
                    x={scale.x(spot.mean)}
                    y={scale.y(spot.difference)}
                    tip={tip}
                    box={box}
                    height={HEIGHT_PX}
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
