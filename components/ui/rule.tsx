import { joinClasses } from "./join-classes";

/** The graduated hairline. It is ornament: what it measures is said by what stands on it. */
export function Rule({ className }: { className?: string }) {
  return <div aria-hidden="true" className={joinClasses("rule-ticks", className)} />;
}
