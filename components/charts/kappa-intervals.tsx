"use client";

import { useState } from "react";
import { kappaAxis } from "./axis-range";
import { ChartFrame } from "./chart-frame";
import { layOutKappa } from "./kappa-layout";
import { type KappaRow, kappaSummary, kappaTip } from "./kappa-row";
import { KappaRowMark, KappaRowText } from "./kappa-row-mark";
import { KappaRuler } from "./kappa-ruler";
import { Plot, PlotLayer } from "./plot";
import { PointTip } from "./point-tip";

type KappaIntervalsProps = {
  /** In the order they are drawn. */
  rows: KappaRow[];
  floor?: number;
  median?: number;
  /** Head of the column of figures. */
  unitLabel?: string;
};

/** Agreement of each examiner: a dot for kappa, a whisker for its interval, the figures beside them. */
export function KappaIntervals({ rows, floor, median, unitLabel = "kappa (95 % interval)" }: KappaIntervalsProps) {
  const [active, setActive] = useState<number | null>(null);
  const axis = kappaAxis([...rows.flatMap((row) => row.estimate ?? []), ...[floor, median].flatMap((v) => v ?? [])]);
  const tips = rows.map((row) => kappaTip(row, floor));
  return (
    <ChartFrame
      heightPx={82 + rows.length * 30}
      tips={tips}
      pointsName="examiners"
      active={active}
      onActive={setActive}
    >
      {(box) => {
        const layout = layOutKappa(rows, box);
        const topOf = (index: number) => layout.top + index * layout.rowPx;
        const [row, tip] = active === null ? [] : [rows[active], tips[active]];
        return (
          <Plot
            width={box.width}
            height={layout.height}
            margin={{ top: layout.top, right: box.width - layout.right, bottom: 40, left: layout.left }}
            xDomain={[axis.low, axis.high]}
            yDomain={[0, Math.max(1, rows.length)]}
            isYReversed
            label={kappaSummary(rows, floor, median)}
          >
            <PlotLayer level="ground">
              {(scale) => (
                <g>
                  {rows.map(({ id, isOwn }, i) => (
                    <rect
                      key={id}
                      x={isOwn ? -8 : 0}
                      y={topOf(i)}
                      width={isOwn ? box.width + 16 : box.width}
                      height={layout.rowPx}
                      fill={isOwn ? "var(--brass-wash)" : active === i ? "var(--paper)" : "transparent"}
                      onPointerEnter={() => setActive(i)}
                    />
                  ))}
                  <KappaRuler
                    rowCount={rows.length}
                    axis={axis}
                    layout={layout}
                    box={box}
                    scale={scale}
                    unitLabel={unitLabel}
                    floor={floor}
                    median={median}
                  />
                </g>
              )}
            </PlotLayer>
            <PlotLayer level="line">
              {(scale) => (
                <g pointerEvents="none">
                  {rows.map((each, i) => (
                    <g key={each.id}>
                      <KappaRowText row={each} top={topOf(i)} layout={layout} box={box} floor={floor} />
                      <KappaRowMark row={each} top={topOf(i)} layout={layout} floor={floor} scale={scale} />
                    </g>
                  ))}
                </g>
              )}
            </PlotLayer>
            <PlotLayer level="tip">
              {(scale) =>
                active !== null && row && tip ? (
                  <PointTip
                    x={scale.x(row.estimate ?? axis.low)}
                    y={topOf(active) + layout.whiskerAt}
                    tip={tip}
                    box={box}
                    height={layout.height}
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
