import { z } from "zod";
import { CONFIDENCES, FindingSchema } from "@/lib/findings/schema";

export const DeskParams = z.object({ roundId: z.uuid() });
export const DeskItemParams = z.object({ itemId: z.uuid() });

/** A reading as the desk sends it. `saveId` names this save and `revision` counts the saves of this case from 1. */
export const ReadingInput = z.strictObject({
  saveId: z.uuid(),
  revision: z.int().min(1).max(1_000_000),
  finding: FindingSchema,
  confidence: z.enum(CONFIDENCES).nullable().default(null),
  /** Seconds spent on the case so far; kept, never scored. */
  seconds: z.number().min(0).max(100_000).default(0),
});
export type ReadingInput = z.infer<typeof ReadingInput>;

export const SavedReadingSchema = z.object({
  finding: FindingSchema,
  confidence: z.enum(CONFIDENCES).nullable(),
  seconds: z.number(),
  revision: z.number(),
  savedAt: z.string(),
});
export type SavedReading = z.infer<typeof SavedReadingSchema>;

export const DESK_ROUND_STATES = ["waiting", "open", "submitted", "closed", "released"] as const;
export type DeskRoundState = (typeof DESK_ROUND_STATES)[number];

export const DeskRoundSchema = z.object({
  id: z.uuid(),
  number: z.number(),
  title: z.string(),
  /** Where the examiner stands: before the opening, reading, handed in, or after the closing. */
  state: z.enum(DESK_ROUND_STATES),
  opensAt: z.string(),
  closesAt: z.string(),
  submittedAt: z.string().nullable(),
  itemCount: z.number(),
  readCount: z.number(),
});
export type DeskRound = z.infer<typeof DeskRoundSchema>;
export const DeskListSchema = z.object({ rounds: z.array(DeskRoundSchema) });

/** One showing as its examiner sees it: a place, a picture and the own reading. Nothing else is known of it here. */
export const DeskItemSchema = z.object({
  id: z.uuid(),
  place: z.number(),
  pictureHref: z.string(),
  width: z.number(),
  height: z.number(),
  reading: SavedReadingSchema.nullable(),
});
export type DeskItem = z.infer<typeof DeskItemSchema>;

export const DeskSheetSchema = DeskRoundSchema.extend({
  instructions: z.string(),
  convention: z.string(),
  items: z.array(DeskItemSchema),
});
export type DeskSheet = z.infer<typeof DeskSheetSchema>;
