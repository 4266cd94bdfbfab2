import type { MethodGroup } from "./method-entry";

/** The list of contents: at the left and always in view on wide screens, above the text and closed on narrow ones. */
export function Contents({ groups }: { groups: readonly MethodGroup[] }) {
  return (
    <>
      <nav
        aria-label="Contents"
        className="sticky top-0 hidden max-h-dvh overflow-y-auto py-1 pr-2 lg:block print:hidden"
      >
        <GroupList groups={groups} />
      </nav>
      <nav aria-label="Contents" className="lg:hidden print:hidden">
        <details className="border-y border-hair">
          <summary className="flex min-h-touch items-center text-cobalt underline underline-offset-3">Contents</summary>
          <div className="pb-4">
            <GroupList groups={groups} />
          </div>
        </details>
      </nav>
    </>
  );
}

function GroupList({ groups }: { groups: readonly MethodGroup[] }) {
  return (
    <ol className="grid gap-5 border-t-2 border-ink max-lg:border-t-0">
      {groups.map(({ id, title, entries }, index) => (
        <li key={id}>
          <a href={`#${id}`} className="block py-1.5 font-medium text-ink no-underline hover:underline max-lg:py-2.5">
            <i className="inline-block w-5 font-serif font-normal text-ink-2">{index + 1}</i> {title}
          </a>
          <ol>
            {entries.map((entry) => (
              <li key={entry.id} className="border-b border-hair">
                <a
                  href={`#${entry.id}`}
                  className="block py-1.5 text-small text-ink-2 no-underline hover:text-ink hover:underline max-lg:py-2.5"
                >
                  {entry.title}
                </a>
              </li>
            ))}
          </ol>
        </li>
      ))}
    </ol>
  );
}
