import type { ReactNode } from "react";
import { joinClasses } from "./join-classes";

/** Two to four sentences made from the numbers, before any figure. `isRuled` sets it off with a line above. */
export function Standfirst({
  children,
  isRuled,
  className,
}: {
  children: ReactNode;
  isRuled?: boolean;
  className?: string;
}) {
  return (
    <p
      className={joinClasses(
        "max-w-standfirst font-serif text-standfirst text-pretty",
        isRuled && "border-t border-edge pt-4.5",
        className,
      )}
    >
      {children}
    </p>
  );
}
