"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { useEffect, useRef } from "react";
import { currentHref } from "./current-href";

export type NavItem = { label: string; href: string };

/** The pages of a role. A glint on the rule stands under the current one. Where they do not fit, the row moves sideways. */
export function MainNav({ items }: { items: readonly NavItem[] }) {
  const pathname = usePathname();
  const row = useRef<HTMLUListElement>(null);
  const current = currentHref(
    items.map((item) => item.href),
    pathname,
  );

  // biome-ignore lint/correctness/useExhaustiveDependencies: the row is looked at again when another page becomes current
  useEffect(() => {
    const link = row.current?.querySelector("[aria-current]");
    if (!row.current || !(link instanceof HTMLElement)) return;
    row.current.scrollLeft = link.offsetLeft - (row.current.clientWidth - link.offsetWidth) / 2;
  }, [current]);

  return (
    <nav aria-label="Main" className="flex min-w-0 max-lg:order-3 max-lg:-mx-2 max-lg:basis-full print:hidden">
      {/* The room below lets the glint stand on the rule although a row that scrolls cuts off what overhangs. */}
      <ul
        ref={row}
        className="relative -mb-2 flex min-h-14 overflow-x-auto overscroll-x-contain pb-2 [scrollbar-width:none]"
      >
        {items.map(({ label, href }) => (
          <li key={href} className="flex">
            <Link
              href={href}
              aria-current={href === current ? (pathname === href ? "page" : "true") : undefined}
              className="relative flex items-center px-3.5 whitespace-nowrap text-ink-2 no-underline hover:text-ink hover:underline focus-visible:-outline-offset-3 aria-[current]:font-semibold aria-[current]:text-ink"
            >
              {label}
              {href === current && (
                <span className="glint absolute -bottom-1.25 left-1/2 z-2 size-2.25 -translate-x-1/2 bg-brass-dot ring-3 ring-paper" />
              )}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}
