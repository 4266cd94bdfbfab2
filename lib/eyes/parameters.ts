import { EYE_MODEL } from "./geometry";
import type { IrisName, SkinTone } from "./palettes";
import { createRandom } from "./random";

/** The patient's eye; the right one stands on the viewer's left. */
export type Side = "right" | "left";

/**
 * How the reflex moves with the eye. `landmark`: the teaching rule (pupil margin 15°, midway 30°, limbus 45°, sclera
 * beyond). `optical`: the first Purkinje image with the light at the camera. They differ on purpose (at 30° by more
 * than a millimetre on the iris), so the photographs of one library should keep to one of them.
 */
export type ReflexModel = "landmark" | "optical";

export type EyeSettings = {
  /** Turn towards the nose; negative is exo. */
  esoDegrees: number;
  /** Turn upwards; negative is hypo. */
  hyperDegrees: number;
  pupilMm: number;
  /** 1 is open, 0 closed; multiplies the opening of both lids. */
  opening: number;
  iris: IrisName;
};

/** What differs gently from face to face. The seed draws all of it; any of it may be given instead. */
export type FaceSettings = {
  browArch: number;
  browWeight: number;
  browHeightMm: number;
  canthalTiltDegrees: number;
  lidPeak: number;
  /** −1 a cool light to 1 a warm one. */
  warmth: number;
  /** 1 is usual; 1.3 a broad bridge. */
  noseWidth: number;
  lidOpening: number;
  crease: number;
  /** 0 a smooth young skin to 1 a lined one. */
  age: number;
  lash: number;
};

export type PhotographSettings = FaceSettings & {
  seed: number;
  width: number;
  height: number;
  /** What the width of the picture shows. */
  fieldMm: number;
  /** Where the eyes lie, as a share of the height from the top. */
  eyeLevel: number;
  skin: SkinTone;
  /** `#rrggbb` of the brows, or null for the one that goes with the skin. */
  hairColour: string | null;
  pupilDistanceMm: number;
  irisDiameterMm: number;
  /** Reflex decentration of an aligned eye towards the nose, the same in both (angle kappa). */
  kappaMm: number;
  model: ReflexModel;
  /** Head tilt, clockwise for the viewer. */
  tiltDegrees: number;
  /** 0 none to 1: a fold of skin over the inner corners. */
  epicanthus: number;
  brow: number;
  freckles: number;
  grain: number;
  /** Brightness of the reflex; 0 leaves it out. */
  reflexBrightness: number;
  /** Standard deviation of a missed focus. */
  blurPx: number;
  /** Null: by the depth of the skin. */
  exposure: number | null;
  /** Points a pixel along each side; the cost grows with its square. */
  supersample: number;
  right: EyeSettings;
  left: EyeSettings;
};

/** What a caller says of a photograph; everything left out is usual, or drawn from the seed. */
export type PhotographParameters = Partial<Omit<PhotographSettings, Side>> & {
  /** For both eyes, where an eye does not say its own. */
  pupilMm?: number;
  iris?: IrisName;
  right?: Partial<EyeSettings>;
  left?: Partial<EyeSettings>;
};

export function completeParameters(parameters: PhotographParameters): PhotographSettings {
  const { pupilMm = 3.6, iris = "blue", right, left, ...given } = parameters;
  const usualEye: EyeSettings = { esoDegrees: 0, hyperDegrees: 0, pupilMm, opening: 1, iris };
  return {
    seed: 1,
    width: 1600,
    height: 700,
    fieldMm: 119,
    eyeLevel: 0.545,
    skin: "B",
    hairColour: null,
    pupilDistanceMm: 62,
    irisDiameterMm: EYE_MODEL.irisDiameterMm,
    kappaMm: EYE_MODEL.kappaMm,
    model: "landmark",
    tiltDegrees: 0,
    epicanthus: 0,
    brow: 1,
    freckles: 0,
    grain: 1,
    reflexBrightness: 1,
    blurPx: 0,
    exposure: null,
    supersample: 2,
    ...drawFace(parameters.seed ?? 1),
    ...given,
    right: { ...usualEye, ...right },
    left: { ...usualEye, ...left },
  };
}

/** The order of the lines is the order of the draws: a line moved or added changes every face. */
function drawFace(seed: number): FaceSettings {
  const random = createRandom(seed * 613 + 17);
  return {
    browArch: random.range(-0.9, 1),
    browWeight: random.range(0.72, 1.25),
    browHeightMm: random.range(-2.0, 0.9),
    canthalTiltDegrees: random.range(-1.6, 2.2),
    lidPeak: random.range(-1, 1.2),
    warmth: random.range(-1, 1),
    noseWidth: random.range(0.92, 1.14),
    lidOpening: random.range(0.95, 1.05),
    crease: random.range(0.75, 1.25),
    age: random.range(0.12, 0.5),
    lash: random.range(0.85, 1.12),
  };
}
