import { z } from "zod";
import { READING_ROLES, ROLES } from "@/lib/auth/roles";

export const PersonSummarySchema = z.object({
  id: z.uuid(),
  name: z.string(),
  email: z.string(),
  roles: z.array(z.enum(ROLES)),
  /** Null for people who cannot read blind: leads, and people without a reading role. */
  readsAs: z.enum(READING_ROLES).nullable(),
  isDisabled: z.boolean(),
});
export type PersonSummary = z.infer<typeof PersonSummarySchema>;
export const PeopleListSchema = z.object({ people: z.array(PersonSummarySchema) });
