import type { Eye, Horizontal, Vertical } from "./finding";
import { type ShorthandToken, shorthandTokens } from "./shorthand-tokens";
import type { TypedSize } from "./typed-size";

/** One part as typed, complete: `LXT 30`. */
export type ShorthandPart<Direction> = { eye: Eye; direction: Direction; size: TypedSize };

export type ShorthandParts =
  | { ok: true; horizontal: ShorthandPart<Horizontal> | null; vertical: ShorthandPart<Vertical> | null }
  | { ok: false; reason: string; isIncomplete: boolean };

type Draft = {
  eye: Eye | null;
  direction: Horizontal | Vertical;
  size: Extract<ShorthandToken, { kind: "size" }> | null;
};

/** Puts typed shorthand together into at most one horizontal and one vertical part, or says what is wrong or missing. */
export function shorthandParts(text: string): ShorthandParts {
  const drafts = draftParts(shorthandTokens(text));
  if (!Array.isArray(drafts)) return drafts;
  const sizes = drafts.flatMap(({ size }) => (size && size.value !== ">45" ? [size.unit] : []));
  if (sizes.includes(null) && sizes.includes("prism-dioptres")) {
    return wrong("Write the unit on both numbers, for example LXT 30° LHoT 10Δ.");
  }
  const parts: Extract<ShorthandParts, { ok: true }> = { ok: true, horizontal: null, vertical: null };
  for (const { eye, direction, size } of drafts) {
    if (!eye) return missing(`Say which eye deviates: right or left ${direction}.`);
    if (!size) return missing(`Say how many degrees the ${direction} part has, right after it.`);
    const part = { eye, size: { value: size.value, unit: size.unit ?? "degrees" } };
    if (direction === "eso" || direction === "exo") {
      if (parts.horizontal) return wrong("There is one horizontal part: eso or exo, in one eye.");
      parts.horizontal = { ...part, direction };
    } else {
      if (parts.vertical) return wrong("There is one vertical part: hyper or hypo, in one eye.");
      parts.vertical = { ...part, direction };
    }
  }
  return parts;
}

/**
 * A direction opens a part and a size closes it. A part takes the eye named with it, else the eye named last before it,
 * else the eye that ends the text (`exo 30 left`).
 */
function draftParts(tokens: ShorthandToken[]): Draft[] | Extract<ShorthandParts, { ok: false }> {
  const drafts: Draft[] = [];
  let eye: Eye | null = null;
  for (const [index, token] of tokens.entries()) {
    const last = drafts.at(-1);
    if (token.kind === "refused") {
      return token.isBegun && index === tokens.length - 1 ? missing(token.reason) : wrong(token.reason);
    }
    if (token.kind === "eye") {
      eye = token.eye;
    } else if (token.kind === "direction") {
      eye = token.eye ?? eye;
      drafts.push({ eye, direction: token.direction, size: null });
    } else if (!last) {
      return wrong("Write the eye and the direction before the degrees, for example LXT 30.");
    } else if (last.size) {
      return wrong("There is one number for each direction, right after it, for example LXT 30 LHoT 15.");
    } else {
      last.size = token;
    }
  }
  return withTrailingEye(drafts, tokens);
}

function withTrailingEye(drafts: Draft[], tokens: ShorthandToken[]): Draft[] | Extract<ShorthandParts, { ok: false }> {
  const last = tokens.at(-1);
  if (last?.kind !== "eye") return drafts;
  const lacksEye = drafts.some((draft) => draft.eye === null);
  const isOnlyEye = tokens.every((token) => !("eye" in token) || token.eye === null || token.eye === last.eye);
  if (!lacksEye || !isOnlyEye) return missing(`Say which way the ${last.eye} eye deviates, for example exo 30.`);
  return drafts.map((draft) => ({ ...draft, eye: draft.eye ?? last.eye }));
}

function wrong(reason: string): Extract<ShorthandParts, { ok: false }> {
  return { ok: false, reason, isIncomplete: false };
}

function missing(reason: string): Extract<ShorthandParts, { ok: false }> {
  return { ok: false, reason, isIncomplete: true };
}
