"use client";

import { useRouter } from "next/navigation";
import { useEffect } from "react";
import { ButtonLink } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import type { RoundDetail, RoundProgress } from "@/lib/rounds/schema";
import { ProgressTable } from "./progress-table";
import { SealPanel } from "./seal-panel";
import { useRoundProgress } from "./use-round-progress";

type RoundMonitorProps = { round: RoundDetail; initial: RoundProgress; zone: string };

/** An open round as the lead follows it: who has read how many, never what. */
export function RoundMonitor({ round, initial, zone }: RoundMonitorProps) {
  const router = useRouter();
  const { data: progress = initial, error, mutate } = useRoundProgress(round.id, initial);
  const isClosed = progress.state === "closed" || progress.state === "released";
  useEffect(() => {
    if (isClosed && progress.hasResults) router.replace(`/rounds/${round.id}/results`);
  }, [isClosed, progress.hasResults, round.id, router]);

  return (
    <>
      {error && (
        <Notice tone="warn" title="This list may be out of date." className="mb-5">
          {error.message}
        </Notice>
      )}
      {isClosed && (
        <Notice
          tone="info"
          title="The round has closed. The results are being computed."
          className="mb-5"
          action={
            <ButtonLink size="slim" href={`/rounds/${round.id}/results`}>
              Results
            </ButtonLink>
          }
        />
      )}
      <div className="grid items-start gap-11 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <ProgressTable progress={progress} zone={zone} />
        {!isClosed && <SealPanel round={round} progress={progress} onClosed={() => mutate()} />}
      </div>
    </>
  );
}
