"use client";

import { LockKeyhole } from "lucide-react";
import { useState } from "react";
import { Button } from "@/components/ui/button";
import { ConfirmDialog } from "@/components/ui/confirm-dialog";
import { Icon } from "@/components/ui/icon";
import { Sheet } from "@/components/ui/sheet";
import type { RoundDetail, RoundProgress } from "@/lib/rounds/schema";
import { useAdvanceRound } from "./use-advance-round";

type SealPanelProps = { round: RoundDetail; progress: RoundProgress; onClosed: () => void };

/** What is sealed and until when, and the step that opens it. */
export function SealPanel({ round, progress, onClosed }: SealPanelProps) {
  const [isAsking, setIsAsking] = useState(false);
  const { isBusy, problem, advance } = useAdvanceRound(round.id);
  const readings = progress.examiners.reduce((sum, { readCount }) => sum + readCount, 0);
  const possible = progress.itemCount * progress.examiners.length;
  const unfinished = progress.examiners.filter(({ submittedAt }) => !submittedAt).length;

  async function close() {
    if (!(await advance("closed"))) return;
    setIsAsking(false);
    onClosed();
  }

  return (
    <Sheet as="aside" isMarked>
      <h2 className="flex items-center gap-3 text-h2">
        <Icon icon={LockKeyhole} className="size-6" /> Results are sealed
      </h2>
      <p className="mt-3 text-ink-2">
        You can see who has read, never what. Readings and agreement open to you when the round closes, and to the
        examiners when you release it.
      </p>
      <Button kind="main" className="mt-4 w-full" onClick={() => setIsAsking(true)}>
        Close the round…
      </Button>
      {unfinished > 0 && (
        <p className="mt-3 text-small text-ink-2">
          {unfinished === 1 ? "One examiner has" : `${unfinished} examiners have`} not handed in. Closing now leaves{" "}
          {possible - readings} readings out.
        </p>
      )}
      <ConfirmDialog
        isOpen={isAsking}
        title={`Close round ${round.number}?`}
        consequences={[
          `${readings} of ${possible} readings will count.`,
          `${unfinished} of ${progress.examiners.length} examiners have not handed in; nobody can read any more.`,
        ]}
        typed={{ label: "Type the number of the round", word: String(round.number) }}
        keepLabel="Keep it open"
        actLabel="Close the round"
        onKeep={() => setIsAsking(false)}
        onAct={close}
        isBusy={isBusy}
        error={problem && { title: "The round was not closed.", detail: problem.detail }}
      >
        This cannot be taken back.
      </ConfirmDialog>
    </Sheet>
  );
}
