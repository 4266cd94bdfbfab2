import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

type SheetProps = {
  as?: "div" | "section" | "article" | "aside";
  /** The id of the heading that names it, for a section of its own. */
  labelledBy?: string;
  isPadded?: boolean;
  /** Framed in ink, for what stands above the page: the seal. */
  isMarked?: boolean;
  className?: string;
  children: ReactNode;
};

/** A raised page: a hairline round it, square corners, no shadow. */
export function Sheet({ as: Part = "div", labelledBy, isPadded = true, isMarked, className, children }: SheetProps) {
  return (
    <Part
      aria-labelledby={labelledBy}
      className={joinClasses(
        "border bg-sheet [--surface:var(--sheet)] print:border-0 print:p-0",
        isMarked ? "border-ink" : "border-hair",
        isPadded && "p-4 sm:p-6",
        className,
      )}
    >
      {children}
    </Part>
  );
}
