import type { LucideIcon } from "lucide-react";
import Link from "next/link";
import type { ComponentProps } from "react";
import { type ButtonKind, type ButtonSize, buttonClasses } from "./button-classes";
import { Icon } from "./icon";

type Look = { kind?: ButtonKind; size?: ButtonSize; icon?: LucideIcon };

/**
 * A button that does nothing by itself in a form unless `type="submit"`.
 * `isBusy` keeps it in place and focused while its work runs, and lets no second press through.
 */
export function Button({
  kind = "line",
  size = "touch",
  icon,
  isBusy = false,
  type = "button",
  className,
  children,
  onClick,
  ...rest
}: ComponentProps<"button"> & Look & { isBusy?: boolean }) {
  return (
    <button
      {...rest}
      type={isBusy ? "button" : type}
      onClick={isBusy ? undefined : onClick}
      aria-disabled={isBusy || undefined}
      aria-busy={isBusy || undefined}
      className={buttonClasses(kind, size, className)}
    >
      {icon && <Icon icon={icon} />}
      {children}
    </button>
  );
}

/** A link that looks like a button, for what leads to another page. */
export function ButtonLink({
  kind = "line",
  size = "touch",
  icon,
  className,
  children,
  ...rest
}: ComponentProps<typeof Link> & Look) {
  return (
    <Link {...rest} className={buttonClasses(kind, size, className)}>
      {icon && <Icon icon={icon} />}
      {children}
    </Link>
  );
}
