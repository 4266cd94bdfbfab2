"use client";

import { type RefObject, useEffect, useLayoutEffect, useRef, useState } from "react";
import { flushSync } from "react-dom";

export type Face = "sans" | "mono" | "serif";
/** Width of a text in px as the chart will draw it. */
export type Measure = (text: string, sizePx: number, face?: Face, weight?: number) => number;
export type ChartBox = { width: number; measure: Measure };

/** Text column of an A4 page with our margins, in CSS px. Wider figures are redrawn for it, so that text keeps its size. */
const PAPER_WIDTH_PX = 680;

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
      // Once the page is laid out for paper the stylesheet fits the figure; redrawing then would race the printer.
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
    const narrowForPaper = () =>
      flushSync(() => setBox((before) => before && { ...before, width: Math.min(before.width, PAPER_WIDTH_PX) }));
    const widenAgain = () => {
      const width = Math.floor(ref.current?.clientWidth ?? 0);
      if (width > 0) setBox((before) => before && { ...before, width });
    };
    document.fonts.addEventListener("loadingdone", remeasure);
    window.addEventListener("beforeprint", narrowForPaper);
    window.addEventListener("afterprint", widenAgain);
    return () => {
      document.fonts.removeEventListener("loadingdone", remeasure);
      window.removeEventListener("beforeprint", narrowForPaper);
      window.removeEventListener("afterprint", widenAgain);
    };
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
