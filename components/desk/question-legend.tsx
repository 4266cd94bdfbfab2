import type { ReactNode } from "react";

export function QuestionLegend({ number, children }: { number: number; children: ReactNode }) {
  return (
    <span className="flex items-baseline gap-2">
      <span aria-hidden="true" className="font-normal text-ink-2 italic">
        {number}
      </span>
      {children}
    </span>
  );
}
