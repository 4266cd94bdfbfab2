import { joinClasses } from "./join-classes";
import { progressLabels } from "./progress-labels";

type ProgressRuleProps = {
  /** What is being counted, for those who do not see the rule: "Cases read". */
  label: string;
  count: number;
  /** How many of the first are done, or for each position whether it is. */
  done: number | readonly boolean[];
  /** The position where the glint stands, from 1; `null` for nowhere. */
  current: number | null;
  /** One text or `null` for each position, instead of its number. */
  labels?: readonly (string | null)[];
  /** The sentence spoken for the whole. Without it: "9 of 24, now at 10". */
  valueText?: string;
  /** Draws the rule heavy up to the glint, for time that has passed. */
  isFilled?: boolean;
  className?: string;
};

/** "n of m" on the rule: one tick a position, heavy where done, the glint where one is. */
export function ProgressRule({
  label,
  count,
  done,
  current,
  labels,
  valueText,
  isFilled,
  className,
}: ProgressRuleProps) {
  const isDone = (index: number) => (typeof done === "number" ? index < done : done[index] === true);
  const doneCount = typeof done === "number" ? done : done.filter(Boolean).length;
  const left = (index: number) => `${count > 1 ? (index / (count - 1)) * 100 : 0}%`;
  const numbered = new Set(progressLabels(count));
  const textAt = (index: number) => (labels ? labels[index] : numbered.has(index + 1) ? String(index + 1) : null);
  return (
    <div
      role="progressbar"
      aria-label={label}
      aria-valuemin={0}
      aria-valuemax={count}
      aria-valuenow={doneCount}
      aria-valuetext={valueText ?? `${doneCount} of ${count}${current === null ? "" : `, now at ${current}`}`}
      className={joinClasses("border-t border-edge", className)}
    >
      <div aria-hidden="true" className="relative h-7.5 print-exact">
        {isFilled && current !== null && (
          <span className="absolute -top-0.5 left-0 h-0.75 bg-ink" style={{ width: left(current - 1) }} />
        )}
        {Array.from({ length: count }, (_, index) => {
          const text = textAt(index);
          const edge = index === 0 ? "left-0" : index === count - 1 ? "right-0" : "-translate-x-1/2";
          return (
            // biome-ignore lint/suspicious/noArrayIndexKey: a tick is its position and holds no state
            <span key={index} className="absolute top-0 w-0" style={{ left: left(index) }}>
              <span
                className={joinClasses("absolute top-0 -translate-x-1/2", tickLook(isDone(index), Boolean(text)))}
              />
              {text && (
                <span className={joinClasses("absolute top-3 font-mono text-note text-ink-2 whitespace-nowrap", edge)}>
                  {text}
                </span>
              )}
            </span>
          );
        })}
        {current !== null && (
          <span
            className="glint absolute -top-0.5 size-2.5 -translate-x-1/2 -translate-y-1/2 bg-brass-dot ring-3 ring-paper transition-[left] duration-calm"
            style={{ left: left(current - 1) }}
          />
        )}
      </div>
    </div>
  );
}

/** Done ticks are heavy and long; of the others, those with a label are longer. */
function tickLook(isDone: boolean, isLabelled: boolean): string {
  if (isDone) return isLabelled ? "h-2.5 w-0.75 bg-ink" : "h-2 w-0.75 bg-ink";
  return isLabelled ? "h-2.5 w-px bg-edge" : "h-2 w-px bg-tick";
}
