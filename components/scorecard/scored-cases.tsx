"use client";

import { useState } from "react";
import { FilterChip, FilterChips } from "@/components/ui/filter-chips";
import { Remark } from "@/components/ui/notice";
import type { Scorecard } from "@/lib/results/schema";
import { ScoredCase } from "./scored-case";

type Case = Scorecard["cases"][number];
type Shown = "differs" | "agrees" | "all";

const FITS: Record<Shown, (each: Case) => boolean> = {
  differs: (each) => each.error !== null || each.reading === null,
  agrees: (each) => each.error === null && each.reading !== null,
  all: () => true,
};

/** Case by case: what differed first. */
export function ScoredCases({ cases }: { cases: Case[] }) {
  const [shown, setShown] = useState<Shown>("differs");
  const open = cases.filter(({ isSealed }) => !isSealed);
  const sealed = cases.filter(({ isSealed }) => isSealed);
  const count = (which: Shown) => open.filter(FITS[which]).length;
  const chip = (which: Shown, label: string) => (
    <FilterChip label={label} count={count(which)} isOn={shown === which} onToggle={() => setShown(which)} />
  );
  return (
    <section aria-labelledby="case-by-case">
      <div className="mb-4 flex flex-wrap items-center gap-4">
        <h2 id="case-by-case" className="text-h2">
          Case by case
        </h2>
        <FilterChips label="Show">
          {chip("differs", "Differs")}
          {chip("agrees", "Agrees")}
          {chip("all", "All")}
        </FilterChips>
      </div>
      <ul>
        {open.filter(FITS[shown]).map((each) => (
          <ScoredCase key={each.id} each={each} />
        ))}
      </ul>
      {count(shown) === 0 && <p className="text-ink-2">None in this round.</p>}
      {sealed.length > 0 && (
        <Remark className="mt-5">
          <b>
            {sealed.length === 1 ? "One case is" : `${sealed.length} cases are`} shown again in a round that is sealed:
          </b>{" "}
          {sealed.map(({ place }) => `case ${place}`).join(", ")}. Photograph, reference and your reading come back here
          when that round is released.
        </Remark>
      )}
    </section>
  );
}
