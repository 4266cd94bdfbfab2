import "server-only";
import type { Knex } from "knex";
import type { Actor } from "./actor";
import { findPersonWithMemberships } from "./queries";
import { ROLES } from "./roles";
import type { View } from "./view";

export type Session = { personId: string; sessionVersion: number };

/** The actor of a session, or null when the session no longer holds. */
export async function loadActor(db: Knex, session: Session, view: View | null): Promise<Actor | null> {
  const rows = await findPersonWithMemberships(db, session.personId, session.sessionVersion);
  const wished = rows.find((row) => row.department_id === view?.departmentId && row.roles.includes(view.role));
  const row = wished ?? rows[0];
  if (!row) return null;
  const role = wished && view ? view.role : ROLES.find((candidate) => row.roles.includes(candidate));
  if (!role) return null;
  return {
    id: row.id,
    name: row.name,
    email: row.email,
    theme: row.theme,
    departmentId: row.department_id,
    departmentName: row.department_name,
    timeZone: row.time_zone,
    role,
    memberships: rows.map(({ department_id, department_name, roles }) => ({
      departmentId: department_id,
      departmentName: department_name,
      roles: ROLES.filter((candidate) => roles.includes(candidate)),
    })),
  };
}
