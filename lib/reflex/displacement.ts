import { type Convention, LANDMARKS_DEFAULT, SCHEMATIC_EYE_DEFAULT } from "./convention";
import { degreesAtLandmarks, type LandmarkPlaces, mmAtLandmarks } from "./landmarks";

/**
 * Degrees of a reflex displaced by so many mm, by a convention; the sign is kept, whatever direction it stands for.
 * Null where the convention has no angle: beyond the limbus by the landmark rule, off the schematic eye.
 * Throws RangeError for what is no number, and for a convention that describes no eye.
 */
export function degreesFromDisplacement(mm: number, convention: Convention): number | null {
  assertFinite(mm, "A displacement");
  if (convention.kind === "perMm") return mm * degreesPerMm(convention);
  if (convention.kind === "landmarks") return withSignOf(mm, degreesAtLandmarks(Math.abs(mm), placesOf(convention)));
  const sine = mm / leverMm(convention);
  return Math.abs(sine) > 1 ? null : (Math.asin(sine) * 180) / Math.PI;
}

/** The inverse: mm of displacement at which a convention gives so many degrees. Null where it never does. */
export function displacementFromDegrees(degrees: number, convention: Convention): number | null {
  assertFinite(degrees, "An angle");
  if (convention.kind === "perMm") return degrees / degreesPerMm(convention);
  if (convention.kind === "landmarks")
    return withSignOf(degrees, mmAtLandmarks(Math.abs(degrees), placesOf(convention)));
  return Math.abs(degrees) > 90 ? null : leverMm(convention) * Math.sin((degrees * Math.PI) / 180);
}

function placesOf({ pupilMm, hvidMm }: Extract<Convention, { kind: "landmarks" }>): LandmarkPlaces {
  const places = {
    pupilMarginMm: (pupilMm ?? LANDMARKS_DEFAULT.pupilMm) / 2,
    limbusMm: (hvidMm ?? LANDMARKS_DEFAULT.hvidMm) / 2,
  };
  if (places.pupilMarginMm > 0 && places.pupilMarginMm < places.limbusMm && Number.isFinite(places.limbusMm)) {
    return places;
  }
  throw new RangeError("The landmark rule needs a pupil above 0 mm and an iris wider than it.");
}

function degreesPerMm(convention: Extract<Convention, { kind: "perMm" }>): number {
  if (convention.degreesPerMm > 0 && Number.isFinite(convention.degreesPerMm)) return convention.degreesPerMm;
  throw new RangeError(`Degrees per mm must be above 0: got ${convention.degreesPerMm}.`);
}

function leverMm(eye: Extract<Convention, { kind: "schematicEye" }>): number {
  const radiusMm = eye.cornealRadiusMm ?? SCHEMATIC_EYE_DEFAULT.cornealRadiusMm;
  const leverArmMm = radiusMm - (eye.entrancePupilDepthMm ?? SCHEMATIC_EYE_DEFAULT.entrancePupilDepthMm);
  if (leverArmMm > 0 && Number.isFinite(leverArmMm)) return leverArmMm;
  throw new RangeError("The schematic eye needs an entrance pupil nearer than the centre of corneal curvature.");
}

function withSignOf(signed: number, size: number | null): number | null {
  return size === null || signed >= 0 ? size : -size;
}

function assertFinite(value: number, what: string): void {
  if (!Number.isFinite(value)) throw new RangeError(`${what} must be a finite number: got ${value}.`);
}
