import type { ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";

/** The landmark of what a page is about, at the page's width and margins. The skip link leads here. */
export function Page({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <main
      id="main"
      tabIndex={-1}
      className={joinClasses(
        "mx-auto w-full max-w-page grow px-margin pt-6 pb-12 outline-none lg:pt-8 lg:pb-16 print:py-3",
        className,
      )}
    >
      {children}
    </main>
  );
}

type PageHeadProps = {
  crumb?: ReactNode;
  title: ReactNode;
  /** One line under the title: state, dates, counts. */
  lede?: ReactNode;
  actions?: ReactNode;
  /** The larger title of results, scorecard and drift board. */
  isTitle?: boolean;
};

/** Where one is, what it is called, and what can be done with it as a whole. */
export function PageHead({ crumb, title, lede, actions, isTitle = false }: PageHeadProps) {
  return (
    <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-4 pb-5">
      <div className="min-w-0 max-w-full">
        {crumb}
        <h1 className={isTitle ? "text-title" : undefined}>{title}</h1>
        {lede && <p className="mt-2.5 max-w-read text-ink-2">{lede}</p>}
      </div>
      {actions && <div className="flex flex-wrap items-center gap-2 print:hidden">{actions}</div>}
    </div>
  );
}
