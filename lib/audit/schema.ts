import { z } from "zod";

/** `before`: the id of an event, for the page of events before it. */
export const AuditFilter = z.strictObject({
  before: z
    .string()
    .regex(/^\d{1,18}$/, "Give the id of an event.")
    .optional(),
});

export const AuditListSchema = z.object({
  events: z.array(
    z.object({
      id: z.string(),
      at: z.string(),
      /** Null when the program acted by itself. */
      actor: z.string().nullable(),
      action: z.string(),
      /** What it happened to, in words a person knows: a case code or a round number. */
      target: z.string(),
    }),
  ),
});
export type AuditEntry = z.infer<typeof AuditListSchema>["events"][number];
