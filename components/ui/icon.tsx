import type { LucideIcon } from "lucide-react";
import { joinClasses } from "./join-classes";

/** Every icon of the interface: 18 px, stroke 1.75, hidden from assistive technology because a word stands beside it. */
export function Icon({ icon: Drawn, className }: { icon: LucideIcon; className?: string }) {
  return (
    <Drawn
      aria-hidden="true"
      className={joinClasses("shrink-0", className ?? "size-4.5")}
      size={18}
      strokeWidth={1.75}
    />
  );
}
