import { Check } from "lucide-react";
import { type ComponentProps, type ReactNode, useId } from "react";
import { joinClasses } from "./join-classes";

type CheckboxProps = Omit<ComponentProps<"input">, "type" | "children"> & { label: ReactNode; hint?: ReactNode };

/** A checkbox with its label beside it. The whole line is the target, 44 px high. */
export function Checkbox({ label, hint, className, ...rest }: CheckboxProps) {
  const hintId = useId();
  return (
    <label className={joinClasses("flex min-h-touch items-start gap-3 py-2.5", className)}>
      <span className="relative mt-px flex size-5.5 shrink-0">
        <input
          aria-describedby={hint ? hintId : undefined}
          {...rest}
          type="checkbox"
          className={
            "peer size-full appearance-none rounded-tag border-[1.5px] border-edge bg-sheet checked:lit hover:border-ink " +
            "aria-invalid:border-oxide disabled:border-dashed forced-colors:appearance-auto"
          }
        />
        <Check
          aria-hidden="true"
          strokeWidth={3}
          className="pointer-events-none absolute inset-0 m-auto hidden size-4 text-lit-glint peer-checked:block forced-colors:hidden!"
        />
      </span>
      <span>
        {label}
        {hint && (
          <span id={hintId} className="block text-small text-ink-2">
            {hint}
          </span>
        )}
      </span>
    </label>
  );
}
