import { z } from "zod";
import type { View } from "./load-actor";
import { ROLES } from "./roles";

export const VIEW_COOKIE = "evenglint-view";

export const ViewSchema = z.strictObject({ departmentId: z.uuid(), role: z.enum(ROLES) });

export function writeView({ departmentId, role }: View): string {
  return `${departmentId}.${role}`;
}

export function readView(value: string | undefined): View | null {
  const [departmentId, role] = value?.split(".") ?? [];
  const parsed = ViewSchema.safeParse({ departmentId, role });
  return parsed.success ? parsed.data : null;
}
