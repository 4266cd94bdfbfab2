import { ALIGNED, type Eye, type Finding, type Horizontal, type ReadableFinding, type Vertical } from "./finding";
import { oppositeVertical } from "./name-vertical-on-eye";
import { parseUnreadable } from "./parse-unreadable";
import { type ShorthandPart, shorthandParts } from "./shorthand-parts";
import { readTypedSize, type TypedSize } from "./typed-size";

/** The sizes as typed, with the unit typed; null where there is no such part. */
export type TypedSizes = { horizontal: TypedSize | null; vertical: TypedSize | null };

export type ParsedShorthand =
  /** `note` tells the person how the text was taken where it was not taken word for word. */
  | { ok: true; finding: Finding; typed: TypedSizes; note: string | null }
  /** `isIncomplete`: nothing is wrong so far, and something is missing. */
  | { ok: false; reason: string; isIncomplete: boolean };

const NOTHING_TYPED: TypedSizes = { horizontal: null, vertical: null };
const ALIGNED_WORDS = /^(ortho(tropi[ac])?|aligned|straight|none|neither( eye)?( deviates)?|no deviation)\.?$/i;

/**
 * Reads a finding as a person types it: `lxt 30`, `RHT 15°`, `LXT 30° LHoT 15°`, `lds 30`, `left exo 30 hypo 15`,
 * `ret >45`, `lxt 30Δ`, `ortho`, `nr blurred`. A bare number is degrees. Where the two parts name different eyes, the
 * horizontal part fixes the eye and the vertical one is renamed to it: `rht 15 let 30` is a left eso with left hypo.
 */
export function parseShorthand(text: string): ParsedShorthand {
  const typed = text.trim();
  if (typed === "") return refuse("Write a finding, for example LXT 30, RHT 15 or ortho.", true);
  if (ALIGNED_WORDS.test(typed)) return { ok: true, finding: ALIGNED, typed: NOTHING_TYPED, note: null };
  const unreadable = parseUnreadable(typed);
  if (unreadable?.ok) return { ok: true, finding: unreadable.finding, typed: NOTHING_TYPED, note: null };
  if (unreadable) return unreadable;
  const read = shorthandParts(typed);
  if (!read.ok) return read;
  const { horizontal, vertical } = read;
  const eye = horizontal?.eye ?? vertical?.eye;
  if (!eye) return refuse("Write a finding, for example LXT 30, RHT 15 or ortho.", true);
  return deviation(eye, horizontal, vertical);
}

function deviation(
  eye: Eye,
  horizontal: ShorthandPart<Horizontal> | null,
  vertical: ShorthandPart<Vertical> | null,
): ParsedShorthand {
  const horizontalSize = horizontal && readTypedSize(horizontal.size);
  const verticalSize = vertical && readTypedSize(vertical.size);
  if (horizontalSize?.ok === false) return refuse(horizontalSize.reason, false);
  if (verticalSize?.ok === false) return refuse(verticalSize.reason, false);
  const isRenamed = vertical !== null && vertical.eye !== eye;
  const finding: ReadableFinding = {
    ...ALIGNED,
    eye,
    horizontal: horizontal?.direction ?? "none",
    horizontalDegrees: horizontalSize?.degrees ?? null,
    vertical: vertical ? (isRenamed ? oppositeVertical(vertical.direction) : vertical.direction) : "none",
    verticalDegrees: verticalSize?.degrees ?? null,
  };
  return {
    ok: true,
    finding,
    typed: { horizontal: horizontal?.size ?? null, vertical: vertical?.size ?? null },
    note: isRenamed ? renamedNote(vertical.eye, vertical.direction, eye) : null,
  };
}

function renamedNote(typedEye: Eye, direction: Vertical, eye: Eye): string {
  const typed = `${typedEye} ${direction}`;
  const taken = `${eye} ${oppositeVertical(direction)}`;
  return `Taken ${typed} as ${taken}, the same deviation, because the horizontal part is in the ${eye} eye.`;
}

function refuse(reason: string, isIncomplete: boolean): ParsedShorthand {
  return { ok: false, reason, isIncomplete };
}
