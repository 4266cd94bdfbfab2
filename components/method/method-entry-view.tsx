import type { ReactNode } from "react";
import { Formula, Sign } from "./formula";
import type { MethodEntry } from "./method-entry";
import { WorkedExampleSheet } from "./worked-example-sheet";

/** One figure of the program, its formula on the left and its example beside it. */
export function MethodEntryView({ entry }: { entry: MethodEntry }) {
  const { id, title, answers, formulas = [], letters = [], source, limits, example } = entry;
  return (
    <section className="grid grid-cols-[minmax(0,1fr)] gap-x-11 gap-y-5 border-t border-edge pt-5 xl:grid-cols-[minmax(0,11fr)_minmax(0,9fr)]">
      <div className="min-w-0 max-w-read">
        <h3 id={id} tabIndex={-1}>
          {title}
        </h3>
        <dl className="mt-3.5 grid grid-cols-[minmax(0,1fr)] gap-3.5">
          <Fact term="What it answers">{answers}</Fact>
          {formulas.length > 0 && (
            <Fact term="Formula">
              {formulas.map((formula) => (
                <Formula key={formula.reading} formula={formula} />
              ))}
            </Fact>
          )}
          {letters.length > 0 && (
            <Fact term="What the letters mean">
              <ul className="grid gap-1">
                {letters.map(({ sign, meaning }) => (
                  <li key={meaning}>
                    <Sign sign={sign} /> {meaning}
                  </li>
                ))}
              </ul>
            </Fact>
          )}
          <Fact term="Limits of use">{limits}</Fact>
          <Fact term="Source">{source}</Fact>
        </dl>
      </div>
      <WorkedExampleSheet example={example} />
    </section>
  );
}

function Fact({ term, children }: { term: string; children: ReactNode }) {
  return (
    <div>
      <dt className="text-small font-medium text-ink-2">{term}</dt>
      <dd className="mt-0.5">{children}</dd>
    </div>
  );
}
