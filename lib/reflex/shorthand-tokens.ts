import { BEYOND_LIMBUS, type Eye, type Horizontal, type Vertical } from "./finding";
import { shorthandRefusal } from "./shorthand-refusal";
import type { SizeUnit } from "./typed-size";

type Direction = Horizontal | Vertical;
export type ShorthandToken =
  | { kind: "eye"; eye: Eye }
  | { kind: "direction"; eye: Eye | null; direction: Direction }
  | { kind: "size"; value: number | typeof BEYOND_LIMBUS; unit: SizeUnit | null }
  /** Nothing that can be taken; `reason` says what to write, `isBegun` that more letters could make it a word. */
  | { kind: "refused"; reason: string; isBegun: boolean };

/** Letters and words for a direction: the tropia, squint and college forms, and plain words. */
const DIRECTIONS: ReadonlyMap<string, Direction> = new Map([
  ...["et", "sot", "cs", "eso", "esotropia", "esotropic", "convergent"].map((word) => [word, "eso"] as const),
  ...["xt", "xot", "ds", "exo", "exotropia", "exotropic", "divergent"].map((word) => [word, "exo"] as const),
  ...["ht", "hypert", "hyper", "hypertropia", "hypertropic"].map((word) => [word, "hyper"] as const),
  ...["hot", "hypot", "hypo", "hypotropia", "hypotropic"].map((word) => [word, "hypo"] as const),
]);
const EYES: ReadonlyMap<string, Eye> = new Map([
  ...["r", "re", "right", "od"].map((word) => [word, "right"] as const),
  ...["l", "le", "left", "os"].map((word) => [word, "left"] as const),
]);
/** Words that carry no choice of their own: "left eye, divergent squint of 30 and …". */
const FILLERS = new Set(["eye", "squint", "of", "and", "with", "the", "part"]);

/** What else a finding may begin or end with, so that half a word is not called wrong while it is typed. */
const OTHER_BEGINNINGS = [">45", "beyond", "ortho", "aligned", "straight", "none", "not", "nr", "unreadable"];

const SEPARATORS = /(?:[\s,;:=+&]|\.(?!\d))+/y; // a point before a digit is a decimal: `.5` must not be read as 5
const BEYOND =
  /(?:(?:>|over|more than)\s*45|45\s*\+(?!\s*[a-z\d])|beyond(?:\s+the)?(?:\s+limbus)?)(?:\s*(?:°|deg(?:rees?)?))?(?!\.?\d|[a-z])/y;
const SIZE = /(\d+(?:\.\d+)?)\s*(°|deg(?:rees?)?|[δ∆△]|prism(?:s|\s+diopt(?:re|er)s?)?|pd)?(?![a-z\d])/y;
const WORD = /[^\s,;:=+&.>\d]+/y;
const ANYTHING = /\S+/y;

/** Cuts typed shorthand into what it says, in order; letter case and separators do not matter. */
export function shorthandTokens(text: string): ShorthandToken[] {
  const typed = text.toLowerCase().replace(/[º˚]/g, "°");
  const tokens: ShorthandToken[] = [];
  let position = 0;
  const take = (pattern: RegExp): RegExpExecArray | null => {
    pattern.lastIndex = position;
    const match = pattern.exec(typed);
    if (match) position += match[0].length;
    return match;
  };
  while (position < typed.length) {
    if (take(SEPARATORS)) continue;
    if (take(BEYOND)) {
      tokens.push({ kind: "size", value: BEYOND_LIMBUS, unit: "degrees" });
      continue;
    }
    const size = take(SIZE);
    const token = size ? sizeToken(size) : wordToken((take(WORD) ?? take(ANYTHING))?.[0] ?? "");
    if (token) tokens.push(token);
  }
  return tokens;
}

function sizeToken([, digits, unit]: RegExpExecArray): ShorthandToken {
  if (unit === "pd") {
    const reason = `PD also means pupillary distance: write ${digits}Δ or ${digits} prism.`;
    return { kind: "refused", reason, isBegun: false };
  }
  const value = Number(digits);
  if (unit === undefined) return { kind: "size", value, unit: null };
  return { kind: "size", value, unit: unit === "°" || unit.startsWith("deg") ? "degrees" : "prism-dioptres" };
}

function wordToken(word: string): ShorthandToken | null {
  if (FILLERS.has(word)) return null;
  const eye = EYES.get(word);
  if (eye) return { kind: "eye", eye };
  const direction = DIRECTIONS.get(word);
  if (direction) return { kind: "direction", eye: null, direction };
  const side = EYES.get(word.slice(0, 1));
  const sided = DIRECTIONS.get(word.slice(1));
  if (side && sided) return { kind: "direction", eye: side, direction: sided };
  return { kind: "refused", reason: shorthandRefusal(word), isBegun: isBegunWord(word) };
}

function isBegunWord(word: string): boolean {
  const isBeginning = (letters: string, known: string) => known !== letters && known.startsWith(letters);
  const words = [...DIRECTIONS.keys(), ...EYES.keys(), ...OTHER_BEGINNINGS];
  if (words.some((known) => isBeginning(word, known))) return true;
  return EYES.has(word.slice(0, 1)) && [...DIRECTIONS.keys()].some((known) => isBeginning(word.slice(1), known));
}
