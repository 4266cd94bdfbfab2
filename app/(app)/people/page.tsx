import type { Metadata } from "next";
import { Page, PageHead } from "@/components/shell/page";
import { DataTable } from "@/components/ui/data-table";
import { authorizePage } from "@/lib/auth/current-actor";
import { ROLE_NAMES } from "@/lib/auth/roles";
import { database } from "@/lib/database";
import { listPeople } from "@/lib/people/queries";

export const metadata: Metadata = { title: "People" };

const COLUMNS = [
  { key: "name", head: "Name", isSortable: true },
  { key: "roles", head: "Roles", phone: "plain" as const },
  { key: "email", head: "Work address", phone: "plain" as const },
  { key: "reads", head: "Reads blind", phone: "end" as const },
];

export default async function PeoplePage() {
  const actor = await authorizePage("people.read");
  const people = await listPeople(database(), actor.departmentId);
  return (
    <Page>
      <PageHead title="People" lede={`${people.length} people in ${actor.departmentName}.`} />
      <DataTable
        caption="People of the department"
        isCaptionHidden
        columns={COLUMNS}
        rows={people.map(({ id, name, email, roles, readsAs }) => ({
          id,
          sortValues: { name },
          cells: {
            name,
            roles: roles.map((role) => ROLE_NAMES[role]).join(", "),
            email,
            reads: readsAs ? `as ${readsAs}` : "no",
          },
        }))}
      />
    </Page>
  );
}
