import type { Finding } from "./finding";

/**
 * What a photograph flipped left to right shows: each direction stays, because nasal stays nasal and up stays up;
 * the eye changes. So eso stays eso, and right over left becomes left over right.
 */
export function mirrorFinding(finding: Finding): Finding {
  if (!finding.readable || finding.eye === "none") return finding;
  return { ...finding, eye: finding.eye === "right" ? "left" : "right" };
}
