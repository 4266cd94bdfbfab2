"use client";

import { useRouter } from "next/navigation";
import { useState } from "react";
import { PageHead } from "@/components/shell/page";
import { Button } from "@/components/ui/button";
import { Crumb } from "@/components/ui/crumb";
import { formatTime } from "@/components/ui/format-time";
import { Notice } from "@/components/ui/notice";
import { Sheet } from "@/components/ui/sheet";
import type { CaseSummary } from "@/lib/cases/schema";
import { asProblemError, type ProblemError, sendJson } from "@/lib/http/fetch-json";
import type { PersonSummary } from "@/lib/people/schema";
import { toggleCase } from "@/lib/rounds/compose-items";
import { type RoundDetail, RoundDetailSchema } from "@/lib/rounds/schema";
import { BalanceTable } from "./balance-table";
import { CasePicker } from "./case-picker";
import { ExaminerPicker } from "./examiner-picker";
import { RoundFields } from "./round-fields";
import { type DraftState, useDraft } from "./use-draft";

type ComposerProps = { round: RoundDetail; cases: CaseSummary[]; people: PersonSummary[]; zone: string };

/** The case library on the left, the round on the right. Everything is stored as one goes. */
export function Composer({ round, cases, people, zone }: ComposerProps) {
  const router = useRouter();
  const { draft, change, state, saveNow } = useDraft(round);
  const [isPublishing, setIsPublishing] = useState(false);
  const [refusal, setRefusal] = useState<ProblemError | null>(null);
  const failure = state.kind === "failed" ? state.error : refusal;
  const chosen = draft.items.filter(({ kind }) => kind === "first").map(({ caseId }) => caseId);

  async function publish() {
    setIsPublishing(true);
    setRefusal(null);
    try {
      if (!(await saveNow())) return;
      await sendJson("PUT", `/api/rounds/${round.id}/state`, { to: "open" }, RoundDetailSchema);
      router.push(`/rounds/${round.id}`);
      router.refresh();
    } catch (error) {
      setRefusal(asProblemError(error));
    } finally {
      setIsPublishing(false);
    }
  }

  return (
    <>
      <PageHead
        crumb={<Crumb steps={[{ label: "Rounds", href: "/rounds" }, { label: `Round ${round.number}` }]} />}
        title="Compose a round"
        actions={
          <>
            <SavedNote state={state} zone={zone} />
            <Button kind="main" onClick={publish} isBusy={isPublishing}>
              Publish round {round.number}
            </Button>
          </>
        }
      />
      {failure && (
        <Notice tone="bad" title={failure.problem.detail ?? failure.problem.title} className="mb-5">
          {failure.problem.errors?.map(({ detail }) => detail).join(" ")} Nothing you entered is lost.
        </Notice>
      )}
      <div className="grid items-start gap-11 lg:grid-cols-[minmax(0,1.15fr)_minmax(0,1fr)]">
        <CasePicker
          cases={cases}
          chosen={chosen}
          onToggle={(caseId) => change({ items: toggleCase(draft.items, caseId) })}
        />
        <Sheet
          as="section"
          className="grid gap-6 max-lg:order-first lg:sticky lg:top-4 lg:max-h-[calc(100dvh-2rem)] lg:overflow-y-auto"
        >
          <RoundFields draft={draft} zone={zone} onChange={change} errorOf={(field) => failure?.fieldError(field)} />
          <BalanceTable cases={cases.filter(({ id }) => chosen.includes(id))} items={draft.items} />
          <ExaminerPicker
            people={people}
            chosen={draft.examinerIds}
            onChange={(examinerIds) => change({ examinerIds })}
            error={failure?.fieldError("examinerIds")}
          />
        </Sheet>
      </div>
    </>
  );
}

function SavedNote({ state, zone }: { state: DraftState; zone: string }) {
  return (
    <p role="status" className="mr-2 text-small text-ink-2">
      {state.kind === "saving" && "Saving the draft…"}
      {state.kind === "saved" && `Draft saved ${formatTime(state.at, zone, "clock")}`}
      {state.kind === "failed" && "The draft is not saved"}
    </p>
  );
}
