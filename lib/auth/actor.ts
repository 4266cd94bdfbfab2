import type { Role } from "./roles";

export type Membership = { departmentId: string; departmentName: string; roles: Role[] };

/** Who is asking: a person acting in one department and one role, read from the database for this request. */
export type Actor = {
  id: string;
  name: string;
  email: string;
  theme: "system" | "light" | "dark";
  departmentId: string;
  departmentName: string;
  timeZone: string;
  role: Role;
  /** Everything the person could switch to. */
  memberships: Membership[];
};
