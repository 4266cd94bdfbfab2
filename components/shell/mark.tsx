import { joinClasses } from "@/components/ui/join-classes";

/** Two equal glints over a rule with its zero between them. Ornament beside the wordmark, so it has no name of its own. */
export function Mark({ className }: { className?: string }) {
  return (
    <svg viewBox="0 0 48 22" aria-hidden="true" className={joinClasses("shrink-0", className ?? "h-5.5 w-12")}>
      <path
        d="M2 15.5h44M2.75 15.5v5M13 15.5v3M18.5 15.5v2M7.5 15.5v2M29.5 15.5v2M40.5 15.5v2M35 15.5v3M45.25 15.5v5M24 11v9.5"
        fill="none"
        stroke="currentColor"
        strokeWidth="1.5"
      />
      <g className="fill-brass-dot">
        <circle cx="13" cy="7.6" r="4.1" />
        <circle cx="35" cy="7.6" r="4.1" />
      </g>
    </svg>
  );
}
