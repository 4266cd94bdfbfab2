import { joinClasses } from "./join-classes";
import { Kbd } from "./kbd";

export type PickLayout = "tiles" | "rows";

type PickProps = {
  name: string;
  value: string;
  label: string;
  detail?: string;
  shortcut?: string;
  layout: PickLayout;
  isDisabled?: boolean;
  isInvalid: boolean;
  checked: boolean | undefined;
  defaultChecked: boolean | undefined;
  onPick: (() => void) | undefined;
};

const LAYOUTS: Record<PickLayout, { box: string; glint: string }> = {
  tiles: { box: "min-h-desk flex-col justify-end px-3.5 pt-7 pb-2.25", glint: "top-3.25 left-3.5" },
  rows: { box: "min-h-13 flex-col justify-center py-2 pr-10 pl-9", glint: "top-1/2 left-3.5 -translate-y-1/2" },
};

/**
 * One answer of a choice group. Lit, it is a pupil with a glint.
 * The radio lies invisible over the whole box, so that touch, pointer and screen reader all meet the real control.
 */
export function Pick({ layout, label, detail, shortcut, isDisabled, isInvalid, onPick, ...radio }: PickProps) {
  return (
    <label
      className={joinClasses(
        "group/pick relative flex rounded-control border border-edge bg-sheet leading-[1.2] transition-[background-color,border-color,color] duration-quick",
        "hover:border-ink has-checked:lit has-focus-visible:outline-3 has-focus-visible:outline-offset-2",
        "has-focus-visible:outline-cobalt has-disabled:border-dashed has-disabled:bg-transparent has-disabled:text-ink-3",
        isInvalid && "border-oxide",
        LAYOUTS[layout].box,
      )}
    >
      <input
        {...radio}
        type="radio"
        disabled={isDisabled}
        aria-keyshortcuts={shortcut}
        onChange={onPick}
        className="absolute inset-0 size-full cursor-[inherit] appearance-none rounded-control opacity-0"
      />
      <span
        className={joinClasses(
          "glint pointer-events-none absolute hidden size-2.5 bg-lit-glint group-has-checked/pick:block",
          LAYOUTS[layout].glint,
        )}
      />
      <span className="font-semibold">{label}</span>
      {detail && (
        <span className="text-small text-ink-2 group-has-checked/pick:text-on-lit group-has-disabled/pick:text-ink-3">
          {detail}
        </span>
      )}
      {shortcut && (
        <span aria-hidden="true" className="absolute top-2.25 right-2.25 max-lg:hidden">
          <Kbd className="text-ink-3 group-has-checked/pick:text-on-lit">{shortcut}</Kbd>
        </span>
      )}
    </label>
  );
}
