import { z } from "zod";
import { BEYOND_LIMBUS, DEGREES_MAX, type Finding, findingFaults, UNREADABLE_REASONS } from "@/lib/reflex/finding";

/** Which numbers they may be is a rule of the finding; checked here as well, it would be reported twice. */
const DegreesSchema = z.union([z.literal(BEYOND_LIMBUS), z.number()], {
  error: `Degrees are whole numbers from 1 to ${DEGREES_MAX}, or >45 beyond the limbus.`,
});

const ShapeSchema = z.discriminatedUnion("readable", [
  z.strictObject({
    readable: z.literal(true),
    eye: z.enum(["none", "right", "left"]),
    horizontal: z.enum(["none", "eso", "exo"]),
    horizontalDegrees: DegreesSchema.nullable(),
    vertical: z.enum(["none", "hyper", "hypo"]),
    verticalDegrees: DegreesSchema.nullable(),
  }),
  z.strictObject({ readable: z.literal(false), reason: z.enum(UNREADABLE_REASONS) }),
]);

/** A finding that keeps every rule of the reading; each broken rule is reported at its field. */
export const FindingSchema = ShapeSchema.superRefine((finding: Finding, context) => {
  for (const { field, message } of findingFaults(finding)) {
    context.addIssue({ code: "custom", path: [field], message });
  }
});

export const CONFIDENCES = ["sure", "fairly-sure", "unsure"] as const;
export type Confidence = (typeof CONFIDENCES)[number];
