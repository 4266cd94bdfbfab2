/** How a round's conversion is named wherever converted values are shown. */
export const CONVENTION_NAMES: Readonly<Record<string, string>> = {
  landmarks: "landmark rule",
  "7-per-mm": "7° per millimetre rule",
  "12-per-mm": "12° per millimetre from the pupil centre",
  "11-per-mm-limbus": "11° per millimetre from the limbus centre",
  own: "department’s own figure",
};
