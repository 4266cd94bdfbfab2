import { ChevronDown } from "lucide-react";
import type { ComponentProps } from "react";
import { CONTROL_CLASSES } from "./control-classes";
import { Icon } from "./icon";
import { joinClasses } from "./join-classes";

export type Option = { value: string; label: string; isDisabled?: boolean };

type SelectProps = Omit<ComponentProps<"select">, "children" | "multiple"> & { options: readonly Option[] };

export function Select({ options, className, ...rest }: SelectProps) {
  return (
    <span className={joinClasses("relative block", className)}>
      <select {...rest} className={joinClasses(CONTROL_CLASSES, "appearance-none pr-10")}>
        {options.map(({ value, label, isDisabled }) => (
          <option key={value} value={value} disabled={isDisabled}>
            {label}
          </option>
        ))}
      </select>
      <span className="pointer-events-none absolute inset-y-0 right-3 flex items-center text-ink-2">
        <Icon icon={ChevronDown} />
      </span>
    </span>
  );
}
