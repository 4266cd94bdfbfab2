import Link from "next/link";

type Segment = { label: string; href: string; isCurrent: boolean };

/** One of a few views of the same thing, joined into one control and kept in the address. */
export function Segments({ label, items }: { label: string; items: readonly Segment[] }) {
  return (
    <nav aria-label={label} className="print:hidden">
      <ul className="inline-flex flex-wrap rounded-control border border-edge text-small">
        {items.map(({ label: text, href, isCurrent }) => (
          <li key={href} className="flex not-first:border-l not-first:border-edge">
            <Link
              href={href}
              aria-current={isCurrent ? "true" : undefined}
              className="flex min-h-touch items-center gap-2 px-4 text-ink no-underline hover:underline aria-[current=true]:lit"
            >
              {isCurrent && <span className="glint size-2 bg-lit-glint" />}
              {text}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
