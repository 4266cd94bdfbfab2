import Link from "next/link";
import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

const CHIP =
  "group/chip inline-flex min-h-touch items-center gap-2 rounded-control border border-edge bg-sheet px-3 text-small " +
  "font-medium text-ink no-underline transition-[background-color,border-color,color] duration-quick hover:border-ink sm:min-h-slim " +
  "aria-pressed:lit aria-[current=true]:lit";

type ChipFace = { label: string; count?: number; isOn: boolean };

function ChipContent({ label, count, isOn }: ChipFace) {
  return (
    <>
      {isOn && <span className="glint size-2 bg-lit-glint" />}
      {label}
      {count !== undefined && <span className={joinClasses("font-mono", isOn ? "" : "text-ink-2")}>{count}</span>}
    </>
  );
}

/** A row of filters under one name. Put chips, or links that look like them, inside. */
export function FilterChips({
  label,
  children,
  className,
}: {
  label: string;
  children: ReactNode;
  className?: string;
}) {
  return (
    <fieldset className={joinClasses("flex min-w-0 flex-wrap items-center gap-2 print:hidden", className)}>
      <legend className="sr-only">{label}</legend>
      {children}
    </fieldset>
  );
}

/** A filter that is on or off on this page. */
export function FilterChip({ onToggle, ...face }: ChipFace & { onToggle: () => void }) {
  return (
    <button type="button" aria-pressed={face.isOn} onClick={onToggle} className={CHIP}>
      <ChipContent {...face} />
    </button>
  );
}

/** A filter kept in the address, so that the page can be shared and works without scripts. */
export function FilterChipLink({ href, ...face }: ChipFace & { href: string }) {
  return (
    <Link href={href} aria-current={face.isOn ? "true" : undefined} className={CHIP}>
      <ChipContent {...face} />
    </Link>
  );
}
