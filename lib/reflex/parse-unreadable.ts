import { type Finding, UNREADABLE_REASONS, type UnreadableReason } from "./finding";
import { UNREADABLE_REASON_WORDS } from "./unreadable-reason-words";

const NOT_READABLE = /^(?:nr|not readable|unreadable|cannot (?:be )?read|can['’]t read)(?![a-z])[\s:,.–-]*(.*)$/is;

/** Shorter words people use for each reason, beside the full words and the stored name. */
const SHORT_WORDS: Readonly<Record<UnreadableReason, readonly string[]>> = {
  blurred: ["blur", "blurry", "out of focus", "not sharp"],
  "reflex-hidden": ["hidden", "doubled", "double", "reflex doubled", "double reflex", "two reflexes", "no reflex"],
  "pupil-not-visible": ["pupil", "no pupil", "pupil hidden"],
  "not-fixating": ["fixation", "no fixation", "not fixing", "looking away"],
  "irregular-pupil": ["dilated", "irregular", "dilated pupil"],
  "needs-cover-test": ["cover test", "ct", "needs a cover test"],
  other: ["other reason"],
};

type ParsedUnreadable = { ok: true; finding: Finding } | { ok: false; reason: string; isIncomplete: boolean };

/** Reads `nr blurred`, `not readable: reflex hidden or doubled`, …; null when the text is about something else. */
export function parseUnreadable(text: string): ParsedUnreadable | null {
  const match = NOT_READABLE.exec(text);
  if (!match) return null;
  const said = (match[1] ?? "").trim().toLowerCase().replace(/\.$/, "");
  const reason = UNREADABLE_REASONS.find((candidate) => wordsFor(candidate).includes(said.replaceAll("-", " ")));
  if (reason) return { ok: true, finding: { readable: false, reason } };
  const choices = UNREADABLE_REASONS.map((candidate) => UNREADABLE_REASON_WORDS[candidate]).join(", ");
  const isIncomplete = UNREADABLE_REASONS.some((candidate) => isBegun(candidate, said));
  return { ok: false, isIncomplete, reason: `Say why it cannot be read: ${choices}.` };
}

function wordsFor(reason: UnreadableReason): string[] {
  return [reason.replaceAll("-", " "), UNREADABLE_REASON_WORDS[reason], ...SHORT_WORDS[reason]];
}

function isBegun(reason: UnreadableReason, said: string): boolean {
  return wordsFor(reason).some((words) => words.startsWith(said));
}
