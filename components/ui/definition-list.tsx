import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

export type Definition = { term: string; detail: ReactNode };

/** Facts by name, one a line: the term left, the fact beside it. */
export function DefinitionList({ items, className }: { items: readonly Definition[]; className?: string }) {
  return (
    <dl className={joinClasses("grid gap-x-6 text-table sm:grid-cols-[max-content_minmax(0,1fr)]", className)}>
      {items.map(({ term, detail }) => (
        <div key={term} className="border-b border-hair py-2 sm:col-span-2 sm:grid sm:grid-cols-subgrid">
          <dt className="text-ink-2">{term}</dt>
          <dd className="font-medium">{detail}</dd>
        </div>
      ))}
    </dl>
  );
}

/** A few facts in one row between hairlines, under a standfirst. Not tiles: they orient, they do not boast. */
export function FactRow({ items, className }: { items: readonly Definition[]; className?: string }) {
  return (
    <dl
      className={joinClasses(
        "flex flex-wrap justify-between gap-x-8 gap-y-3 border-y border-hair py-3.5 text-small text-ink-2",
        className,
      )}
    >
      {items.map(({ term, detail }) => (
        <div key={term} className="flex flex-col-reverse">
          <dt>{term}</dt>
          <dd className="font-serif text-h2 font-medium text-ink">{detail}</dd>
        </div>
      ))}
    </dl>
  );
}
