import type { DriftMeasure } from "@/lib/drift/schema";

const BIAS_LIMITS = "Centre: the reference. Warning at 2 and action at 3 standard errors of the round’s own bias.";

export const MEASURES: {
  measure: DriftMeasure;
  label: string;
  valueLabel: string;
  format: "kappa" | "degrees";
  limits: string;
}[] = [
  {
    measure: "kappa",
    label: "Kappa",
    valueLabel: "direction kappa",
    format: "kappa",
    limits:
      "Centre: kappa pooled over examiners and rounds; warning 2 and action 3 standard errors below it. Only a fall counts.",
  },
  {
    measure: "size",
    label: "Size",
    valueLabel: "bias of the size, degrees, where the direction agrees",
    format: "degrees",
    limits: BIAS_LIMITS,
  },
  {
    measure: "horizontal",
    label: "Horizontal bias",
    valueLabel: "bias, horizontal, degrees (eso +)",
    format: "degrees",
    limits: BIAS_LIMITS,
  },
  {
    measure: "vertical",
    label: "Vertical bias",
    valueLabel: "bias, vertical, degrees (right over left +)",
    format: "degrees",
    limits: BIAS_LIMITS,
  },
];

export function measureOf(measure: DriftMeasure) {
  const found = MEASURES.find((each) => each.measure === measure);
  if (!found) throw new RangeError(`There is no measure ${measure}.`);
  return found;
}
