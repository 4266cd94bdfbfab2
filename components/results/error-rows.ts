import { ERROR_KINDS, type ErrorKind } from "@/lib/reflex/error-kind";

const HINTS: Record<ErrorKind, string> = {
  "not readable against readable": "One of the two could not be read.",
  "squint called on an aligned pair": "Normal decentration of both reflexes read as a deviation.",
  "squint missed": "The deviation was read as aligned.",
  "horizontal direction reversed": "Eso for exo, or the other way round.",
  "vertical direction reversed": "The higher eye was called the lower one.",
  "other eye": "Right direction, the fellow eye named.",
  "vertical part missed or added": "The vertical part is in one of the two only.",
  "horizontal part missed or added": "The horizontal part is in one of the two only.",
  "unit slip": "Degrees and prism dioptres mixed: about twice or half the size.",
  "size outside tolerance": "Direction right, degrees too far off.",
};

/** Error kinds in their fixed order with their counts summed, those that occurred only. */
export function errorRows(counts: readonly Record<string, number>[]) {
  return ERROR_KINDS.map((kind) => ({
    kind,
    label: kind.charAt(0).toUpperCase() + kind.slice(1),
    hint: HINTS[kind],
    count: counts.reduce((sum, each) => sum + (each[kind] ?? 0), 0),
  })).filter(({ count }) => count > 0);
}
