"use client";

import { useState } from "react";
import { ConfusionTable } from "@/components/charts/confusion-table";
import { ErrorTally } from "@/components/charts/error-tally";
import { Field } from "@/components/ui/field";
import { Figure } from "@/components/ui/figure";
import { Select } from "@/components/ui/select";
import { Sheet } from "@/components/ui/sheet";
import { DEGREES_MEASURES, type DegreesMeasure } from "@/lib/results/degrees-figures";
import type { RoundResults } from "@/lib/results/schema";
import { DegreesPlot } from "./degrees-plot";
import { errorRows } from "./error-rows";

const EVERYBODY = "everybody";

/** Degrees, confusion and error kinds of one examiner, or of everybody together. */
export function DetailSection({ results }: { results: RoundResults }) {
  const [chosen, setChosen] = useState(EVERYBODY);
  const [component, setComponent] = useState<DegreesMeasure>("size");
  const examiner = results.examiners.find(({ personId }) => personId === chosen);
  const shown = examiner ? [examiner] : results.examiners;
  const confusion = examiner?.figures.confusion ?? results.panel.confusion;
  const readings = shown.reduce((sum, { figures }) => sum + figures.readCount, 0);
  const whose = examiner ? examiner.name : "everybody";
  return (
    <section className="grid gap-7">
      <div className="flex flex-wrap items-end gap-4">
        <Field label="Readings of">
          {(wiring) => (
            <Select
              {...wiring}
              className="w-72 max-w-full"
              value={chosen}
              onChange={(event) => setChosen(event.target.value)}
              options={[
                { value: EVERYBODY, label: "Everybody together" },
                ...results.examiners.map(({ personId, name }) => ({ value: personId, label: name })),
              ]}
            />
          )}
        </Field>
        <Field label="Degrees">
          {(wiring) => (
            <Select
              {...wiring}
              value={component}
              onChange={(event) => setComponent(DEGREES_MEASURES.find((each) => each === event.target.value) ?? "size")}
              options={[
                { value: "size", label: "Size, where the direction agrees" },
                { value: "horizontal", label: "Horizontal (eso +)" },
                { value: "vertical", label: "Vertical (right over left +)" },
              ]}
            />
          )}
        </Field>
      </div>
      <DegreesPlot
        label="Fig. 2"
        whose={whose}
        component={component}
        figures={shown.map(({ figures }) => figures)}
        limits={examiner ? examiner.figures[component].limits : results.panel[component]}
      />
      <div className="grid items-start gap-11 lg:grid-cols-2">
        <Figure
          label="Table 2"
          caption={`What was read, for each reference: ${whose}, ${readings} readings. Framed: agreement.`}
        >
          <ConfusionTable {...confusion} rowTitle="Reference" columnTitle="read as" />
        </Figure>
        <div>
          <p className="mb-3.5 max-w-read font-serif leading-[1.35]">
            <b>Table 3</b> Kinds of error: {whose}. One stroke is one reading; a reading counts under the first kind
            that fits.
          </p>
          <Sheet>
            <ErrorTally rows={errorRows(shown.map(({ figures }) => figures.errorCounts))} total={readings} />
          </Sheet>
        </div>
      </div>
    </section>
  );
}
