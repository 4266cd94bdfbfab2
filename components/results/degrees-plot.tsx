"use client";

import { BlandAltmanPlot } from "@/components/charts/bland-altman-plot";
import { BlandAltmanTable } from "@/components/charts/bland-altman-table";
import { Figure } from "@/components/ui/figure";
import type { DegreesMeasure } from "@/lib/results/degrees-figures";
import { type ExaminerFigures, READINGS_FEW } from "@/lib/results/schema";
import { leftOutLabels } from "./standfirst-text";

const MEASURE_WORDS: Record<DegreesMeasure, string> = {
  horizontal: "horizontal (eso positive, aligned 0)",
  vertical: "vertical (right over left positive, none 0)",
  size: "size of the larger part, where the direction agrees",
};

type DegreesPlotProps = {
  label: string;
  /** Whose readings: a name, "everybody" or "you". */
  whose: string;
  component: DegreesMeasure;
  figures: ExaminerFigures[];
  limits: ExaminerFigures["horizontal"]["limits"];
};

/** The Bland–Altman plot of signed degrees, reading minus reference, with what had to be left out. */
export function DegreesPlot({ label, whose, component, figures, limits }: DegreesPlotProps) {
  const points = figures.flatMap(({ items }, index) =>
    items.flatMap(({ itemId, [component]: pair }) =>
      pair
        ? [
            {
              id: `${index}-${itemId}`,
              mean: (pair.reading + pair.reference) / 2,
              difference: pair.reading - pair.reference,
            },
          ]
        : [],
    ),
  );
  const leftOut = leftOutLabels(
    figures.reduce(
      (sum, each) => ({
        unread: sum.unread + each[component].leftOut.unread,
        notReadable: sum.notReadable + each[component].leftOut.notReadable,
        beyondLimbus: sum.beyondLimbus + each[component].leftOut.beyondLimbus,
        otherDirection: sum.otherDirection + each[component].leftOut.otherDirection,
      }),
      { unread: 0, notReadable: 0, beyondLimbus: 0, otherDirection: 0 },
    ),
  );
  const shared = {
    points,
    leftOut,
    unit: "°",
    xLabel: "mean of reference and reading",
    yLabel: "reading minus reference, degrees",
    ...(limits.ok ? { bias: limits.bias, lower: limits.lower, upper: limits.upper } : { reason: limits.reason }),
  } as const;
  return (
    <Figure
      label={label}
      caption={`Degrees, reading against reference, ${MEASURE_WORDS[component]}: ${whose}, ${limits.n} pairs. Mean and limits of agreement with 95 % bands; the area of a dot counts readings.`}
      table={<BlandAltmanTable {...shared} />}
    >
      <BlandAltmanPlot {...shared} isTooFew={limits.n < READINGS_FEW} />
    </Figure>
  );
}
