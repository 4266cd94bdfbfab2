import type { NavItem } from "@/components/shell/main-nav";
import type { Role } from "@/lib/auth/roles";

const READING: NavItem[] = [{ label: "Desk", href: "/desk" }];

/** The pages of each role, in the order of use. Hidden pages are a courtesy: the server decides who may open what. */
export const NAVIGATION: Record<Role, NavItem[]> = {
  lead: [
    { label: "Rounds", href: "/rounds" },
    { label: "Cases", href: "/cases" },
    { label: "People", href: "/people" },
    { label: "Drift", href: "/drift" },
  ],
  examiner: READING,
  trainee: READING,
  reviewer: [{ label: "Drift", href: "/drift" }],
  admin: [
    { label: "People", href: "/people" },
    { label: "Log", href: "/log" },
  ],
};
