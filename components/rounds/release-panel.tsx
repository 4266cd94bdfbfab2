"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { useSWRConfig } from "swr";
import { Button } from "@/components/ui/button";
import { ConfirmDialog } from "@/components/ui/confirm-dialog";
import { Notice } from "@/components/ui/notice";
import type { RoundResults } from "@/lib/results/schema";
import { useAdvanceRound } from "./use-advance-round";

/** The step that opens scorecards to their owners. */
export function ReleasePanel({ results }: { results: RoundResults }) {
  const { round, examiners } = results;
  const router = useRouter();
  const { mutate } = useSWRConfig();
  const [isAsking, setIsAsking] = useState(false);
  const { isBusy, problem, advance } = useAdvanceRound(round.id);

  async function release() {
    if (!(await advance("released"))) return;
    setIsAsking(false);
    await mutate(`/api/rounds/${round.id}/results`);
    router.refresh();
  }

  return (
    <Notice
      tone="info"
      title="Closed, not released."
      action={
        <Button kind="main" onClick={() => setIsAsking(true)}>
          Release…
        </Button>
      }
    >
      You see these results; examiners see nothing yet.
      <ConfirmDialog
        isOpen={isAsking}
        title={`Release round ${round.number}?`}
        consequences={[
          `${examiners.length} people see their own scorecard: own readings, the references and the photographs.`,
          "Nobody sees another person’s name or reading.",
          "The reviewer sees these results and the drift board.",
        ]}
        typed={{ label: "Type the number of the round", word: String(round.number) }}
        keepLabel="Not yet"
        actLabel="Release"
        onKeep={() => setIsAsking(false)}
        onAct={release}
        isBusy={isBusy}
        error={problem && { title: "The round was not released.", detail: problem.detail }}
      >
        This cannot be taken back.
      </ConfirmDialog>
    </Notice>
  );
}
