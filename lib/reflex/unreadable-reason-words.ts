import type { UnreadableReason } from "./finding";

/** How each reason is said on the screen and in shorthand. */
export const UNREADABLE_REASON_WORDS: Readonly<Record<UnreadableReason, string>> = {
  blurred: "blurred",
  "reflex-hidden": "reflex hidden or doubled",
  "pupil-not-visible": "pupil not visible",
  "not-fixating": "not fixating",
  "irregular-pupil": "dilated or irregular pupil",
  "needs-cover-test": "cannot be judged without a cover test",
  other: "other",
};
