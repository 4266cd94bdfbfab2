"use client";

import { KappaIntervals } from "@/components/charts/kappa-intervals";
import { KappaIntervalsTable } from "@/components/charts/kappa-intervals-table";
import { Figure } from "@/components/ui/figure";
import { READINGS_FEW, type RoundResults } from "@/lib/results/schema";
import { ExaminerTable } from "./examiner-table";
import { medianKappa } from "./standfirst-text";

/** Everybody side by side: kappa as a figure, the rest as a table. Sorted by name; ranking is left to the reader. */
export function AgreementSection({ results }: { results: RoundResults }) {
  const rows = results.examiners.map(({ personId, name, assignedAs, figures: { kappa } }) => ({
    id: personId,
    label: name,
    note: assignedAs === "trainee" ? "trainee" : undefined,
    n: kappa.n,
    isTooFew: kappa.ok && kappa.n < READINGS_FEW,
    ...(kappa.ok ? kappa.kappa : { reason: kappa.reason }),
  }));
  return (
    <section className="grid gap-9">
      <Figure
        label="Fig. 1"
        caption="Agreement with the reference on eye and direction, by examiner. Dot: Cohen’s kappa; bar: 95 % interval. Under the dashed floor a triangle."
        table={<KappaIntervalsTable rows={rows} floor={results.kappaFloor} />}
      >
        <KappaIntervals rows={rows} floor={results.kappaFloor} median={medianKappa(results)} />
      </Figure>
      <ExaminerTable results={results} />
    </section>
  );
}
