import type { EyeSettings, PhotographSettings, ReflexModel, Side } from "./parameters";
import { clamp, followKnots } from "./shaping";

/*
 * Frames, all in millimetres at the plane of the eyes, facing the patient.
 * Face: +x to the viewer's right, +y down. The patient's right eye stands on the viewer's left, at negative x.
 * Eye: +n towards the nose, +y down, 0 at the pupil centre of the aligned eye. As seen, or fixed to the turning eye.
 */

/** Usual measures of an adult eye. Common practice, no source: chosen so that the landmark rule looks as it is taught. */
export const EYE_MODEL = {
  irisDiameterMm: 11.7,
  globeRadiusMm: 12.0,
  /** The iris as seen through the cornea, in front of the centre of rotation. */
  irisPlaneMm: 10.45,
  /** The centre of corneal curvature in front of the centre of rotation. */
  corneaCentreMm: 5.7,
  kappaMm: 0.5,
} as const;

export type Vector = readonly [number, number, number];
export type Matrix = readonly [Vector, Vector, Vector];
export type FacePoint = { x: number; y: number };
export type EyePoint = { n: number; y: number };
export type ReflexInEye = EyePoint & { onSclera: boolean };

const USUAL_LIMBUS_MM = EYE_MODEL.irisDiameterMm / 2;

/** Landmark rule, from a total deviation to the distance of the reflex from the pupil centre, mm on the eye. */
export function landmarkDistanceMm(degrees: number, pupilRadiusMm: number, limbusRadiusMm = USUAL_LIMBUS_MM): number {
  const knots = [
    [0, 0],
    [15, pupilRadiusMm],
    [30, (pupilRadiusMm + limbusRadiusMm) / 2],
    [45, limbusRadiusMm],
    [60, limbusRadiusMm + 2.4],
    [75, limbusRadiusMm + 4.2],
  ] as const;
  return followKnots(knots, Math.abs(degrees));
}

/** The landmark rule the other way. Past 60° it says 60: nobody reads further. */
export function landmarkDegrees(mm: number, pupilRadiusMm: number, limbusRadiusMm = USUAL_LIMBUS_MM): number {
  const knots = [
    [0, 0],
    [pupilRadiusMm, 15],
    [(pupilRadiusMm + limbusRadiusMm) / 2, 30],
    [limbusRadiusMm, 45],
    [limbusRadiusMm + 2.4, 60],
  ] as const;
  return followKnots(knots, mm);
}

/** The turn that carries straight ahead onto the gaze, without torsion (Listing's law). */
export function rotationMatrix(esoDegrees: number, hyperDegrees: number): Matrix {
  const eso = radians(esoDegrees);
  const hyper = radians(hyperDegrees);
  const gx = Math.sin(eso) * Math.cos(hyper);
  const gy = -Math.sin(hyper);
  const c = Math.cos(eso) * Math.cos(hyper);
  const k = 1 / (1 + c);
  return [
    [1 - gx * gx * k, -gx * gy * k, gx],
    [-gx * gy * k, 1 - gy * gy * k, gy],
    [-gx, -gy, c],
  ];
}

export function turn(matrix: Matrix, p: Vector): Vector {
  const row = (r: Vector) => r[0] * p[0] + r[1] * p[1] + r[2] * p[2];
  return [row(matrix[0]), row(matrix[1]), row(matrix[2])];
}

/** A point fixed to the eye as it is seen. Beyond the limbus it lies on the sclera, wrapped round the globe. */
export function projectToView(matrix: Matrix, n: number, y: number, limbusRadiusMm = USUAL_LIMBUS_MM): EyePoint {
  const { globeRadiusMm, irisPlaneMm } = EYE_MODEL;
  const r = Math.hypot(n, y);
  let p: Vector = [n, y, irisPlaneMm];
  if (r > limbusRadiusMm) {
    const angle = Math.asin(limbusRadiusMm / globeRadiusMm) + (r - limbusRadiusMm) / globeRadiusMm;
    const s = (globeRadiusMm * Math.sin(angle)) / r;
    p = [n * s, y * s, globeRadiusMm * Math.cos(angle)];
  }
  const seen = turn(matrix, p);
  return { n: seen[0], y: seen[1] };
}

export type ReflexQuestion = Pick<EyeSettings, "esoDegrees" | "hyperDegrees" | "pupilMm"> & {
  irisDiameterMm?: number;
  kappaMm?: number;
  model?: ReflexModel;
};

/** Where the reflex lies on the turning eye: against the deviation, so temporal for eso and below for hyper. */
export function reflexInEye(question: ReflexQuestion): ReflexInEye {
  const { esoDegrees, hyperDegrees, pupilMm, model = "landmark" } = question;
  const { irisDiameterMm = EYE_MODEL.irisDiameterMm, kappaMm = EYE_MODEL.kappaMm } = question;
  const limbusMm = irisDiameterMm / 2;
  if (model === "optical") {
    const { n, y } = inFrontOfCorneaCentre(rotationMatrix(esoDegrees, hyperDegrees));
    return { n: n + kappaMm, y, onSclera: Math.hypot(n + kappaMm, y) > limbusMm };
  }
  const total = Math.hypot(esoDegrees, hyperDegrees);
  const distance = landmarkDistanceMm(total, pupilMm / 2, limbusMm);
  // Both eyes share the decentration. Here it fades until 15°, so that "at the pupil margin" is exactly at the margin.
  const decentration = kappaMm * clamp(1 - total / 15);
  const n = total ? (-esoDegrees / total) * distance : 0;
  const y = total ? (hyperDegrees / total) * distance : 0;
  return { n: n + decentration, y, onSclera: distance > limbusMm + 0.15 };
}

/** The point of the iris plane that stands in front of the centre of corneal curvature, in the frame of the eye. */
function inFrontOfCorneaCentre(matrix: Matrix): EyePoint {
  const centre = turn(matrix, [0, 0, EYE_MODEL.corneaCentreMm]);
  return throughIrisPlane(matrix, centre[0], centre[1]);
}

/** Where the line of sight at (n, y) as seen meets the iris plane, in the frame of the eye. */
export function throughIrisPlane(matrix: Matrix, n: number, y: number): EyePoint {
  const [r0, r1, r2] = matrix;
  const z = (EYE_MODEL.irisPlaneMm - n * r0[2] - y * r1[2]) / r2[2];
  return { n: r0[0] * n + r1[0] * y + r2[0] * z, y: r0[1] * n + r1[1] * y + r2[1] * z };
}

/** One eye as the photograph shows it, in the frame of the face. */
export type LocatedEye = {
  /** Which way the nose lies: 1 to the viewer's right. */
  towardsNose: 1 | -1;
  centreX: number;
  rotation: Matrix;
  reflexInEye: ReflexInEye;
  pupilCentre: FacePoint;
  reflex: FacePoint;
  limbusTemporal: FacePoint;
  limbusNasal: FacePoint;
  limbus: FacePoint[];
  midway: FacePoint[];
  pupilMargin: FacePoint[];
};

const RING_POINTS = 72;

/** Everything true of the two eyes that a measurement could ask for. Rings start at the nose and turn downwards. */
export function locateEyes(settings: PhotographSettings): Record<Side, LocatedEye> {
  return { right: locateEye(settings, "right"), left: locateEye(settings, "left") };
}

function locateEye(settings: PhotographSettings, side: Side): LocatedEye {
  const eye = settings[side];
  const { irisDiameterMm, kappaMm, model } = settings;
  const limbusMm = irisDiameterMm / 2;
  const towardsNose = side === "right" ? 1 : -1;
  const centreX = (-towardsNose * settings.pupilDistanceMm) / 2;
  const rotation = rotationMatrix(eye.esoDegrees, eye.hyperDegrees);
  const reflex = reflexInEye({ ...eye, irisDiameterMm, kappaMm, model });
  const see = (n: number, y: number): FacePoint => {
    const seen = projectToView(rotation, n, y, limbusMm);
    return { x: centreX + towardsNose * seen.n, y: seen.y };
  };
  const ring = (radius: number) =>
    Array.from({ length: RING_POINTS }, (_, i) => {
      const t = (i / RING_POINTS) * 2 * Math.PI;
      return see(radius * Math.cos(t), radius * Math.sin(t));
    });
  return {
    towardsNose,
    centreX,
    rotation,
    reflexInEye: reflex,
    pupilCentre: see(0, 0),
    reflex: see(reflex.n, reflex.y),
    limbusTemporal: see(-limbusMm, 0),
    limbusNasal: see(limbusMm, 0),
    limbus: ring(limbusMm),
    midway: ring((limbusMm + eye.pupilMm / 2) / 2),
    pupilMargin: ring(eye.pupilMm / 2),
  };
}

function radians(degrees: number): number {
  return (degrees * Math.PI) / 180;
}
