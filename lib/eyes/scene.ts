import type { PixelPoint } from "./canvas";
import { linearFromHex, type Rgb } from "./colour";
import { type EyePoint, type FacePoint, type LocatedEye, locateEyes, projectToView } from "./geometry";
import { createIris, type IrisShader } from "./iris";
import { createEyeRandom, type Lids, shapeLids } from "./lids";
import { createNoise, type Noise } from "./noise";
import { SKIN, type SkinPalette } from "./palettes";
import type { EyeSettings, PhotographSettings, Side } from "./parameters";
import type { Random } from "./random";
import { bell, clamp, smoothStep } from "./shaping";
import { growVessels, type VesselMap } from "./vessels";

/** One eye with all that is drawn of it. Its frame: n towards the nose, y down, mm. */
export type SceneEye = LocatedEye & {
  settings: EyeSettings;
  lids: Lids;
  reflexInView: EyePoint;
  iris: IrisShader;
  vessels: VesselMap;
  /** How high the crease stands above the lid margin, mm, and how deep it is. */
  platformMm(n: number): number;
  foldDepth(n: number): number;
  browY(n: number): number;
  /** Drawn from by the lids first and by the hair last, in that order. */
  random: Random;
};

/** All that the painters share: the settings made ready, in pixels of the larger picture that is scaled down at the end. */
export type Scene = {
  settings: PhotographSettings;
  width: number;
  height: number;
  pxPerMm: number;
  palette: SkinPalette;
  skinColour: Rgb;
  lidBorderColour: Rgb;
  hairColour: Rgb;
  lashColour: Rgb;
  noise: readonly [Noise, Noise, Noise];
  eyes: Record<Side, SceneEye>;
  eyeAt(faceX: number): SceneEye;
  toFace(px: number, py: number): FacePoint;
  toPixel(x: number, y: number): PixelPoint;
};

export function setScene(settings: PhotographSettings): Scene {
  const { seed, supersample } = settings;
  const width = Math.round(settings.width * supersample);
  const height = Math.round(settings.height * supersample);
  const pxPerMm = width / settings.fieldMm;
  const tilt = (settings.tiltDegrees * Math.PI) / 180;
  const cos = Math.cos(tilt);
  const sin = Math.sin(tilt);
  const originX = width / 2;
  const originY = height * settings.eyeLevel;
  const palette = SKIN[settings.skin];
  const located = locateEyes(settings);
  const eyes = {
    right: setEye(settings, "right", located.right),
    left: setEye(settings, "left", located.left),
  };
  return {
    settings,
    width,
    height,
    pxPerMm,
    palette,
    skinColour: linearFromHex(palette.base),
    lidBorderColour: linearFromHex(palette.lidBorder),
    hairColour: linearFromHex(settings.hairColour ?? palette.hair),
    lashColour: linearFromHex(palette.lash),
    noise: [createNoise(seed * 7 + 1), createNoise(seed * 7 + 2), createNoise(seed * 7 + 3)],
    eyes,
    eyeAt: (faceX) => (faceX < 0 ? eyes.right : eyes.left),
    toFace: (px, py) => {
      const x = (px - originX) / pxPerMm;
      const y = (py - originY) / pxPerMm;
      return { x: x * cos + y * sin, y: -x * sin + y * cos };
    },
    toPixel: (x, y) => [originX + (x * cos - y * sin) * pxPerMm, originY + (x * sin + y * cos) * pxPerMm],
  };
}

/** The figures about the seed keep right and left, iris and vessels, apart. */
function setEye(settings: PhotographSettings, side: Side, located: LocatedEye): SceneEye {
  const { seed, epicanthus, browArch, browHeightMm, irisDiameterMm } = settings;
  const isRight = side === "right";
  const random = createEyeRandom(seed, side);
  const lids = shapeLids(settings, side, random);
  const platformMm = 2.7 * settings.crease * random.range(0.93, 1.07);
  const foldJitter = random.range(-0.1, 0.1);
  const browJitter = random.range(-0.5, 0.5);
  const { iris, pupilMm } = settings[side];
  return {
    ...located,
    settings: settings[side],
    lids,
    reflexInView: projectToView(located.rotation, located.reflexInEye.n, located.reflexInEye.y, irisDiameterMm / 2),
    iris: createIris({ iris, pupilMm, irisDiameterMm, seed: seed * 17 + (isRight ? 3 : 43) }),
    vessels: growVessels(random, createNoise(seed * 5 + (isRight ? 1 : 2)), 0.78 + 0.35 * settings.age),
    platformMm: (n) =>
      lids.upper.at(n) -
      lids.upperOpen.at(n) -
      1.3 * clamp(1 - lids.opening) * bell(n, 9) +
      platformMm * (0.34 + 0.66 * bell(n + 1.5, 9)) * smoothStep(17.5 - 3 * epicanthus, 11, n) +
      0.55,
    foldDepth: (n) => 0.78 + 0.3 * bell(n + 5, 9) + foldJitter,
    browY: (n) =>
      -20.6 +
      browHeightMm -
      (2.6 + 0.9 * browArch) * bell(n + 9, 9) +
      browJitter +
      (n < -14 ? (n + 14) * -0.2 : 0) +
      (n > 12 ? (n - 12) * 0.06 : 0) -
      settings.brow * 0.6,
    random,
  };
}
