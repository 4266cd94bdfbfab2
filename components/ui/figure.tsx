import { type ReactNode, useId } from "react";
import { Sheet } from "./sheet";

type FigureProps = {
  /** "Fig. 1". Numbered on the page, as in a journal. */
  label: string;
  /** What is shown and how to read it: it serves as the text alternative. */
  caption: ReactNode;
  /** The same numbers as a table. */
  table?: ReactNode;
  className?: string;
  children: ReactNode;
};

/** A captioned figure on its sheet, with its numbers one step away. */
export function Figure({ label, caption, table, className, children }: FigureProps) {
  const captionId = useId();
  return (
    <figure aria-labelledby={captionId} className={className}>
      <figcaption id={captionId} className="mb-3.5 max-w-read font-serif text-body leading-[1.35]">
        <b>{label}</b> {caption}
      </figcaption>
      <Sheet className="px-4 py-4.5 sm:px-5">
        {children}
        {table && (
          <details className="mt-3 border-t border-hair print:hidden">
            <summary className="flex min-h-touch items-center text-small text-cobalt underline underline-offset-3">
              Show as table
            </summary>
            <div className="pt-1 pb-2">{table}</div>
          </details>
        )}
      </Sheet>
    </figure>
  );
}
