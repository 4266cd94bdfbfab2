import "server-only";
import type { Knex } from "knex";
import type { Actor } from "./actor";
import type { Role } from "./roles";

export type Credentials = { id: string; passwordHash: string; sessionVersion: number };

export async function findCredentials(db: Knex, email: string): Promise<Credentials | null> {
  const row = await db("people")
    .whereRaw("lower(email) = lower(?)", [email])
    .whereNull("disabled_at")
    .first("id", "password_hash", "session_version");
  return row ? { id: row.id, passwordHash: row.password_hash, sessionVersion: row.session_version } : null;
}

type PersonRow = {
  id: string;
  name: string;
  email: string;
  theme: Actor["theme"];
  department_id: string;
  department_name: string;
  time_zone: string;
  roles: Role[];
};

/** The person with every membership, one row each; none when signed out everywhere, disabled or without a department. */
export function findPersonWithMemberships(db: Knex, personId: string, sessionVersion: number): Promise<PersonRow[]> {
  return db("people")
    .join("memberships", "memberships.person_id", "people.id")
    .join("departments", "departments.id", "memberships.department_id")
    .where({ "people.id": personId, "people.session_version": sessionVersion })
    .whereNull("people.disabled_at")
    .orderBy(["departments.name", "departments.id"])
    .select(
      "people.id",
      "people.name",
      "people.email",
      "people.theme",
      "memberships.department_id",
      "memberships.roles",
      "departments.name as department_name",
      "departments.time_zone",
    );
}

export async function setTheme(db: Knex, personId: string, theme: Actor["theme"]): Promise<void> {
  await db("people").where({ id: personId }).update({ theme });
}
