import { joinClasses } from "./join-classes";

/** main: the one action of a place; line: any other; bare: a minor one; stop: what takes something away. */
export type ButtonKind = "main" | "line" | "bare" | "stop";
/** slim: in tables, 36 px; touch: 44 px; desk: where one reads, 60 px. */
export type ButtonSize = "slim" | "touch" | "desk";

const BASE =
  "relative inline-flex items-center justify-center gap-2.5 rounded-control border text-center leading-[1.1] " +
  "no-underline transition-[background-color,border-color,color] duration-quick sm:whitespace-nowrap print:hidden " +
  "disabled:border-dashed disabled:border-edge disabled:bg-transparent disabled:text-ink-3 disabled:after:hidden " +
  "aria-busy:cursor-progress aria-busy:after:hidden";

const KINDS: Record<ButtonKind, string> = {
  main:
    "border-ink bg-ink font-semibold text-on-ink after:glint after:absolute after:top-2 after:right-2 after:size-1.5 " +
    "after:bg-glint hover:border-ink-2 hover:bg-ink-2",
  line: "border-edge bg-sheet font-medium text-ink hover:border-ink",
  bare: "border-transparent bg-transparent font-medium text-ink-2 hover:border-hair hover:text-ink",
  stop: "border-oxide bg-transparent font-medium text-oxide hover:bg-oxide-wash",
};

const SIZES: Record<ButtonSize, string> = {
  slim: "min-h-slim px-3 text-small",
  touch: "min-h-touch px-4.5 text-body",
  desk: "min-h-desk px-6 text-h3 tracking-normal",
};

/** What a button and a link that looks like one share. */
export function buttonClasses(kind: ButtonKind, size: ButtonSize, className?: string): string {
  const room = kind === "main" ? "pr-7" : kind === "bare" && "px-2.5";
  return joinClasses(BASE, SIZES[size], KINDS[kind], room, className);
}
