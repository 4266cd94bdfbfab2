import type { ComponentProps } from "react";
import { CONTROL_CLASSES } from "./control-classes";
import { joinClasses } from "./join-classes";

export function Textarea({ className, rows = 3, ...rest }: ComponentProps<"textarea">) {
  return <textarea {...rest} rows={rows} className={joinClasses(CONTROL_CLASSES, "field-sizing-content", className)} />;
}
