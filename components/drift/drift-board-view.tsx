"use client";

import { useState } from "react";
import useSWR from "swr";
import { PageHead } from "@/components/shell/page";
import { EmptyState } from "@/components/ui/empty-state";
import { FilterChip, FilterChips } from "@/components/ui/filter-chips";
import { Standfirst } from "@/components/ui/standfirst";
import { type DriftBoard, DriftBoardSchema, type DriftMeasure } from "@/lib/drift/schema";
import { fetchJson, type ProblemError } from "@/lib/http/fetch-json";
import { DriftFigure } from "./drift-figure";
import { ExaminerMultiples } from "./examiner-multiples";
import { MEASURES } from "./measures";
import { RoundLinks } from "./round-links";
import { driftStandfirst } from "./standfirst-text";

const PANEL = "panel";

/** The panel and every examiner over the rounds, one measure at a time. */
export function DriftBoardView({ initial }: { initial: DriftBoard }) {
  const { data: board = initial } = useSWR<DriftBoard, ProblemError>(
    "/api/drift",
    (url: string) => fetchJson(url, DriftBoardSchema),
    { fallbackData: initial, revalidateOnMount: false },
  );
  const [measure, setMeasure] = useState<DriftMeasure>("kappa");
  const [chosen, setChosen] = useState(PANEL);
  if (board.rounds.length === 0) {
    return (
      <>
        <PageHead title="Drift board" isTitle />
        <EmptyState title="No round is released yet">
          The first charts appear when a round is released. From the third round on a trend can be seen.
        </EmptyState>
      </>
    );
  }
  const examiner = board.examiners.find(({ personId }) => personId === chosen);
  return (
    <div className="grid gap-8">
      <div>
        <PageHead
          title="Drift board"
          isTitle
          actions={
            <FilterChips label="Measure">
              {MEASURES.map(({ measure: each, label }) => (
                <FilterChip key={each} label={label} isOn={measure === each} onToggle={() => setMeasure(each)} />
              ))}
            </FilterChips>
          }
        />
        <Standfirst>{driftStandfirst(board, measure)}</Standfirst>
      </div>
      <DriftFigure
        label="Fig. 1"
        who={examiner?.name ?? "The panel as a whole"}
        rounds={board.rounds}
        row={examiner ?? board.panel}
        measure={measure}
        onShowPanel={examiner ? () => setChosen(PANEL) : undefined}
      />
      <ExaminerMultiples board={board} measure={measure} chosen={chosen} onChoose={setChosen} />
      <RoundLinks rounds={board.rounds} />
    </div>
  );
}
