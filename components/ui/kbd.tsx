import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

/** A key cap. It takes the colour of the text around it. */
export function Kbd({ children, className }: { children: ReactNode; className?: string }) {
  return (
    <kbd
      className={joinClasses(
        "inline-grid h-5.5 min-w-5.5 place-items-center rounded-[3px] border border-current px-1.25 font-mono text-key font-medium",
        className,
      )}
    >
      {children}
    </kbd>
  );
}
