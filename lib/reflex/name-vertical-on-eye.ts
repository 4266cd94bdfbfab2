import type { Eye, Finding, ReadableFinding, Vertical } from "./finding";

/** A deviation without horizontal part: which eye it is named on says who fixes, not how the eyes stand. */
export function isPurelyVertical(finding: Finding): finding is ReadableFinding & { eye: Eye; vertical: Vertical } {
  return finding.readable && finding.eye !== "none" && finding.horizontal === "none" && finding.vertical !== "none";
}

/**
 * The same purely vertical deviation named on the eye asked for: right hyper (left fixing) is left hypo (right fixing).
 * Every other finding comes back as it is, because a horizontal part fixes the eye. Use it to bring readings to one
 * naming before labels are compared: on the eye of the reference, or on one eye for a whole panel.
 */
export function nameVerticalOnEye(finding: Finding, eye: Eye): Finding {
  if (!isPurelyVertical(finding) || finding.eye === eye) return finding;
  return { ...finding, eye, vertical: oppositeVertical(finding.vertical) };
}

export function oppositeVertical(vertical: Vertical): Vertical {
  return vertical === "hyper" ? "hypo" : "hyper";
}
