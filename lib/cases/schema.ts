import { z } from "zod";
import { FindingSchema } from "@/lib/findings/schema";

export const REFERENCE_BASES = ["construction", "cover-test", "measured-photograph", "panel", "one-expert"] as const;
export type ReferenceBasis = (typeof REFERENCE_BASES)[number];

export const REFERENCE_BASIS_NAMES: Record<ReferenceBasis, string> = {
  construction: "Known by construction (drawn eyes)",
  "cover-test": "Simultaneous prism cover test",
  "measured-photograph": "Measured on the photograph",
  panel: "Expert panel",
  "one-expert": "One expert",
};

export const CONSENTS = ["patient-consent", "drawn"] as const;

const CodeSchema = z
  .string()
  .trim()
  .regex(/^[A-Za-z0-9][A-Za-z0-9._-]{0,23}$/, "Give a code of 1 to 24 letters, digits, dots or dashes, such as 031.");

export const NewReference = z.strictObject({
  finding: FindingSchema,
  basis: z.enum(REFERENCE_BASES, "Choose what the reference rests on."),
  /** Standard uncertainty of the reference in degrees. */
  uncertaintyDegrees: z.number().min(0).max(45).nullable().default(null),
});

/** The fields that travel with an uploaded photograph. */
export const NewCase = z.strictObject({
  code: CodeSchema,
  note: z.string().trim().max(500, "Keep the note under 500 characters.").default(""),
  isAnchor: z.boolean().default(false),
  consent: z.enum(CONSENTS, "Confirm the consent for this use, or that the eyes are drawn."),
  reference: NewReference,
});
export type NewCase = z.infer<typeof NewCase>;

export const ReferenceRevision = NewReference.extend({
  reason: z.string().trim().min(3, "Say in a few words why the reference changes.").max(500),
});
export type ReferenceRevision = z.infer<typeof ReferenceRevision>;

export const CaseChange = z
  .strictObject({ note: z.string().trim().max(500), isAnchor: z.boolean(), isRetired: z.boolean() })
  .partial();
export type CaseChange = z.infer<typeof CaseChange>;

export const CASE_KINDS = ["aligned", "eso", "exo", "vertical", "combined", "not-readable"] as const;
export type CaseKind = (typeof CASE_KINDS)[number];

export const CaseFilter = z.strictObject({
  /** Part of a code or note. */
  q: z.string().trim().max(100).default(""),
  kind: z.enum(CASE_KINDS).optional(),
  anchors: z.enum(["only"]).optional(),
  retired: z.enum(["only", "with"]).optional(),
});
export type CaseFilter = z.infer<typeof CaseFilter>;

export const CaseParams = z.object({ caseId: z.uuid() });

export const CaseSummarySchema = z.object({
  id: z.uuid(),
  code: z.string(),
  note: z.string(),
  isAnchor: z.boolean(),
  isRetired: z.boolean(),
  finding: FindingSchema,
  lastRoundNumber: z.number().nullable(),
  photographHref: z.string(),
});
export type CaseSummary = z.infer<typeof CaseSummarySchema>;
export const CaseListSchema = z.object({ cases: z.array(CaseSummarySchema), total: z.number() });

export const ReferenceSchema = z.object({
  revision: z.number(),
  finding: FindingSchema,
  basis: z.enum(REFERENCE_BASES),
  uncertaintyDegrees: z.number().nullable(),
  reason: z.string(),
  createdAt: z.string(),
  createdBy: z.string().nullable(),
});
export type Reference = z.infer<typeof ReferenceSchema>;

export const CaseDetailSchema = CaseSummarySchema.extend({
  width: z.number(),
  height: z.number(),
  originalName: z.string(),
  consent: z.enum(CONSENTS),
  createdAt: z.string(),
  /** Newest first. */
  references: z.array(ReferenceSchema),
  rounds: z.array(z.object({ id: z.uuid(), number: z.number(), title: z.string(), state: z.string() })),
});
export type CaseDetail = z.infer<typeof CaseDetailSchema>;
