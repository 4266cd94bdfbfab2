import { ALIGNED, type Degrees, type Finding, type ReadableFinding, type UnreadableReason } from "@/lib/reflex/finding";

/** A finding in the making: undefined is a question not answered yet. */
export type DraftFinding =
  | { isReadable: false; reason?: UnreadableReason }
  | {
      isReadable: true;
      eye?: ReadableFinding["eye"];
      horizontal?: ReadableFinding["horizontal"];
      horizontalDegrees?: Degrees;
      vertical?: ReadableFinding["vertical"];
      verticalDegrees?: Degrees;
    };

export const EMPTY_DRAFT: DraftFinding = { isReadable: true };

export type Answer =
  | { question: "eye"; value: ReadableFinding["eye"] }
  | { question: "horizontal"; value: ReadableFinding["horizontal"] }
  | { question: "vertical"; value: ReadableFinding["vertical"] }
  | { question: "horizontalDegrees" | "verticalDegrees"; value: Degrees }
  | { question: "readable"; value: boolean }
  | { question: "reason"; value: UnreadableReason };

/**
 * The draft after one answer. No sequence of answers makes an impossible finding: neither eye takes the directions
 * away, a direction taken away takes its degrees, and degrees without a direction are not taken.
 */
export function answer(draft: DraftFinding, given: Answer): DraftFinding {
  if (given.question === "readable") return given.value ? EMPTY_DRAFT : { isReadable: false };
  if (given.question === "reason") return { isReadable: false, reason: given.value };
  const readable = draft.isReadable ? draft : { isReadable: true as const };
  switch (given.question) {
    case "eye":
      return given.value === "none" ? fromFinding(ALIGNED) : answerEye(readable, given.value);
    case "horizontal":
      return withPart(readable, { horizontal: given.value }, given.value === "none" ? ["horizontalDegrees"] : []);
    case "vertical":
      return withPart(readable, { vertical: given.value }, given.value === "none" ? ["verticalDegrees"] : []);
    case "horizontalDegrees":
      return isDirection(readable.horizontal) ? { ...readable, horizontalDegrees: given.value } : readable;
    case "verticalDegrees":
      return isDirection(readable.vertical) ? { ...readable, verticalDegrees: given.value } : readable;
  }
}

type ReadableDraft = Extract<DraftFinding, { isReadable: true }>;

/** Coming from neither eye, the directions must be asked again; between the eyes they stay. */
function answerEye(draft: ReadableDraft, eye: "right" | "left"): DraftFinding {
  return draft.eye === "none" ? { isReadable: true, eye } : { ...draft, eye };
}

/** Sets a direction; neither eye no longer fits once one deviates. */
function withPart(
  draft: ReadableDraft,
  part: Pick<ReadableDraft, "horizontal" | "vertical">,
  cleared: ("horizontalDegrees" | "verticalDegrees")[],
): DraftFinding {
  const next = { ...draft, ...part };
  for (const field of cleared) delete next[field];
  const deviates = isDirection(next.horizontal) || isDirection(next.vertical);
  if (deviates && next.eye === "none") delete next.eye;
  return next;
}

function isDirection(part: string | undefined): boolean {
  return part !== undefined && part !== "none";
}

/** The finding of a draft, or what is still missing, in the order in which it is asked. */
export function completeDraft(draft: DraftFinding): { finding: Finding } | { missing: string[] } {
  if (!draft.isReadable) {
    return draft.reason
      ? { finding: { readable: false, reason: draft.reason } }
      : { missing: ["why it cannot be read"] };
  }
  const { eye, horizontal, vertical, horizontalDegrees, verticalDegrees } = draft;
  const missing = [
    eye === undefined && "which eye deviates",
    horizontal === undefined && "the horizontal part",
    vertical === undefined && "the vertical part",
    isDirection(horizontal) && horizontalDegrees === undefined && "the horizontal degrees",
    isDirection(vertical) && verticalDegrees === undefined && "the vertical degrees",
    eye !== undefined && eye !== "none" && horizontal === "none" && vertical === "none" && "a direction for that eye",
  ].filter((part) => part !== false);
  if (missing.length > 0 || !eye || !horizontal || !vertical) return { missing };
  return {
    finding: {
      readable: true,
      eye,
      horizontal,
      horizontalDegrees: horizontalDegrees ?? null,
      vertical,
      verticalDegrees: verticalDegrees ?? null,
    },
  };
}

/** A stored finding as a draft, to be changed. */
export function fromFinding(finding: Finding): DraftFinding {
  if (!finding.readable) return { isReadable: false, reason: finding.reason };
  const { eye, horizontal, vertical, horizontalDegrees, verticalDegrees } = finding;
  return {
    isReadable: true,
    eye,
    horizontal,
    vertical,
    ...(horizontalDegrees !== null && { horizontalDegrees }),
    ...(verticalDegrees !== null && { verticalDegrees }),
  };
}
