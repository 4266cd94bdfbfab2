import type { ReactNode } from "react";
import { NAVIGATION } from "@/components/session/navigation";
import { Person } from "@/components/session/person";
import { Foot } from "@/components/shell/foot";
import { RunningHead } from "@/components/shell/running-head";
import { signedInActor } from "@/lib/auth/current-actor";
import { LANDING } from "@/lib/auth/roles";

/** The head and foot of every page but the reading desk. Each page checks its own permission. */
export default async function AppLayout({ children }: { children: ReactNode }) {
  const { name, theme, role, departmentId, departmentName, memberships } = await signedInActor();
  const person = { name, theme, role, departmentId, departmentName, memberships };
  return (
    <div className="flex min-h-dvh flex-col">
      <RunningHead homeHref={LANDING[role]} items={NAVIGATION[role]} person={<Person {...person} />} />
      {children}
      <Foot />
    </div>
  );
}
