import { z } from "zod";

export const ROUND_STATES = ["draft", "open", "closed", "released"] as const;
export type RoundState = (typeof ROUND_STATES)[number];

export const ITEM_KINDS = ["first", "repeat", "mirrored"] as const;
export type ItemKind = (typeof ITEM_KINDS)[number];

export const ITEMS_MAX = 300;
export const EXAMINERS_MAX = 1000;

export const RoundParams = z.object({ roundId: z.uuid() });

const TitleSchema = z.string().trim().min(1, "Give the round a title.").max(80, "Keep the title under 80 characters.");

export const NewRound = z.strictObject({ title: TitleSchema });

/** A draft as the composer sends it, whole. It may be incomplete; publishing says what is missing. */
export const RoundDraft = z
  .strictObject({
    title: TitleSchema,
    instructions: z.string().trim().max(2000, "Keep the instructions under 2,000 characters."),
    opensAt: z.iso.datetime({ offset: true, error: "Give the opening day and time." }).nullable(),
    closesAt: z.iso.datetime({ offset: true, error: "Give the closing day and time." }).nullable(),
    items: z.array(z.strictObject({ caseId: z.uuid(), kind: z.enum(ITEM_KINDS) })).max(ITEMS_MAX),
    examinerIds: z.array(z.uuid()).max(EXAMINERS_MAX),
  })
  .superRefine((draft, context) => {
    if (draft.opensAt && draft.closesAt && new Date(draft.closesAt) <= new Date(draft.opensAt)) {
      context.addIssue({ code: "custom", path: ["closesAt"], message: "The round must close after it opens." });
    }
    const firsts = draft.items.filter(({ kind }) => kind === "first").map(({ caseId }) => caseId);
    if (new Set(firsts).size < firsts.length) {
      context.addIssue({ code: "custom", path: ["items"], message: "A case is chosen twice; mark one as a repeat." });
    }
    if (draft.items.some(({ kind, caseId }) => kind !== "first" && !firsts.includes(caseId))) {
      context.addIssue({ code: "custom", path: ["items"], message: "A repeat needs its case in the round as well." });
    }
    if (new Set(draft.examinerIds).size < draft.examinerIds.length) {
      context.addIssue({ code: "custom", path: ["examinerIds"], message: "An examiner is chosen twice." });
    }
  });
export type RoundDraft = z.infer<typeof RoundDraft>;

export const StateChange = z.strictObject({ to: z.enum(["open", "closed", "released"]) });

export const RoundSummarySchema = z.object({
  id: z.uuid(),
  number: z.number(),
  title: z.string(),
  state: z.enum(ROUND_STATES),
  opensAt: z.string().nullable(),
  closesAt: z.string().nullable(),
  closedAt: z.string().nullable(),
  releasedAt: z.string().nullable(),
  itemCount: z.number(),
  examinerCount: z.number(),
  submittedCount: z.number(),
  readingCount: z.number(),
});
export type RoundSummary = z.infer<typeof RoundSummarySchema>;
export const RoundListSchema = z.object({ rounds: z.array(RoundSummarySchema) });

export const RoundDetailSchema = RoundSummarySchema.extend({
  instructions: z.string(),
  convention: z.string(),
  items: z.array(z.object({ caseId: z.uuid(), kind: z.enum(ITEM_KINDS) })),
  examinerIds: z.array(z.uuid()),
  updatedAt: z.string(),
});
export type RoundDetail = z.infer<typeof RoundDetailSchema>;

/** Who has read how many, and nothing of what was read. */
export const RoundProgressSchema = z.object({
  state: z.enum(ROUND_STATES),
  itemCount: z.number(),
  hasResults: z.boolean(),
  examiners: z.array(
    z.object({
      personId: z.uuid(),
      name: z.string(),
      assignedAs: z.enum(["examiner", "trainee"]),
      openedAt: z.string().nullable(),
      readCount: z.number(),
      lastSavedAt: z.string().nullable(),
      submittedAt: z.string().nullable(),
    }),
  ),
});
export type RoundProgress = z.infer<typeof RoundProgressSchema>;
