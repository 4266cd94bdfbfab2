import type { Metadata } from "next";
import { SwitchButton } from "@/components/session/switch-button";
import { Page, PageHead } from "@/components/shell/page";
import { signedInActor } from "@/lib/auth/current-actor";
import { isRole, ROLE_NAMES } from "@/lib/auth/roles";

export const metadata: Metadata = { title: "Another role" };

/** Where a page leads that is not open to the role acted in: offers the roles held that may open it. */
export default async function SwitchPage({ searchParams }: PageProps<"/switch">) {
  const actor = await signedInActor();
  const asked = String((await searchParams).for ?? "").split(",");
  const own = actor.memberships.find(({ departmentId }) => departmentId === actor.departmentId);
  const fitting = own?.roles.filter((role) => asked.includes(role)) ?? [];
  const needed = asked.filter(isRole).map((role) => ROLE_NAMES[role].toLowerCase());
  return (
    <Page>
      <PageHead title="This page is for another role" />
      <p className="max-w-read">
        It is open to {needed.join(" and ") || "another role"}. You are here as {ROLE_NAMES[actor.role].toLowerCase()}.
        {fitting.length === 0 && " If you should be able to open it, ask an administrator of your department."}
      </p>
      <div className="mt-6 flex flex-wrap gap-2">
        {fitting.map((role) => (
          <SwitchButton
            key={role}
            view={{ departmentId: actor.departmentId, role }}
            label={`Go on as ${ROLE_NAMES[role].toLowerCase()}`}
          />
        ))}
      </div>
    </Page>
  );
}
