import { Check, Info, type LucideIcon, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { DiamondAlert } from "./diamond-alert";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";

/** ok: done, within limits; warn: watch; bad: action; info: about the reference; own: yours; mute: no state to act on. */
export type TagTone = "ok" | "warn" | "bad" | "info" | "own" | "mute";

const COLOURS: Record<TagTone, string> = {
  ok: "text-verdi",
  warn: "text-tawny",
  bad: "text-oxide",
  info: "text-cobalt",
  own: "text-brass",
  mute: "text-ink-3",
};
/** The shape says what the colour says, for those who do not see it. */
const SHAPES: Partial<Record<TagTone, LucideIcon>> = {
  ok: Check,
  warn: TriangleAlert,
  bad: DiamondAlert,
  info: Info,
};

type TagProps = { tone: TagTone; icon?: LucideIcon; children: ReactNode; className?: string };

/** A word of state. `icon` replaces the shape of the tone, as a lock does for what is sealed. */
export function Tag({ tone, icon, children, className }: TagProps) {
  const shape = icon ?? SHAPES[tone];
  return (
    <span
      className={joinClasses(
        "inline-flex items-center gap-1.5 rounded-tag border border-current px-2 py-0.5 font-sans text-note leading-[1.3] font-semibold whitespace-nowrap",
        COLOURS[tone],
        className,
      )}
    >
      {shape && <Icon icon={shape} className="size-3.5" />}
      {tone === "own" && !icon && <span className="glint size-2 bg-brass-dot" />}
      {children}
    </span>
  );
}
