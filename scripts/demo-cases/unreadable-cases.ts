import type { CasePlan } from "./demo-case";

export const UNREADABLE_CASES: CasePlan[] = [
  {
    code: "005",
    note: "Taken in a blink.",
    unreadable: "reflex-hidden",
    parameters: {
      seed: 149,
      skin: "E",
      iris: "hazel",
      lidOpening: 0.26,
      right: { esoDegrees: 8 },
      left: { opening: 1.12 },
    },
  },
  {
    code: "022",
    note: "Out of focus.",
    unreadable: "blurred",
    parameters: { seed: 150, skin: "B", iris: "brown", blurPx: 9, tiltDegrees: 2.5, left: { esoDegrees: -18 } },
  },
  {
    code: "039",
    note: "The left upper lid hangs over the pupil.",
    unreadable: "reflex-hidden",
    parameters: { seed: 151, skin: "A", iris: "grey", age: 0.8, hairColour: "#9a948e", left: { opening: 0.38 } },
  },
];
