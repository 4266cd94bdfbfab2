import { Check, Info, type LucideIcon, TriangleAlert } from "lucide-react";
import type { ReactNode } from "react";
import { DiamondAlert } from "./diamond-alert";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";

export type NoticeTone = "info" | "ok" | "warn" | "bad";

const TONES: Record<NoticeTone, { strip: string; bar: string; icon: LucideIcon }> = {
  info: { strip: "bg-cobalt-wash text-cobalt", bar: "border-cobalt", icon: Info },
  ok: { strip: "bg-verdi-wash text-verdi", bar: "border-verdi", icon: Check },
  warn: { strip: "bg-tawny-wash text-tawny", bar: "border-tawny", icon: TriangleAlert },
  bad: { strip: "bg-oxide-wash text-oxide", bar: "border-oxide", icon: DiamondAlert },
};

type NoticeProps = {
  tone: NoticeTone;
  /** What happened, as a sentence with its full stop. */
  title: string;
  /** What is safe and what to do. */
  children?: ReactNode;
  /** One way on: a slim button or link. */
  action?: ReactNode;
  icon?: LucideIcon;
  className?: string;
};

/** A strip across the place it concerns. It is a live region: errors interrupt, the rest waits its turn. */
export function Notice({ tone, title, children, action, icon, className }: NoticeProps) {
  return (
    <div
      role={tone === "bad" ? "alert" : "status"}
      className={joinClasses(
        "flex flex-wrap items-center gap-x-3 gap-y-2 border border-current px-4 py-3 text-table sm:flex-nowrap",
        TONES[tone].strip,
        className,
      )}
    >
      <Icon icon={icon ?? TONES[tone].icon} className="size-5" />
      <div className="min-w-0 flex-1 text-ink">
        <b>{title}</b> {children}
      </div>
      {action && <div className="max-sm:w-full max-sm:pl-8">{action}</div>}
    </div>
  );
}

/** A remark beside the text: not news, so not a live region. */
export function Remark({ tone, children, className }: { tone?: NoticeTone; children: ReactNode; className?: string }) {
  return (
    <div
      className={joinClasses(
        "border-l-3 py-1 pl-3.5 text-table text-ink-2 [&_b]:text-ink",
        tone ? TONES[tone].bar : "border-edge",
        className,
      )}
    >
      {children}
    </div>
  );
}
