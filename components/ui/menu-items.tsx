import Link from "next/link";
import type { ComponentProps, ReactNode } from "react";

/** Items that belong together, under a name and set off by a hairline. */
export function MenuSection({ title, children }: { title?: string; children: ReactNode }) {
  return (
    <div className="border-b border-hair px-4 py-2 last:border-b-0">
      {title && <p className="pt-1 pb-1.5 text-note text-ink-2">{title}</p>}
      {children}
    </div>
  );
}

const ITEM =
  "-mx-4 flex w-[calc(100%+2rem)] min-h-touch flex-col justify-center px-4 py-1.5 text-left text-ink no-underline hover:bg-sunk " +
  "aria-[current=true]:font-semibold focus-visible:-outline-offset-3";

/** What an item of a menu says: a line, a detail under it, and a glint where one is now. */
function ItemContent({
  children,
  detail,
  isCurrent,
}: {
  children: ReactNode;
  detail?: ReactNode;
  isCurrent?: boolean;
}) {
  return (
    <>
      <span className="flex items-center gap-2">
        {children}
        {isCurrent && <span className="glint size-2 bg-brass-dot" />}
      </span>
      {detail && <span className="text-small font-normal text-ink-2">{detail}</span>}
    </>
  );
}

type ItemProps = { detail?: ReactNode; isCurrent?: boolean };

export function MenuLink({ children, detail, isCurrent, ...rest }: ComponentProps<typeof Link> & ItemProps) {
  return (
    <Link {...rest} aria-current={isCurrent ? "true" : undefined} className={ITEM}>
      <ItemContent detail={detail} isCurrent={isCurrent}>
        {children}
      </ItemContent>
    </Link>
  );
}

/** For what is not a place: signing out, or taking another role in a form. */
export function MenuButton({
  children,
  detail,
  isCurrent,
  type = "button",
  ...rest
}: ComponentProps<"button"> & ItemProps) {
  return (
    <button {...rest} type={type} aria-current={isCurrent ? "true" : undefined} className={ITEM}>
      <ItemContent detail={detail} isCurrent={isCurrent}>
        {children}
      </ItemContent>
    </button>
  );
}
