/** The patient's eye. Facing the patient, the right eye stands on the viewer's left. */
export type Eye = "right" | "left";
export type Horizontal = "eso" | "exo";
export type Vertical = "hyper" | "hypo";

/** Whole degrees from 1 to 45, or beyond the limbus: a censored value, never the number 45 or 46. */
export type Degrees = number | ">45";

export const DEGREES_MAX = 45;
export const BEYOND_LIMBUS = ">45";

export const UNREADABLE_REASONS = [
  "blurred",
  "reflex-hidden",
  "pupil-not-visible",
  "not-fixating",
  "irregular-pupil",
  "needs-cover-test",
  "other",
] as const;
export type UnreadableReason = (typeof UNREADABLE_REASONS)[number];

/** What a person can say of one photograph: readable with a deviation or none, or not readable and why. */
export type ReadableFinding = {
  readable: true;
  /** The eye that deviates; `none` exactly when both parts are `none`. */
  eye: Eye | "none";
  horizontal: Horizontal | "none";
  /** Set exactly when `horizontal` is not `none`. */
  horizontalDegrees: Degrees | null;
  vertical: Vertical | "none";
  /** Set exactly when `vertical` is not `none`. */
  verticalDegrees: Degrees | null;
};
export type UnreadableFinding = { readable: false; reason: UnreadableReason };
export type Finding = ReadableFinding | UnreadableFinding;

export const ALIGNED: ReadableFinding = {
  readable: true,
  eye: "none",
  horizontal: "none",
  horizontalDegrees: null,
  vertical: "none",
  verticalDegrees: null,
};

/** One broken rule of a finding: the field it is about and a sentence that says what to change. */
export type FindingFault = { field: keyof ReadableFinding | "reason"; message: string };

/** Every rule that a finding breaks, in the order a person would mend them; empty when it is sound. */
export function findingFaults(finding: Finding): FindingFault[] {
  if (!finding.readable) {
    return UNREADABLE_REASONS.includes(finding.reason)
      ? []
      : [{ field: "reason", message: "Choose why the photograph cannot be read." }];
  }
  const faults: FindingFault[] = [];
  const deviates = finding.horizontal !== "none" || finding.vertical !== "none";
  if (finding.eye === "none" && deviates) {
    faults.push({ field: "eye", message: "Choose the eye that deviates, or set both directions to none." });
  }
  if (finding.eye !== "none" && !deviates) {
    faults.push({ field: "horizontal", message: "Choose a direction for the deviating eye, or choose neither eye." });
  }
  faults.push(...degreesFaults("horizontal", finding.horizontal, finding.horizontalDegrees));
  faults.push(...degreesFaults("vertical", finding.vertical, finding.verticalDegrees));
  return faults;
}

function degreesFaults(part: "horizontal" | "vertical", direction: string, degrees: Degrees | null): FindingFault[] {
  const field = part === "horizontal" ? "horizontalDegrees" : "verticalDegrees";
  if (direction === "none") {
    return degrees === null ? [] : [{ field, message: `Degrees need a ${part} direction: choose one, or clear them.` }];
  }
  if (degrees === null) return [{ field, message: `Say how many degrees the ${part} part has.` }];
  if (degrees === BEYOND_LIMBUS) return [];
  if (Number.isInteger(degrees) && degrees >= 1 && degrees <= DEGREES_MAX) return [];
  return [{ field, message: `Degrees are whole numbers from 1 to ${DEGREES_MAX}, or >45 beyond the limbus.` }];
}
