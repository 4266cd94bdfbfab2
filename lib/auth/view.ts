import { z } from "zod";
import { ROLES } from "./roles";

export const VIEW_COOKIE = "evenglint-view";

/** The department and role a person chose last. Only a wish: it counts where the database grants it. */
export const ViewSchema = z.strictObject({ departmentId: z.uuid(), role: z.enum(ROLES) });
export type View = z.infer<typeof ViewSchema>;

export function writeView({ departmentId, role }: View): string {
  return `${departmentId}.${role}`;
}

export function readView(value: string | undefined): View | null {
  const [departmentId, role] = value?.split(".") ?? [];
  const parsed = ViewSchema.safeParse({ departmentId, role });
  return parsed.success ? parsed.data : null;
}
