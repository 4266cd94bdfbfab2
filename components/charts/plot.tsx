"use client";

import type { ReactNode } from "react";
import { ComposedChart, usePlotArea, useXAxisScale, useYAxisScale, XAxis, YAxis, ZIndexLayer } from "recharts";

export type PlotMargin = { top: number; right: number; bottom: number; left: number };
/** Data units to px, and the plot's edges in px. */
export type PlotScale = {
  x: (value: number) => number;
  y: (value: number) => number;
  left: number;
  right: number;
  top: number;
  bottom: number;
};

type PlotProps = {
  width: number;
  height: number;
  margin: PlotMargin;
  xDomain: [number, number];
  yDomain: [number, number];
  isYReversed?: boolean;
  /** Points of a line through the plot; marks that carry their own points need none. A missing y is a gap. */
  data?: { x: number | undefined; y: number | undefined }[];
  /** What the figure shows, in a sentence: the text alternative of the drawing. */
  label: string;
  children: ReactNode;
};

/** Two numeric axes without a drawing of their own; layers and marks are its children. */
export function Plot({
  width,
  height,
  margin,
  xDomain,
  yDomain,
  isYReversed = false,
  data,
  label,
  children,
}: PlotProps) {
  return (
    <ComposedChart
      width={width}
      height={height}
      data={data}
      margin={margin}
      accessibilityLayer={false}
      role="img"
      aria-label={label}
    >
      <XAxis type="number" dataKey="x" domain={xDomain} allowDataOverflow hide />
      <YAxis type="number" dataKey="y" domain={yDomain} allowDataOverflow reversed={isYReversed} hide />
      {children}
    </ComposedChart>
  );
}

/** Order of painting: grounds under lines, lines under points (600, the library's own), texts over all. */
const LAYERS = { ground: 0, line: 400, text: 1500, tip: 3000 } as const;

/** A part of the drawing that needs the scales. Nothing is drawn until the plot knows them. */
export function PlotLayer({
  level,
  children,
}: {
  level: keyof typeof LAYERS;
  children: (scale: PlotScale) => ReactNode;
}) {
  const area = usePlotArea();
  const [toX, toY] = [useXAxisScale(), useYAxisScale()];
  if (!area || !toX || !toY) return null;
  const scale: PlotScale = {
    x: (value) => toX(value) ?? area.x,
    y: (value) => toY(value) ?? area.y,
    left: area.x,
    right: area.x + area.width,
    top: area.y,
    bottom: area.y + area.height,
  };
  return <ZIndexLayer zIndex={LAYERS[level]}>{children(scale)}</ZIndexLayer>;
}
