import type { CasePlan } from "./demo-case";

/** Five vertical pairs and six with both parts. Their sums stay below 45°, so that the reflex lies on the cornea. */
export const VERTICAL_CASES: CasePlan[] = [
  {
    code: "018",
    note: "Right hyper, reflex at the lower pupil margin.",
    isAnchor: true,
    parameters: { seed: 138, skin: "B", iris: "blue", pupilMm: 3.2, tiltDegrees: -1.2, right: { hyperDegrees: 15 } },
  },
  {
    code: "035",
    note: "Right hyper, reflex below the pupil centre. The head is tilted.",
    parameters: { seed: 139, skin: "D", iris: "hazel", pupilMm: 3.6, tiltDegrees: 3, right: { hyperDegrees: 7 } },
  },
  {
    code: "002",
    note: "Right hypo, reflex above the pupil centre.",
    parameters: {
      seed: 140,
      hairColour: "#2a1c14",
      age: 0.15,
      skin: "A",
      iris: "amber",
      pupilMm: 3.8,
      fieldMm: 118,
      right: { hyperDegrees: -10 },
    },
  },
  {
    code: "019",
    note: "Left hyper, reflex on the iris below the pupil.",
    parameters: {
      seed: 141,
      brow: 0.8,
      skin: "F",
      iris: "brown",
      pupilMm: 3.0,
      fieldMm: 120,
      left: { hyperDegrees: 20 },
    },
  },
  {
    code: "036",
    note: "Left hypo, reflex at the upper pupil margin.",
    parameters: {
      seed: 142,
      brow: 1.2,
      skin: "E",
      iris: "umber",
      pupilMm: 3.4,
      fieldMm: 121,
      left: { hyperDegrees: -15 },
    },
  },
];

export const COMBINED_CASES: CasePlan[] = [
  {
    code: "003",
    note: "Right eso and hyper, reflex below and temporal, at the edge of the pupil.",
    parameters: {
      seed: 143,
      age: 0.6,
      skin: "D",
      iris: "brown",
      pupilMm: 3.4,
      right: { esoDegrees: 15, hyperDegrees: 10 },
    },
  },
  {
    code: "020",
    note: "Left eso and hyper, reflex below and temporal on the iris.",
    parameters: {
      seed: 144,
      hairColour: "#9a5a30",
      skin: "A",
      iris: "green",
      pupilMm: 3.3,
      freckles: 0.7,
      left: { esoDegrees: 20, hyperDegrees: 8 },
    },
  },
  {
    code: "037",
    note: "Left eso and hypo, reflex above and temporal, between midway and limbus.",
    parameters: { seed: 145, skin: "C", iris: "amber", pupilMm: 3.7, left: { esoDegrees: 35, hyperDegrees: -10 } },
  },
  {
    code: "004",
    note: "Right exo and hyper, reflex below and nasal, inside the pupil.",
    parameters: {
      seed: 146,
      skin: "F",
      iris: "umber",
      pupilMm: 4.1,
      tiltDegrees: -1.5,
      right: { esoDegrees: -12, hyperDegrees: 6 },
    },
  },
  {
    code: "021",
    note: "Right exo and hypo, reflex above and nasal on the iris.",
    parameters: {
      seed: 147,
      skin: "B",
      iris: "grey",
      pupilMm: 3.5,
      age: 0.6,
      right: { esoDegrees: -25, hyperDegrees: -12 },
    },
  },
  {
    code: "038",
    note: "Left exo and hypo, reflex above and nasal, past midway. The head is tilted.",
    isAnchor: true,
    parameters: {
      seed: 148,
      skin: "C",
      iris: "hazel",
      pupilMm: 3.6,
      tiltDegrees: 2,
      left: { esoDegrees: -30, hyperDegrees: -15 },
    },
  },
];
