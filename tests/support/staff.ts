import type { Knex } from "knex";
import { ROLES, type Role } from "@/lib/auth/roles";
import { makeDepartment, makePerson, type TestPerson } from "./world";

/** One person for each role. */
export type Staff = Record<Role, TestPerson>;

export async function makeStaff(db: Knex, departmentId: string): Promise<Staff> {
  const [lead, examiner, trainee, reviewer, admin] = await Promise.all(
    ROLES.map((role) => makePerson(db, departmentId, [role])),
  );
  if (!lead || !examiner || !trainee || !reviewer || !admin) throw new Error("A role is missing.");
  return { lead, examiner, trainee, reviewer, admin };
}

/** Two departments with somebody in every role, each. */
export type TwoDepartments = { own: Staff; other: Staff };

export async function makeTwoDepartments(db: Knex): Promise<TwoDepartments> {
  return {
    own: await makeStaff(db, await makeDepartment(db)),
    other: await makeStaff(db, await makeDepartment(db)),
  };
}
