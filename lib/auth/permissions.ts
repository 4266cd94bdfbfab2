import { AppError } from "@/lib/errors";
import type { Actor } from "./actor";
import { ROLE_NAMES, type Role } from "./roles";

const PERMISSIONS = {
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
} as const satisfies Record<string, readonly Role[]>;

export type Permission = keyof typeof PERMISSIONS;

export function rolesWith(permission: Permission): readonly Role[] {
  return PERMISSIONS[permission];
}

export function can(actor: Pick<Actor, "role">, permission: Permission): boolean {
  return rolesWith(permission).includes(actor.role);
}

export function requirePermission(actor: Actor, permission: Permission): void {
  if (can(actor, permission)) return;
  throw new AppError("forbidden", "wrong-role", `This is not open to you as ${ROLE_NAMES[actor.role].toLowerCase()}.`);
}
