"use client";

import type { ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";
import styles from "./charts.module.css";
import { speakTip, type Tip } from "./point-tip";
import { type ChartBox, useChartBox } from "./use-chart-box";

type ChartFrameProps = {
  /** Height kept free before the width is known, so that the page does not jump. */
  heightPx: number;
  /** The points in the order the arrow keys visit them, each with what it says; none means no keyboard stop. */
  tips?: readonly Tip[];
  /** What one point is, in the plural: "examiners", "rounds". */
  pointsName?: string;
  active?: number | null;
  onActive?: (index: number | null) => void;
  children: (box: ChartBox) => ReactNode;
  /** Notes and keys under the drawing. */
  below?: ReactNode;
};

/**
 * Measures the place of a chart and gives the keyboard a way through its points. The way is a range input, because that
 * brings arrows, Home, End and a spoken value in every browser and screen reader without keys of our own.
 */
export function ChartFrame({ heightPx, tips = [], pointsName = "points", active = null, ...rest }: ChartFrameProps) {
  const { onActive, children, below } = rest;
  const { ref, box } = useChartBox();
  const spoken = tips[active ?? 0];
  return (
    <div className={joinClasses("@container relative min-w-0", styles.chart)}>
      <div ref={ref} className={styles.drawing} style={{ minHeight: heightPx }} onPointerLeave={() => onActive?.(null)}>
        {box && children(box)}
      </div>
      {spoken && (
        <input
          type="range"
          className={joinClasses("pointer-events-none absolute top-0 left-0 m-0 size-px opacity-0", styles.stepper)}
          min={1}
          max={tips.length}
          step={1}
          value={(active ?? 0) + 1}
          aria-label={`Go through the ${pointsName} of this figure`}
          aria-valuetext={speakTip(spoken)}
          onFocus={() => onActive?.(active ?? 0)}
          onChange={(event) => onActive?.(event.target.valueAsNumber - 1)}
          onBlur={() => onActive?.(null)}
        />
      )}
      {below}
    </div>
  );
}
