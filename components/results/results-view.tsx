"use client";

import { ReleasePanel } from "@/components/rounds/release-panel";
import { FactRow } from "@/components/ui/definition-list";
import { Notice } from "@/components/ui/notice";
import { Skeleton, SkeletonBlock, SkeletonLine } from "@/components/ui/skeleton";
import { Standfirst } from "@/components/ui/standfirst";
import type { RoundResults } from "@/lib/results/schema";
import { AgreementSection } from "./agreement-section";
import { CaseTable } from "./case-table";
import { DetailSection } from "./detail-section";
import { MethodNotes } from "./method-notes";
import { resultsStandfirst } from "./standfirst-text";
import { useRoundResults } from "./use-round-results";

type ResultsViewProps = { roundId: string; initial: RoundResults | null; canRelease: boolean };

/** The results of a closed round: sentences first, then figures and tables as in a journal. */
export function ResultsView({ roundId, initial, canRelease }: ResultsViewProps) {
  const { data, error } = useRoundResults(roundId, initial);
  const results = data?.results;
  if (!results) {
    return (
      <>
        {error && (
          <Notice tone="warn" title="The results cannot be fetched now.">
            {error.message}
          </Notice>
        )}
        <Skeleton
          label="The results are being computed"
          slow="The results are still being computed. The readings are safe."
        >
          <SkeletonLine className="w-2/3" />
          <SkeletonLine className="w-1/2" />
          <SkeletonBlock className="mt-6 h-80" />
        </Skeleton>
      </>
    );
  }
  const readings = results.examiners.reduce((sum, { figures }) => sum + figures.readCount, 0);
  return (
    <div className="grid gap-9">
      {canRelease && results.round.state === "closed" && <ReleasePanel results={results} />}
      <Standfirst isRuled>{resultsStandfirst(results)}</Standfirst>
      <FactRow
        items={[
          { term: "cases", detail: results.cases.filter(({ kind }) => kind === "first").length },
          { term: "hidden repeats", detail: results.cases.filter(({ kind }) => kind !== "first").length },
          { term: "examiners", detail: results.examiners.length },
          { term: "readings against the reference", detail: readings },
          { term: "revision of the results", detail: results.revision },
        ]}
      />
      <AgreementSection results={results} />
      <DetailSection results={results} />
      <CaseTable cases={results.cases} canOpen={canRelease} />
      <MethodNotes results={results} />
    </div>
  );
}
