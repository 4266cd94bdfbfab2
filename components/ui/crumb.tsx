import Link from "next/link";
import { Fragment } from "react";

/** The way to this page. The last step, without an address, is the page itself. */
export function Crumb({ steps }: { steps: readonly { label: string; href?: string }[] }) {
  return (
    <nav aria-label="Where this page lies" className="mb-2.5 text-small text-ink-2 print:hidden">
      <ol className="flex flex-wrap gap-x-1.5">
        {steps.map(({ label, href }, index) => (
          <Fragment key={label}>
            {index > 0 && <li aria-hidden="true">/</li>}
            <li>
              {href ? (
                <Link href={href} className="text-inherit no-underline hover:text-ink hover:underline">
                  {label}
                </Link>
              ) : (
                <span aria-current="page">{label}</span>
              )}
            </li>
          </Fragment>
        ))}
      </ol>
    </nav>
  );
}
