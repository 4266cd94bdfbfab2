"use client";

import { type ReactNode, useState } from "react";
import { Button } from "@/components/ui/button";
import { FilterChip, FilterChips } from "@/components/ui/filter-chips";
import { Kbd } from "@/components/ui/kbd";
import { Notice } from "@/components/ui/notice";
import { Photograph } from "@/components/ui/photograph";
import { answer, completeDraft, EMPTY_DRAFT, fromFinding } from "@/lib/desk/draft-finding";
import type { DeskItem, ReadingInput } from "@/lib/desk/schema";
import type { Confidence } from "@/lib/findings/schema";
import { UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { FindingQuestions } from "./finding-questions";
import { Readback } from "./readback";
import { UnreadableQuestion } from "./unreadable-question";
import { useDeskKeys } from "./use-desk-keys";
import type { SaveState } from "./use-save-reading";

const CONFIDENCES: { value: Confidence; label: string }[] = [
  { value: "sure", label: "Sure" },
  { value: "fairly-sure", label: "Fairly sure" },
  { value: "unsure", label: "Unsure" },
];

type DeskCaseProps = {
  item: DeskItem;
  itemCount: number;
  instructions: string;
  saveState: SaveState;
  onSave: (reading: Omit<ReadingInput, "saveId" | "revision">) => void;
  onStep: (by: 1 | -1) => void;
  pager: ReactNode;
};

/** One case: its photograph, the questions, and the reading in words. It is made anew for each case. */
export function DeskCase({ item, itemCount, instructions, saveState, onSave, onStep, pager }: DeskCaseProps) {
  const [draft, setDraft] = useState(item.reading ? fromFinding(item.reading.finding) : EMPTY_DRAFT);
  const [confidence, setConfidence] = useState<Confidence | null>(item.reading?.confidence ?? null);
  const [openedAt] = useState(() => performance.now());
  const complete = completeDraft(draft);
  const isSaving = saveState.kind === "saving";

  function give(given: Parameters<typeof answer>[1]) {
    setDraft((before) => answer(before, given));
  }

  function save() {
    if (!("finding" in complete) || isSaving) return;
    const seconds = (item.reading?.seconds ?? 0) + (performance.now() - openedAt) / 1000;
    onSave({ finding: complete.finding, confidence, seconds: Math.min(100_000, Math.round(seconds * 10) / 10) });
  }

  const hasOnlyVertical = draft.isReadable && draft.horizontal === "none" && draft.vertical !== "none";
  useDeskKeys({
    onAnswer: give,
    onSave: save,
    onStep,
    onReason: draft.isReadable
      ? null
      : (position) => {
          const value = UNREADABLE_REASONS[position - 1];
          if (value) give({ question: "reason", value });
        },
    digitsSet: hasOnlyVertical ? "verticalDegrees" : "horizontalDegrees",
  });

  return (
    <main id="main" tabIndex={-1} className="flex grow flex-col outline-none">
      <Photograph
        src={item.pictureHref}
        width={item.width}
        height={item.height}
        alt={`Case ${item.place} of ${itemCount}, photograph of both eyes, reading exercise`}
        className="max-h-[46dvh] w-auto"
      />
      {saveState.kind === "failed" && (
        <Notice
          tone={saveState.problem.status === 0 ? "warn" : "bad"}
          title="This reading is not saved."
          className="border-x-0"
        >
          {saveState.problem.detail} What you entered stays on this screen.
        </Notice>
      )}
      <div className="grid gap-x-6 gap-y-6 px-margin py-5 lg:grid-cols-2 xl:grid-cols-[1fr_1fr_0.7fr_1.6fr_1.15fr] xl:divide-x xl:divide-hair xl:gap-x-0 xl:[&>*]:px-5 xl:[&>*:first-child]:pl-0 xl:[&>*:last-child]:pr-0">
        {draft.isReadable ? (
          <FindingQuestions draft={draft} onAnswer={give} isDesk />
        ) : (
          <div className="xl:col-span-4">
            <UnreadableQuestion reason={draft.reason} onAnswer={give} showsKeys />
          </div>
        )}
        <div className="flex flex-col gap-3 max-xl:sticky max-xl:bottom-0 max-xl:-mx-(--page-margin) max-xl:border-t max-xl:border-edge max-xl:bg-paper max-xl:px-margin max-xl:py-3 lg:max-xl:col-span-2">
          <Readback draft={draft} />
          <FilterChips label="How sure?" className="max-xl:hidden">
            {CONFIDENCES.map(({ value, label }) => (
              <FilterChip
                key={value}
                label={label}
                isOn={confidence === value}
                onToggle={() => setConfidence(confidence === value ? null : value)}
              />
            ))}
          </FilterChips>
          <div className="mt-auto flex gap-2 xl:flex-col">
            {draft.isReadable && (
              <Button size="desk" aria-keyshortcuts="Q" onClick={() => give({ question: "readable", value: false })}>
                Not readable
              </Button>
            )}
            <Button
              kind="main"
              size="desk"
              disabled={!("finding" in complete)}
              isBusy={isSaving}
              onClick={save}
              className="grow"
            >
              Save, next case <Kbd className="max-lg:hidden">Enter</Kbd>
            </Button>
          </div>
        </div>
      </div>
      <div className="mt-auto flex flex-wrap items-center justify-between gap-3 border-t border-hair px-margin py-3 text-small text-ink-2">
        {pager}
        <p>{instructions || "A saved reading can be changed until you hand in the round."}</p>
      </div>
    </main>
  );
}
