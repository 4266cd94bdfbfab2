"use client";

import { ControlChart } from "@/components/charts/control-chart";
import { ControlChartTable } from "@/components/charts/control-chart-table";
import { Button } from "@/components/ui/button";
import { Figure } from "@/components/ui/figure";
import type { DriftBoard, DriftMeasure, DriftRow } from "@/lib/drift/schema";
import { chartPoints } from "./chart-points";
import { LimitsOverRounds } from "./limits-over-rounds";
import { measureOf } from "./measures";

type DriftFigureProps = {
  label: string;
  who: string;
  rounds: DriftBoard["rounds"];
  row: DriftRow;
  measure: DriftMeasure;
  onShowPanel?: () => void;
};

/** One control chart at full size, with its numbers and, for a bias, the limits of agreement of each round. */
export function DriftFigure({ label, who, rounds, row, measure, onShowPanel }: DriftFigureProps) {
  const { valueLabel, format, limits } = measureOf(measure);
  const chart = row[measure];
  const points = chartPoints(chart, rounds);
  return (
    <Figure
      label={label}
      caption={`${who}: ${valueLabel}, round by round. ${limits} Triangle: beyond warning; diamond: beyond action.`}
      table={<ControlChartTable points={points} valueLabel={valueLabel} format={format} />}
    >
      {onShowPanel && (
        <div className="mb-3">
          <Button size="slim" onClick={onShowPanel}>
            Show the panel
          </Button>
        </div>
      )}
      <ControlChart points={points} centre={chart.centre} valueLabel={valueLabel} format={format} />
      {measure !== "kappa" && <LimitsOverRounds chart={chart} rounds={rounds} />}
    </Figure>
  );
}
