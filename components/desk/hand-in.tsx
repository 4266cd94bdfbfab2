"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { ConfirmDialog } from "@/components/ui/confirm-dialog";
import { type DeskSheet, DeskSheetSchema } from "@/lib/desk/schema";
import { asProblemError, type Problem, sendJson } from "@/lib/http/fetch-json";

type HandInProps = { sheet: DeskSheet; onHandedIn: (sheet: DeskSheet) => void };

/** Hands in the round after one more question, because readings cannot be changed after. */
export function HandIn({ sheet, onHandedIn }: HandInProps) {
  const [isAsking, setIsAsking] = useState(false);
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<Problem | null>(null);

  async function handIn() {
    setIsBusy(true);
    try {
      onHandedIn(await sendJson("PUT", `/api/desk/rounds/${sheet.id}/submission`, {}, DeskSheetSchema));
      setIsAsking(false);
    } catch (error) {
      setProblem(asProblemError(error).problem);
    } finally {
      setIsBusy(false);
    }
  }

  return (
    <div>
      <Button kind="main" disabled={sheet.readCount < sheet.itemCount} onClick={() => setIsAsking(true)}>
        Hand in {sheet.itemCount} readings
      </Button>
      <ConfirmDialog
        isOpen={isAsking}
        title={`Hand in round ${sheet.number}?`}
        consequences={[
          `${sheet.readCount} readings count.`,
          "They can no longer be changed.",
          "References and scores open when the round is released.",
        ]}
        keepLabel="Go on reading"
        actLabel="Hand in"
        onKeep={() => setIsAsking(false)}
        onAct={handIn}
        isBusy={isBusy}
        error={problem && { title: "The round was not handed in.", detail: problem.detail }}
      >
        This cannot be taken back.
      </ConfirmDialog>
    </div>
  );
}
