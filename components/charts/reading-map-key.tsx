import type { ReactNode } from "react";
import { joinClasses } from "@/components/ui/join-classes";
import styles from "./charts.module.css";
import { ReferenceRing } from "./marks";

type ReadingMapKeyProps = { hasOwn?: boolean; hasOthers?: boolean };

/** What the marks of the reading map mean, once for a page that shows several maps. */
export function ReadingMapKey({ hasOwn = true, hasOthers = true }: ReadingMapKeyProps) {
  return (
    <ul className={joinClasses("flex flex-wrap gap-x-5 gap-y-1.5 text-small text-ink-2", styles.chart)}>
      <KeyItem text="reference">
        <ReferenceRing x={10} y={10} r={6} />
      </KeyItem>
      {hasOwn && (
        <KeyItem text="you">
          <circle cx={10} cy={10} r={5} fill="var(--brass-dot)" stroke="var(--ink)" strokeWidth={1.5} />
        </KeyItem>
      )}
      {hasOthers && (
        <KeyItem text="others">
          <circle cx={10} cy={10} r={3.8} fill="var(--sheet)" stroke="var(--ink)" strokeWidth={1.6} />
        </KeyItem>
      )}
      <li>rings: pupil margin 15°, midway 30°, limbus 45°</li>
    </ul>
  );
}

function KeyItem({ text, children }: { text: string; children: ReactNode }) {
  return (
    <li className="flex items-center gap-2">
      <svg aria-hidden="true" width={20} height={20}>
        {children}
      </svg>
      {text}
    </li>
  );
}
