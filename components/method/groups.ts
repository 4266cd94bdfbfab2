import { BIAS_ENTRIES } from "./bias-entries";
import { DEGREES_ENTRIES } from "./degrees-entries";
import { DRIFT_ENTRIES } from "./drift-entries";
import { KAPPA_ENTRIES } from "./kappa-entries";
import type { MethodGroup } from "./method-entry";
import { OPTICS_ENTRIES } from "./optics-entries";
import { PANEL_ENTRIES } from "./panel-entries";
import { PRECISION_ENTRIES } from "./precision-entries";
import { SCORING_ENTRIES } from "./scoring-entries";

/** The page Method, in reading order. Its examples are computed when this is first loaded, and not for every visit. */
export const METHOD_GROUPS: readonly MethodGroup[] = [
  { id: "direction-and-steps", title: "Direction and steps", entries: KAPPA_ENTRIES },
  { id: "panel", title: "Several examiners", entries: PANEL_ENTRIES },
  { id: "degrees", title: "Degrees", entries: DEGREES_ENTRIES },
  { id: "precision", title: "How sure a figure is", entries: PRECISION_ENTRIES },
  { id: "bias", title: "Systematic error", entries: BIAS_ENTRIES },
  { id: "drift", title: "From round to round", entries: DRIFT_ENTRIES },
  { id: "scoring", title: "Rules of scoring", entries: SCORING_ENTRIES },
  { id: "optics", title: "Optics and conventions", entries: OPTICS_ENTRIES },
];
