/** The trail's actions as they are said on the screen. */
export const AUDIT_ACTION_WORDS: Readonly<Record<string, string>> = {
  "case.created": "Case added",
  "case.changed": "Case changed",
  "case.reference-revised": "Reference changed",
  "round.drafted": "Draft started",
  "round.open": "Round published",
  "round.closed": "Round closed",
  "round.released": "Round released",
  "round.submitted": "Readings handed in",
};
