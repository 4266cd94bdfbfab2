/** How millimetres of reflex displacement are turned into degrees. Part of the method: never pool two of them unsaid. */
export type Convention =
  /** 15° at the pupil margin, 30° midway to the limbus, 45° at the limbus: common practice, no source. */
  | { kind: "landmarks"; pupilMm?: number; hvidMm?: number }
  /** So many degrees for each millimetre, measured from the centre named (the pupil's when left out). */
  | { kind: "perMm"; degreesPerMm: number; from?: "pupil-centre" | "limbus-centre" }
  /** mm = (corneal radius − depth of the entrance pupil)·sin θ. Defaults: Gullstrand's exact schematic eye. */
  | { kind: "schematicEye"; cornealRadiusMm?: number; entrancePupilDepthMm?: number };

/** Common practice, no source: a pupil of 3 to 4 mm. Mean visible iris of adults, Rüfer et al., Cornea 2005; 24: 259-261. */
export const LANDMARKS_DEFAULT = { pupilMm: 4, hvidMm: 11.7 } as const;

/** Gullstrand No. 1 (exact), in Helmholtz' Treatise on Physiological Optics. */
export const SCHEMATIC_EYE_DEFAULT = { cornealRadiusMm: 7.7, entrancePupilDepthMm: 3.05 } as const;

export const DEFAULT_CONVENTION: Convention = { kind: "landmarks" };
