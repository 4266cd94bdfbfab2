import type { Convention } from "./convention";

/** The conventions a department can choose, by the names they are stored under. */
export const CONVENTION_NAMES = ["landmarks", "7-per-mm", "12-per-mm", "11-per-mm-limbus", "own"] as const;
export type ConventionName = (typeof CONVENTION_NAMES)[number];

type NamedConvention = {
  convention: Convention;
  label: string;
  /** Where the figure is from, for the screen. */
  source: string;
};

const NO_SOURCE = "Common practice, no source.";
const BARRY_BACKES = "Barry & Backes, Invest Ophthalmol Vis Sci 1997; 38: 2597-2607";

const NAMED: Readonly<Record<Exclude<ConventionName, "own">, NamedConvention>> = {
  landmarks: { convention: { kind: "landmarks" }, label: "Landmark rule", source: NO_SOURCE },
  "7-per-mm": { convention: { kind: "perMm", degreesPerMm: 7 }, label: "7° per mm", source: NO_SOURCE },
  "12-per-mm": {
    convention: { kind: "perMm", degreesPerMm: 12, from: "pupil-centre" },
    label: "12° per mm from the pupil centre",
    source: `Rounded from 11.82° per mm: ${BARRY_BACKES}.`,
  },
  "11-per-mm-limbus": {
    convention: { kind: "perMm", degreesPerMm: 11, from: "limbus-centre" },
    label: "11° per mm from the limbus centre",
    source: `${BARRY_BACKES}.`,
  },
};

/**
 * A stored convention with its label, to be named wherever a converted value is shown.
 * `ownDegreesPerMm` is the department's figure, for `own` only; RangeError when it is missing there.
 */
export function namedConvention(name: ConventionName, ownDegreesPerMm: number | null = null): NamedConvention {
  if (name !== "own") return NAMED[name];
  if (ownDegreesPerMm === null || !(ownDegreesPerMm > 0)) {
    throw new RangeError("An own convention needs its degrees per mm.");
  }
  return {
    convention: { kind: "perMm", degreesPerMm: ownDegreesPerMm },
    label: `${ownDegreesPerMm}° per mm, own figure`,
    source: "The department's own figure.",
  };
}
