export type SkinTone = "A" | "B" | "C" | "D" | "E" | "F";

export type SkinPalette = {
  base: string;
  hair: string;
  lash: string;
  /** The wet border of the lids. */
  lidBorder: string;
  gloss: number;
  /** How strongly blood shows, and how strongly pigment gathers. */
  blood: number;
  pigment: number;
  /** 0 for the lightest tone to 1 for the deepest: whatever else goes with depth follows this. */
  depth: number;
};

/** Six skin tones by letter, lightest to deepest. */
// biome-ignore format: a table reads across
export const SKIN: Record<SkinTone, SkinPalette> = {
  A: { base: "#efcdbd", hair: "#5b3f2a", lash: "#2a1a12", lidBorder: "#d39484", gloss: 0.105, blood: 1.15, pigment: 0.55, depth: 0 },
  B: { base: "#e8bfa8", hair: "#402c1e", lash: "#1b110c", lidBorder: "#c98a77", gloss: 0.105, blood: 1.0, pigment: 0.75, depth: 0.08 },
  C: { base: "#d2a384", hair: "#291c15", lash: "#130c09", lidBorder: "#b97d66", gloss: 0.105, blood: 0.8, pigment: 0.95, depth: 0.25 },
  D: { base: "#b0805f", hair: "#1a1310", lash: "#0c0807", lidBorder: "#a06650", gloss: 0.1, blood: 0.6, pigment: 1.05, depth: 0.5 },
  E: { base: "#85583f", hair: "#120d0b", lash: "#070505", lidBorder: "#834f40", gloss: 0.088, blood: 0.42, pigment: 1.1, depth: 0.8 },
  F: { base: "#5c3c2d", hair: "#0c0908", lash: "#040303", lidBorder: "#693f35", gloss: 0.078, blood: 0.3, pigment: 1.0, depth: 1 },
};

export type IrisName = "blue" | "grey" | "green" | "hazel" | "amber" | "brown" | "umber";

export type IrisPalette = {
  outer: string;
  mid: string;
  inner: string;
  /** The raised fibres. */
  light: string;
  /** The dark ring at the limbus, and the frill at the pupil margin. */
  ring: string;
  ruff: string;
  contrast: number;
  crypt: number;
};

// biome-ignore format: a table reads across
export const IRIS: Record<IrisName, IrisPalette> = {
  blue:  { outer: "#5b7288", mid: "#8aa1b0", inner: "#b0b0a0", light: "#d5dee0", ring: "#27384a", ruff: "#33271f", contrast: 0.95, crypt: 0.38 },
  grey:  { outer: "#66757b", mid: "#98a4a4", inner: "#b3aa94", light: "#d9dbd5", ring: "#2c373c", ruff: "#33271f", contrast: 0.9, crypt: 0.42 },
  green: { outer: "#5c6a55", mid: "#8a9070", inner: "#a38c5c", light: "#c4c6a6", ring: "#2b352d", ruff: "#2f2018", contrast: 0.85, crypt: 0.42 },
  hazel: { outer: "#5d5940", mid: "#846f45", inner: "#8a5c34", light: "#b99f6b", ring: "#29261a", ruff: "#261810", contrast: 0.8, crypt: 0.46 },
  amber: { outer: "#6d4724", mid: "#946533", inner: "#9c6c33", light: "#c39355", ring: "#2c1b0e", ruff: "#28160c", contrast: 0.75, crypt: 0.44 },
  brown: { outer: "#48301f", mid: "#66432a", inner: "#74492a", light: "#94693f", ring: "#1c110b", ruff: "#1b0f09", contrast: 0.7, crypt: 0.42 },
  umber: { outer: "#2e1e16", mid: "#43291c", inner: "#4b2f1f", light: "#644429", ring: "#130c08", ruff: "#120a07", contrast: 0.6, crypt: 0.4 },
};
