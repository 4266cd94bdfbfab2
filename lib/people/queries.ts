import "server-only";
import type { Knex } from "knex";
import type { ReadingRole, Role } from "@/lib/auth/roles";
import type { PersonSummary } from "./schema";

/** Everybody in a department by name. */
export async function listPeople(db: Knex, departmentId: string): Promise<PersonSummary[]> {
  const rows = await db("memberships")
    .join("people", "people.id", "memberships.person_id")
    .where("memberships.department_id", departmentId)
    .orderBy("people.name")
    .select("people.id", "people.name", "people.email", "people.disabled_at", "memberships.roles");
  return rows.map((row) => ({
    id: row.id,
    name: row.name,
    email: row.email,
    roles: row.roles,
    readsAs: readingRole(row.roles),
    isDisabled: row.disabled_at !== null,
  }));
}

/** Of the given people those who can read blind in the department, and in which role. */
export async function readingRolesOf(db: Knex, departmentId: string, ids: string[]): Promise<Map<string, ReadingRole>> {
  const rows = await db("memberships")
    .join("people", "people.id", "memberships.person_id")
    .where("memberships.department_id", departmentId)
    .whereNull("people.disabled_at")
    .whereIn("people.id", ids)
    .select("people.id", "memberships.roles");
  const readers = new Map<string, ReadingRole>();
  for (const { id, roles } of rows) {
    const role = readingRole(roles);
    if (role) readers.set(id, role);
  }
  return readers;
}

/** A person who may open the case library knows the references, so a lead reads no round of the department. */
function readingRole(roles: Role[]): ReadingRole | null {
  if (roles.includes("lead")) return null;
  if (roles.includes("examiner")) return "examiner";
  return roles.includes("trainee") ? "trainee" : null;
}
