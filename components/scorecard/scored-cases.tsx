"use client";

import { useState } from "react";
import { FilterChip, FilterChips } from "@/components/ui/filter-chips";
import type { Scorecard } from "@/lib/results/schema";
import { ScoredCase } from "./scored-case";

type Case = Scorecard["cases"][number];
type Shown = "differs" | "agrees" | "all";

const FITS: Record<Shown, (each: Case) => boolean> = {
  differs: (each) => each.isSealed || each.error !== null || each.reading === null,
  agrees: (each) => !each.isSealed && each.error === null && each.reading !== null,
  all: () => true,
};

/** Case by case: what differed first. */
export function ScoredCases({ cases }: { cases: Case[] }) {
  const [shown, setShown] = useState<Shown>("differs");
  const count = (which: Shown) => cases.filter(FITS[which]).length;
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
        {cases.filter(FITS[shown]).map((each) => (
          <ScoredCase key={each.id} each={each} />
        ))}
      </ul>
      {count(shown) === 0 && <p className="text-ink-2">None in this round.</p>}
    </section>
  );
}
