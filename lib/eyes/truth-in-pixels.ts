import type { PixelPoint } from "./canvas";
import { type FacePoint, locateEyes } from "./geometry";
import { completeParameters, type PhotographParameters, type Side } from "./parameters";

export type EyeInPixels = {
  esoDegrees: number;
  hyperDegrees: number;
  pupilCentre: PixelPoint;
  reflex: PixelPoint;
  limbusTemporal: PixelPoint;
  limbusNasal: PixelPoint;
  /** Rings start at the nose and turn downwards. */
  limbus: PixelPoint[];
  midway: PixelPoint[];
  pupilMargin: PixelPoint[];
};

/** Where everything truly lies in the picture, to a hundredth of a pixel. */
export type PhotographTruth = { pxPerMm: number; eyes: Record<Side, EyeInPixels> };

/** Costs next to nothing: it needs the parameters only, not the picture. */
export function findTruthInPixels(parameters: PhotographParameters): PhotographTruth {
  const settings = completeParameters(parameters);
  const { width, height, fieldMm, eyeLevel, tiltDegrees } = settings;
  const pxPerMm = width / fieldMm;
  const tilt = (tiltDegrees * Math.PI) / 180;
  const cos = Math.cos(tilt);
  const sin = Math.sin(tilt);
  const toPixel = ({ x, y }: FacePoint): PixelPoint => [
    roundToHundredth(width / 2 + (x * cos - y * sin) * pxPerMm),
    roundToHundredth(height * eyeLevel + (x * sin + y * cos) * pxPerMm),
  ];
  const located = locateEyes(settings);
  const inPixels = (side: Side): EyeInPixels => {
    const eye = located[side];
    return {
      esoDegrees: settings[side].esoDegrees,
      hyperDegrees: settings[side].hyperDegrees,
      pupilCentre: toPixel(eye.pupilCentre),
      reflex: toPixel(eye.reflex),
      limbusTemporal: toPixel(eye.limbusTemporal),
      limbusNasal: toPixel(eye.limbusNasal),
      limbus: eye.limbus.map(toPixel),
      midway: eye.midway.map(toPixel),
      pupilMargin: eye.pupilMargin.map(toPixel),
    };
  };
  return { pxPerMm, eyes: { right: inPixels("right"), left: inPixels("left") } };
}

function roundToHundredth(x: number): number {
  return Math.round(x * 100) / 100;
}
