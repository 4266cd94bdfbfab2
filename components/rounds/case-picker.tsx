"use client";

import { useState } from "react";
import { FilterChip, FilterChips } from "@/components/ui/filter-chips";
import { joinClasses } from "@/components/ui/join-classes";
import { PhotographThumb } from "@/components/ui/photograph-thumb";
import { CASE_KIND_NAMES, caseKind, caseLabel } from "@/lib/cases/case-kind";
import { CASE_KINDS, type CaseKind, type CaseSummary } from "@/lib/cases/schema";

type CasePickerProps = { cases: CaseSummary[]; chosen: string[]; onToggle: (caseId: string) => void };

/** The library as a grid of photographs; each is a checkbox. */
export function CasePicker({ cases, chosen, onToggle }: CasePickerProps) {
  const [kind, setKind] = useState<CaseKind | null>(null);
  const [onlyAnchors, setOnlyAnchors] = useState(false);
  const shown = cases.filter(
    (each) => (kind === null || caseKind(each.finding) === kind) && (!onlyAnchors || each.isAnchor),
  );
  return (
    <section aria-labelledby="case-picker">
      <div className="mb-3.5 flex items-baseline justify-between gap-4">
        <h2 id="case-picker" className="text-h2">
          Case library
        </h2>
        <p className="text-small text-ink-2">
          {shown.length} of {cases.length} shown, {chosen.length} chosen
        </p>
      </div>
      <FilterChips label="Show only" className="mb-4">
        <FilterChip label="Anchors" isOn={onlyAnchors} onToggle={() => setOnlyAnchors(!onlyAnchors)} />
        {CASE_KINDS.map((each) => (
          <FilterChip
            key={each}
            label={CASE_KIND_NAMES[each]}
            isOn={kind === each}
            onToggle={() => setKind(kind === each ? null : each)}
          />
        ))}
      </FilterChips>
      <ul className="grid grid-cols-2 gap-3 xl:grid-cols-3">
        {shown.map((each) => (
          <CaseCard key={each.id} each={each} isChosen={chosen.includes(each.id)} onToggle={() => onToggle(each.id)} />
        ))}
      </ul>
    </section>
  );
}

type CaseCardProps = { each: CaseSummary; isChosen: boolean; onToggle: () => void };

function CaseCard({ each, isChosen, onToggle }: CaseCardProps) {
  return (
    <li>
      <label
        className={joinClasses(
          "block h-full cursor-pointer border bg-sheet has-focus-visible:outline-3 has-focus-visible:outline-offset-2 has-focus-visible:outline-cobalt",
          isChosen ? "border-ink shadow-[inset_0_0_0_1px_var(--ink)]" : "border-hair hover:border-edge",
        )}
      >
        <input type="checkbox" checked={isChosen} onChange={onToggle} className="sr-only" />
        <PhotographThumb src={`${each.photographHref}?size=small`} width={640} height={280} alt="" />
        <span className="flex flex-wrap items-center gap-x-2.5 px-3 py-2 text-small">
          <span
            aria-hidden="true"
            className={joinClasses(
              "grid size-4.5 shrink-0 place-items-center rounded-full border",
              isChosen ? "lit border-lit-line" : "border-edge",
            )}
          >
            {isChosen && <span className="glint size-1.5 bg-lit-glint" />}
          </span>
          <b className="font-mono">{each.code}</b>
          <span className="font-mono">{caseLabel(each.finding)}</span>
          <span className="ml-auto text-ink-2">
            {each.isAnchor ? "anchor" : each.lastRoundNumber ? `round ${each.lastRoundNumber}` : "new"}
          </span>
        </span>
      </label>
    </li>
  );
}
