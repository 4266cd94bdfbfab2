import { z } from "zod";
import { EstimateSchema } from "@/lib/results/schema";

export const DRIFT_MEASURES = ["kappa", "size", "horizontal", "vertical"] as const;
export type DriftMeasure = (typeof DRIFT_MEASURES)[number];

/** One round on a control chart. Limits belong to the point, since rounds differ in how many readings they rest on. */
const PointSchema = z.object({
  roundId: z.uuid(),
  n: z.number(),
  value: EstimateSchema.optional(),
  /** Limits of agreement around a bias, in degrees. */
  lower: EstimateSchema.optional(),
  upper: EstimateSchema.optional(),
  state: z.enum(["in", "warning", "action", "none"]),
  lowerWarning: z.number().optional(),
  upperWarning: z.number().optional(),
  lowerAction: z.number().optional(),
  upperAction: z.number().optional(),
  /** Why there is no value. */
  reason: z.string().optional(),
});
export type DriftPoint = z.infer<typeof PointSchema>;

const ChartSchema = z.object({ centre: z.number().optional(), points: z.array(PointSchema) });
export type DriftChart = z.infer<typeof ChartSchema>;

const RowSchema = z.object({ kappa: ChartSchema, size: ChartSchema, horizontal: ChartSchema, vertical: ChartSchema });
export type DriftRow = z.infer<typeof RowSchema>;

export const DriftBoardSchema = z.object({
  /** Released rounds, oldest first; every chart has one point for each. */
  rounds: z.array(z.object({ id: z.uuid(), number: z.number(), title: z.string(), closedAt: z.string() })),
  kappaFloor: z.number(),
  panel: RowSchema,
  examiners: z.array(
    RowSchema.extend({ personId: z.uuid(), name: z.string(), assignedAs: z.enum(["examiner", "trainee"]) }),
  ),
});
export type DriftBoard = z.infer<typeof DriftBoardSchema>;
