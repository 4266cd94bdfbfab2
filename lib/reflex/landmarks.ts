/** Degrees of the landmarks, from the pupil centre outwards. Common practice, no source. */
export const LANDMARK_DEGREES = { pupilMargin: 15, midway: 30, limbus: 45 } as const;

/** Where the landmarks lie on the side of the reflex, in mm from the pupil centre. */
export type LandmarkPlaces = { pupilMarginMm: number; limbusMm: number };

/** Degrees by the landmark rule of a reflex so many mm out, straight lines between landmarks; null beyond the limbus. */
export function degreesAtLandmarks(mm: number, places: LandmarkPlaces): number | null {
  return interpolate(
    mm,
    corners(places).map(([x, y]) => [x, y] as const),
  );
}

/** The inverse: mm out at which the landmark rule reads so many degrees; null above the limbus's 45°. */
export function mmAtLandmarks(degrees: number, places: LandmarkPlaces): number | null {
  return interpolate(
    degrees,
    corners(places).map(([x, y]) => [y, x] as const),
  );
}

function corners({ pupilMarginMm, limbusMm }: LandmarkPlaces): (readonly [mm: number, degrees: number])[] {
  return [
    [0, 0],
    [pupilMarginMm, LANDMARK_DEGREES.pupilMargin],
    [(pupilMarginMm + limbusMm) / 2, LANDMARK_DEGREES.midway],
    [limbusMm, LANDMARK_DEGREES.limbus],
  ];
}

/** Linear between points of growing x, from the first on; null beyond the last. */
function interpolate(x: number, points: readonly (readonly [x: number, y: number])[]): number | null {
  let [fromX, fromY] = [0, 0];
  for (const [toX, toY] of points) {
    if (x === toX) return toY; // exactly, so that 45° and the limbus stay each other's inverse
    if (x < toX) return fromY + ((x - fromX) / (toX - fromX)) * (toY - fromY);
    [fromX, fromY] = [toX, toY];
  }
  return null;
}
