/** Codes a colleague may well type that no finding of one photograph can hold, each with what to write instead. */
const REFUSALS: readonly (readonly [pattern: RegExp, reason: string])[] = [
  [/^[-–—−]+$/, "Write one whole number after each direction, without a sign or a range."],
  [/^(ortho.*|aligned|straight|none|nr|unreadable)$/, "Write ortho, or not readable with its reason, alone."],
  [/^>/, "Only >45 can be written with >, where the reflex lies beyond the limbus."],
  [
    /^(r\/l|l\/r|over)$/,
    "R/L and L/R do not name the eye that deviates: write RHT or LHoT if the right eye is higher, LHT or RHoT if the left is.",
  ],
  [/^(a(et|xt|cs|ds)|alt.*)$/, "A photograph shows one moment: name the eye that deviates in it, for example LXT 30."],
  [/\(t\)|^int/, "Write what this photograph shows, for example LXT 30 or ortho: it cannot show how often."],
  [
    /^[rl]?(e|x|h|ep|xp|sop|xop)$|phoria$/,
    "A latent deviation does not show in a photograph: write the one that shows, for example LXT 30, or ortho.",
  ],
];

/** Why a word of typed shorthand, in lower case, cannot be taken, and what to write. */
export function shorthandRefusal(word: string): string {
  const known = REFUSALS.find(([pattern]) => pattern.test(word));
  return known ? known[1] : `“${word}” is not understood. Write for example LXT 30, RHT 15 or ortho.`;
}
