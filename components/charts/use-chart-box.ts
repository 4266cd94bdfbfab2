"use client";

import { type RefObject, useEffect, useLayoutEffect, useRef, useState } from "react";

export type Face = "sans" | "mono" | "serif";
/** Width of a text in px as the chart will draw it. */
export type Measure = (text: string, sizePx: number, face?: Face, weight?: number) => number;
export type ChartBox = { width: number; measure: Measure };

/**
 * The width a chart has, followed as it changes, and a way to measure text in the page's own fonts. Charts are drawn at
 * their real width so that their text keeps its real size. `box` is null until the place is measured in the browser.
 */
export function useChartBox(): { ref: RefObject<HTMLDivElement | null>; box: ChartBox | null } {
  const ref = useRef<HTMLDivElement>(null);
  const [box, setBox] = useState<ChartBox | null>(null);
  useLayoutEffect(() => {
    const element = ref.current;
    if (!element) return;
    const update = () => {
      const width = Math.floor(element.clientWidth);
      // On paper the stylesheet fits the figure; redrawing then would race the printer.
      if (width > 0 && !window.matchMedia("print").matches) setBox({ width, measure: measureIn(element) });
    };
    update();
    const observer = new ResizeObserver(update);
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  useEffect(() => {
    // Labels measured before the fonts arrived are some px too wide or too narrow: measure once more.
    const remeasure = () => setBox((before) => before && { ...before });
    document.fonts.addEventListener("loadingdone", remeasure);
    return () => document.fonts.removeEventListener("loadingdone", remeasure);
  }, []);
  return { ref, box };
}

function measureIn(element: Element): Measure {
  const context = document.createElement("canvas").getContext("2d");
  const style = getComputedStyle(element);
  return (text, sizePx, face = "sans", weight = 400) => {
    if (!context) return text.length * sizePx * 0.6;
    context.font = `${weight} ${sizePx}px ${style.getPropertyValue(`--face-${face}`).trim() || "sans-serif"}`;
    return context.measureText(text).width;
  };
}
