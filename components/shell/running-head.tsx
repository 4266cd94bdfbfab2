import Link from "next/link";
import type { ReactNode } from "react";
import { Rule } from "@/components/ui/rule";
import { MainNav, type NavItem } from "./main-nav";
import { Mark } from "./mark";
import { Wordmark } from "./wordmark";

type RunningHeadProps = {
  /** Where the brand leads: the first page of the role. */
  homeHref: string;
  /** The pages this person may open; none before signing in. */
  items?: readonly NavItem[];
  /** The person's menu, or a link to sign in. */
  person?: ReactNode;
};

/** The head of every page but the desk and the masthead: brand, pages, person, and the rule under them. */
export function RunningHead({ homeHref, items = [], person }: RunningHeadProps) {
  return (
    <header className="relative z-10 bg-paper">
      <div className="flex flex-wrap items-stretch gap-x-5 px-margin lg:min-h-15 lg:flex-nowrap lg:gap-x-7 print:min-h-11">
        <Link href={homeHref} className="flex min-h-15 items-center gap-3 text-ink no-underline print:min-h-11">
          <Mark />
          <Wordmark />
        </Link>
        {items.length > 0 && <MainNav items={items} />}
        {person && <div className="-mr-2 ml-auto flex min-w-0 items-center print:hidden">{person}</div>}
      </div>
      <Rule />
    </header>
  );
}
