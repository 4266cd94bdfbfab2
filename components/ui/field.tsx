import { type ReactNode, useId } from "react";
import { DiamondAlert } from "./diamond-alert";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";

/** What ties a control to its label, hint and error. Spread it on the control. */
export type FieldWiring = { id: string; "aria-describedby": string | undefined; "aria-invalid": true | undefined };

type FieldProps = {
  label: ReactNode;
  hint?: ReactNode;
  /** What is wrong and what to do about it; its presence marks the control as invalid. */
  error?: string | null;
  isOptional?: boolean;
  className?: string;
  children: (wiring: FieldWiring) => ReactNode;
};

/** A label above, a control, a hint below, and the error under it. */
export function Field({ label, hint, error, isOptional = false, className, children }: FieldProps) {
  const id = useId();
  const hintId = `${id}-hint`;
  const errorId = `${id}-error`;
  const describedBy = joinClasses(error && errorId, hint ? hintId : null) || undefined;
  return (
    <div className={className}>
      <label htmlFor={id} className="mb-1.5 block text-small font-semibold">
        {label}
        {isOptional && <span className="font-normal text-ink-2"> (optional)</span>}
      </label>
      {children({ id, "aria-describedby": describedBy, "aria-invalid": error ? true : undefined })}
      {error && <FieldError id={errorId}>{error}</FieldError>}
      {hint && (
        <p id={hintId} className="mt-1.5 text-small text-ink-2">
          {hint}
        </p>
      )}
    </div>
  );
}

/** The line under a control, or under a group of controls, that says what is wrong. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="mt-1.5 flex gap-1.5 text-small text-oxide">
      <Icon icon={DiamondAlert} className="mt-px size-4.5" />
      <span>{children}</span>
    </p>
  );
}
