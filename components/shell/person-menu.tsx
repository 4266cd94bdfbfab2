import type { ComponentProps, ReactNode } from "react";
import { Menu } from "@/components/ui/menu";
import { MenuSection } from "@/components/ui/menu-items";
import { ThemeSwitch } from "./theme-switch";

type PersonMenuProps = {
  name: string;
  /** Role and department: "Training lead · Quillmere Eye Department". */
  place: string;
  /** Links to one's own pages, and other departments and roles: MenuSection with MenuLink or forms with MenuButton. */
  children?: ReactNode;
  onThemeChange?: ComponentProps<typeof ThemeSwitch>["onThemeChange"];
  /** The way out, in a form of its own. */
  signOut: ReactNode;
};

/** Who is signed in, as what, and what can be changed about it from any page. */
export function PersonMenu({ name, place, children, onThemeChange, signOut }: PersonMenuProps) {
  const label = (
    <span className="min-w-0 leading-tight text-ink-2 sm:text-right">
      <b className="block truncate text-ink max-sm:max-w-36">{name}</b>
      <span className="max-sm:hidden">{place}</span>
    </span>
  );
  return (
    <Menu label={label} className="items-center">
      <p className="border-b border-hair px-4 py-3 text-small text-ink-2 sm:hidden">{place}</p>
      {children}
      <MenuSection>
        <div className="py-2">
          <ThemeSwitch onThemeChange={onThemeChange} />
        </div>
      </MenuSection>
      <MenuSection>{signOut}</MenuSection>
    </Menu>
  );
}
