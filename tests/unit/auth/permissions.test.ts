import { describe, expect, it } from "vitest";
import type { Actor } from "@/lib/auth/actor";
import { can, type Permission, requirePermission, rolesWith } from "@/lib/auth/permissions";
import { LANDING, READING_ROLES, ROLES, type Role } from "@/lib/auth/roles";

/** Who may do what, written down a second time: a change of a permission has to be meant. */
const GRANTED: Record<Permission, Role[]> = {
  "cases.read": ["lead"],
  "cases.write": ["lead"],
  "rounds.read": ["lead"],
  "rounds.write": ["lead"],
  "rounds.advance": ["lead"],
  "results.read": ["lead", "reviewer"],
  "desk.use": ["examiner", "trainee"],
  "scorecards.read": ["examiner", "trainee"],
  "drift.read": ["lead", "reviewer"],
  "people.read": ["lead", "admin"],
  "audit.read": ["admin"],
};
const actorAs = (role: Role): Actor => ({
  id: "1",
  name: "Somebody",
  email: "somebody@test.example",
  theme: "system",
  departmentId: "2",
  departmentName: "Department",
  timeZone: "UTC",
  role,
  memberships: [{ departmentId: "2", departmentName: "Department", roles: [...ROLES] }],
});
const pairs = Object.entries(GRANTED).flatMap(([permission, roles]) =>
  ROLES.map((role) => ({ permission: permission as Permission, role, isGranted: roles.includes(role) })),
);

describe("permissions", () => {
  it.each(pairs)("$permission for somebody acting as $role: $isGranted", ({ permission, role, isGranted }) => {
    expect(can(actorAs(role), permission)).toBe(isGranted);
    const required = () => requirePermission(actorAs(role), permission);
    if (isGranted) required();
    else expect(required).toThrow(expect.objectContaining({ kind: "forbidden", code: "wrong-role" }));
  });
  it("goes by the role acted in, not by the others a person holds", () => {
    expect(can(actorAs("trainee"), "cases.read")).toBe(false); // holds every role, see above
  });
  it("lets nobody who reads blind see cases, rounds, results or other people", () => {
    const open: Permission[] = ["desk.use", "scorecards.read"];
    for (const { permission, role } of pairs) {
      if (READING_ROLES.some((reading) => reading === role) && !open.includes(permission)) {
        expect(rolesWith(permission)).not.toContain(role);
      }
    }
  });
  it("has a page to land on for every role", () => {
    for (const role of ROLES) expect(LANDING[role]).toMatch(/^\/[a-z]+$/);
  });
});
