import type { ComponentProps } from "react";
import { CONTROL_CLASSES } from "./control-classes";
import { joinClasses } from "./join-classes";

type TextInputProps = ComponentProps<"input"> & {
  /** Set in the face of what is measured. */
  isMeasured?: boolean;
  /** A unit that stands in the control, after what is typed. The label must name it too. */
  unit?: string;
};

export function TextInput({ isMeasured = false, unit, className, type = "text", ...rest }: TextInputProps) {
  const look = joinClasses(CONTROL_CLASSES, isMeasured && "font-mono font-medium");
  if (unit === undefined) return <input {...rest} type={type} className={joinClasses(look, className)} />;
  return (
    <span className={joinClasses("relative block", className)}>
      <input {...rest} type={type} className={joinClasses(look, "pr-9")} />
      <span aria-hidden="true" className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-ink-2">
        {unit}
      </span>
    </span>
  );
}
