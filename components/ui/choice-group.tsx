import { type ReactNode, useId } from "react";
import { FieldError } from "./field";
import { joinClasses } from "./join-classes";
import { Pick, type PickLayout } from "./pick";

export type Choice<Value extends string> = {
  value: Value;
  label: string;
  detail?: string;
  /** Shown as a key cap and announced. Listening for the key is the page's work. */
  shortcut?: string;
  isDisabled?: boolean;
};

type ChoiceGroupProps<Value extends string> = {
  legend: ReactNode;
  legendLook?: "label" | "question" | "hidden";
  /** Shared by the radios of the group, and sent with a form. */
  name: string;
  choices: readonly Choice<Value>[];
  /** Leave out, with `defaultValue` if need be, to let the form keep the choice; `null` is none chosen. */
  value?: Value | null;
  defaultValue?: Value;
  onChange?: (value: Value) => void;
  /** tiles: label at the foot, detail under it; rows: one line each, glint before the label. */
  layout?: PickLayout;
  /** On a phone, rows always stand one below the other. */
  columns?: 1 | 2 | 3 | 4 | "desk-pair" | "desk-stack";
  isDisabled?: boolean;
  error?: string | null;
  className?: string;
};

const COLUMNS = {
  tiles: {
    1: "grid-cols-1",
    2: "grid-cols-2",
    3: "grid-cols-3",
    4: "grid-cols-4",
    // At the desk: three in a row, and where there is height two with the third across, or one below the other.
    "desk-pair": "grid-cols-3 xl:grid-cols-2 xl:[&>*:last-child]:col-span-2",
    "desk-stack": "grid-cols-3 xl:grid-cols-1",
  },
  rows: {
    1: "grid-cols-1",
    2: "sm:grid-cols-2",
    3: "sm:grid-cols-3",
    4: "sm:grid-cols-2 lg:grid-cols-4",
    "desk-pair": "grid-cols-1",
    "desk-stack": "grid-cols-1",
  },
};
const LEGENDS = {
  label: "mb-1.5 text-small font-semibold",
  question: "mb-2.5 font-serif text-h3 font-medium",
  hidden: "sr-only",
};

/** One question with few answers. Real radio buttons: Tab enters the group, arrows move in it, forms send it. */
export function ChoiceGroup<Value extends string>(props: ChoiceGroupProps<Value>) {
  const { legend, legendLook = "label", name, choices, layout = "tiles", columns = 3, isDisabled, error } = props;
  const errorId = useId();
  return (
    <fieldset
      disabled={isDisabled}
      aria-describedby={error ? errorId : undefined}
      className={joinClasses("min-w-0", props.className)}
    >
      <legend className={LEGENDS[legendLook]}>{legend}</legend>
      <div className={joinClasses("grid auto-rows-fr gap-2", COLUMNS[layout][columns])}>
        {choices.map((choice) => (
          <Pick
            key={choice.value}
            {...choice}
            name={name}
            layout={layout}
            isInvalid={Boolean(error)}
            checked={props.value === undefined ? undefined : props.value === choice.value}
            defaultChecked={props.value === undefined ? props.defaultValue === choice.value : undefined}
            onPick={props.onChange && (() => props.onChange?.(choice.value))}
          />
        ))}
      </div>
      {error && <FieldError id={errorId}>{error}</FieldError>}
    </fieldset>
  );
}
