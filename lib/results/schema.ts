import { z } from "zod";
import { FindingSchema } from "@/lib/findings/schema";

/** Raised whenever a figure would come out differently from the same readings. Stored with every result. */
export const METHOD_VERSION = "1";

/** With fewer readings behind it a kappa or a limit is shown greyed, as too few to say. */
export const READINGS_FEW = 20;

export const EstimateSchema = z.object({
  estimate: z.number(),
  standardError: z.number().optional(),
  low: z.number().optional(),
  high: z.number().optional(),
});

const RefusalSchema = z.object({ ok: z.literal(false), n: z.number(), reason: z.string() });

/** A statistic as lib/statistics gives it: its parts, or the reason why there are none. */
function statistic<Shape extends z.ZodRawShape>(shape: Shape) {
  return z.discriminatedUnion("ok", [z.object({ ok: z.literal(true), n: z.number(), ...shape }), RefusalSchema]);
}

const ShareSchema = statistic({ share: EstimateSchema });

const LimitsSchema = statistic({
  bias: EstimateSchema,
  sd: z.number(),
  lower: EstimateSchema,
  upper: EstimateSchema,
});

/** Why pairs are missing from a figure in degrees; the screens say it beside the figure. */
export const LeftOutSchema = z.object({
  unread: z.number(),
  notReadable: z.number(),
  beyondLimbus: z.number(),
  /** Of sizes only: the direction differs, or the reference is aligned and has no size. */
  otherDirection: z.number(),
});

const DegreesFiguresSchema = z.object({ limits: LimitsSchema, leftOut: LeftOutSchema });

/** One case of one examiner in degrees: signed components, or the size where the direction agrees. */
const PairSchema = z.object({ reading: z.number(), reference: z.number() });

export const ExaminerFiguresSchema = z.object({
  /** Cases that count against the reference: one showing of each. Hidden repeats are compared with their twin only. */
  caseCount: z.number(),
  readCount: z.number(),
  repeatCount: z.number(),
  kappa: statistic({ kappa: EstimateSchema, observed: z.number(), expected: z.number() }),
  observedAgreement: ShareSchema,
  stepsLinear: statistic({ kappa: EstimateSchema }),
  stepsQuadratic: statistic({ kappa: EstimateSchema }),
  horizontal: DegreesFiguresSchema,
  vertical: DegreesFiguresSchema,
  size: DegreesFiguresSchema,
  withinTolerance: ShareSchema,
  confusion: z.object({ categories: z.array(z.string()), counts: z.array(z.array(z.number())) }),
  errorCounts: z.record(z.string(), z.number()),
  /** Purely vertical deviations named on the other eye: said, and no wrong direction. */
  namedOnOtherEye: z.number(),
  items: z.array(
    z.object({
      itemId: z.uuid(),
      error: z.string().nullable(),
      horizontal: PairSchema.nullable(),
      vertical: PairSchema.nullable(),
      size: PairSchema.nullable(),
    }),
  ),
});
export type ExaminerFigures = z.infer<typeof ExaminerFiguresSchema>;
export type DegreesFigures = z.infer<typeof DegreesFiguresSchema>;
export type LeftOut = z.infer<typeof LeftOutSchema>;

/** Everybody's readings together, against the reference and among each other. Intervals resample the cases. */
export const PanelFiguresSchema = z.object({
  examinerCount: z.number(),
  readCount: z.number(),
  kappa: statistic({ kappa: EstimateSchema }),
  horizontal: LimitsSchema,
  vertical: LimitsSchema,
  size: LimitsSchema,
  amongExaminers: statistic({ kappa: EstimateSchema }),
  confusion: z.object({ categories: z.array(z.string()), counts: z.array(z.array(z.number())) }),
});
export type PanelFigures = z.infer<typeof PanelFiguresSchema>;

export const RoundResultsSchema = z.object({
  round: z.object({ id: z.uuid(), number: z.number(), title: z.string(), state: z.string(), convention: z.string() }),
  revision: z.number(),
  methodVersion: z.string(),
  reason: z.string(),
  computedAt: z.string(),
  kappaFloor: z.number(),
  panel: PanelFiguresSchema,
  examiners: z.array(
    z.object({
      personId: z.uuid(),
      name: z.string(),
      assignedAs: z.enum(["examiner", "trainee"]),
      submittedAt: z.string().nullable(),
      figures: ExaminerFiguresSchema,
    }),
  ),
  cases: z.array(
    z.object({
      itemId: z.uuid(),
      caseId: z.uuid(),
      code: z.string(),
      kind: z.enum(["first", "repeat", "mirrored"]),
      reference: FindingSchema,
      readCount: z.number(),
      agreedCount: z.number(),
    }),
  ),
});
export type RoundResults = z.infer<typeof RoundResultsSchema>;

/** Results are computed after the closing; until they are there the screen waits. */
export const RoundResultsAnswerSchema = z.object({ results: RoundResultsSchema.nullable() });

/** A released round as one examiner may see it: own figures, and each case with own reading and reference. */
export const ScorecardSchema = z.object({
  round: z.object({ id: z.uuid(), number: z.number(), title: z.string(), convention: z.string() }),
  releasedAt: z.string(),
  kappaFloor: z.number(),
  figures: ExaminerFiguresSchema,
  earlier: z.array(z.object({ number: z.number(), kappa: z.number() })),
  cases: z.array(
    z.object({
      id: z.uuid(),
      place: z.number(),
      /** Shown again in a round that is still sealed: neither photograph nor reference is given until then. */
      isSealed: z.boolean(),
      pictureHref: z.string().nullable(),
      width: z.number(),
      height: z.number(),
      reading: FindingSchema.nullable(),
      reference: FindingSchema.nullable(),
      error: z.string().nullable(),
      /** A second showing of another case in this round, by its place. */
      repeatOfPlace: z.number().nullable(),
      isMirrored: z.boolean(),
    }),
  ),
});
export type Scorecard = z.infer<typeof ScorecardSchema>;
