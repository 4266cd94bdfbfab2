"use client";

import { ControlChart } from "@/components/charts/control-chart";
import { joinClasses } from "@/components/ui/join-classes";
import { Tag } from "@/components/ui/tag";
import type { DriftBoard, DriftChart, DriftMeasure } from "@/lib/drift/schema";
import { formatNumber, formatSigned } from "@/lib/format/numbers";
import { chartPoints } from "./chart-points";
import { measureOf } from "./measures";
import { latestState, STATE_ORDER } from "./standfirst-text";

type ExaminerMultiplesProps = {
  board: DriftBoard;
  measure: DriftMeasure;
  chosen: string;
  onChoose: (personId: string) => void;
};

/** The same chart small for every examiner on one scale; those beyond a limit come first. */
export function ExaminerMultiples({ board, measure, chosen, onChoose }: ExaminerMultiplesProps) {
  const ordered = [...board.examiners].sort(
    (a, b) => STATE_ORDER.indexOf(latestState(a[measure])) - STATE_ORDER.indexOf(latestState(b[measure])),
  );
  const { valueLabel, format } = measureOf(measure);
  const span = commonSpan(board, measure);
  return (
    <section aria-labelledby="multiples">
      <p id="multiples" className="mb-3.5 max-w-read font-serif leading-[1.35]">
        <b>Fig. 2</b> The same for every examiner{span && `, on one scale (${spanText(span, format)})`}. Those beyond a
        limit in their latest round come first. Choose one to see it large.
      </p>
      <ul className="grid grid-cols-1 border-t border-l border-hair sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
        {ordered.map((row) => (
          <li key={row.personId} className="border-r border-b border-hair">
            <button
              type="button"
              aria-pressed={chosen === row.personId}
              onClick={() => {
                onChoose(row.personId);
                window.scrollTo({ top: 0 });
              }}
              className={joinClasses(
                "block w-full px-4 py-3.5 text-left hover:bg-sunk",
                chosen === row.personId ? "bg-brass-wash" : "bg-sheet",
              )}
            >
              <span className="flex items-baseline justify-between gap-3">
                <span className="font-semibold">{row.name}</span>
                <LatestFigure chart={row[measure]} format={format} />
              </span>
              <span className="mt-1 flex min-h-6 items-center gap-2">
                {row.assignedAs === "trainee" && <span className="text-note text-ink-2">trainee</span>}
                <StateTag chart={row[measure]} />
              </span>
              <ControlChart
                isSmall
                points={chartPoints(row[measure], board.rounds)}
                centre={row[measure].centre}
                valueLabel={`${row.name}: ${valueLabel}`}
                format={format}
                valueSpan={span}
              />
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** The span of all values and limits; undefined while no examiner has a figure. */
function commonSpan(board: DriftBoard, measure: DriftMeasure): [low: number, high: number] | undefined {
  const ends = board.examiners
    .flatMap((row) => row[measure].points)
    .flatMap(({ value, lowerAction, upperAction }) => [value?.estimate, lowerAction, upperAction])
    .filter((end) => end !== undefined);
  if (ends.length === 0) return undefined;
  const [low, high] = [Math.min(...ends), Math.max(...ends)];
  const margin = (high - low || 1) * 0.06; // so that no mark is cut at the edge
  return [low - margin, high + margin];
}

function spanText(span: [number, number], format: "kappa" | "degrees"): string {
  return span.map((end) => (format === "kappa" ? formatNumber(end, 2) : `${formatSigned(end)}°`)).join(" to ");
}

function LatestFigure({ chart, format }: { chart: DriftChart; format: "kappa" | "degrees" }) {
  const estimate = chart.points.findLast(({ value }) => value)?.value?.estimate;
  if (estimate === undefined) return <span className="text-small text-ink-2">no figure</span>;
  return (
    <span className="font-mono">{format === "kappa" ? formatNumber(estimate, 2) : `${formatSigned(estimate)}°`}</span>
  );
}

function StateTag({ chart }: { chart: DriftChart }) {
  const state = latestState(chart);
  if (state === "action") return <Tag tone="bad">beyond action</Tag>;
  return state === "warning" ? <Tag tone="warn">beyond warning</Tag> : null;
}
