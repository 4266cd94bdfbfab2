"use client";

import { signOut } from "next-auth/react";
import { PersonMenu } from "@/components/shell/person-menu";
import { MenuButton, MenuSection } from "@/components/ui/menu-items";
import type { Actor } from "@/lib/auth/actor";
import { ROLE_NAMES } from "@/lib/auth/roles";
import { useAccountTheme } from "./use-account-theme";
import { useTakeView } from "./use-take-view";

type PersonProps = Pick<Actor, "name" | "theme" | "role" | "departmentId" | "departmentName" | "memberships">;

/** The person's menu: who and as what, other roles and departments, theme, and the way out. */
export function Person({ name, theme, role, departmentId, departmentName, memberships }: PersonProps) {
  const takeView = useTakeView();
  const keepTheme = useAccountTheme(theme);
  const choices = memberships.flatMap((membership) => membership.roles.map((each) => ({ membership, role: each })));

  return (
    <PersonMenu
      name={name}
      place={`${ROLE_NAMES[role]} · ${departmentName}`}
      onThemeChange={keepTheme}
      signOut={<MenuButton onClick={() => signOut({ callbackUrl: "/sign-in" })}>Sign out</MenuButton>}
    >
      {choices.length > 1 && (
        <MenuSection title="Act as">
          {choices.map(({ membership, role: each }) => (
            <MenuButton
              key={`${membership.departmentId} ${each}`}
              isCurrent={each === role && membership.departmentId === departmentId}
              detail={memberships.length > 1 ? membership.departmentName : undefined}
              onClick={() => takeView({ departmentId: membership.departmentId, role: each })}
            >
              {ROLE_NAMES[each]}
            </MenuButton>
          ))}
        </MenuSection>
      )}
    </PersonMenu>
  );
}
