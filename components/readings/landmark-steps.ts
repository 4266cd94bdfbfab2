import { BEYOND_LIMBUS, DEGREES_MAX, type Degrees } from "@/lib/reflex/finding";
import { LANDMARK_DEGREES } from "@/lib/reflex/landmarks";

/** Width of one degree, as a percentage of the rule; the rest, beyond 45, is sclera. */
const PERCENT_PER_DEGREE = 1.8;
const LIMBUS_PERCENT = DEGREES_MAX * PERCENT_PER_DEGREE;
const { pupilMargin, midway, limbus } = LANDMARK_DEGREES;
const STOPS: readonly Degrees[] = [1, pupilMargin, midway, limbus, BEYOND_LIMBUS];

/** Where a value stands on the rule, in percent from the pupil centre. Beyond the limbus: the middle of the sclera. */
export function percentAlongRule(value: Degrees | 0): number {
  return value === BEYOND_LIMBUS ? (LIMBUS_PERCENT + 100) / 2 : value * PERCENT_PER_DEGREE;
}

/** The value under a pointer, from its place along the rule (0 to 1). The sclera starts half a degree past the limbus. */
export function valueAtShare(share: number): Degrees {
  const degrees = Math.round((share * 100) / PERCENT_PER_DEGREE);
  return degrees > DEGREES_MAX ? BEYOND_LIMBUS : Math.max(1, degrees);
}

/** The value as a place in order, for the slider role. It orders `>45` after 45 and is never shown, stored or counted. */
export function ariaPosition(value: Degrees | null): number {
  return value === BEYOND_LIMBUS ? DEGREES_MAX + 1 : (value ?? 0);
}

/** The value after a key, or null when the key is not the rule's. Shift turns an arrow into a step to a landmark. */
export function valueAfterKey(value: Degrees | null, key: string, isShift = false): Degrees | null {
  switch (key) {
    case "ArrowRight":
    case "ArrowUp":
      return isShift ? nextLandmark(value) : fromPosition(ariaPosition(value) + 1);
    case "ArrowLeft":
    case "ArrowDown":
      return isShift ? landmarkBefore(value) : fromPosition(ariaPosition(value) - 1);
    case "PageUp":
      return nextLandmark(value);
    case "PageDown":
      return landmarkBefore(value);
    case "Home":
      return 1;
    case "End":
      return BEYOND_LIMBUS;
    default:
      return null;
  }
}

function fromPosition(position: number): Degrees {
  return position > DEGREES_MAX ? BEYOND_LIMBUS : Math.max(1, position);
}

function nextLandmark(value: Degrees | null): Degrees {
  const at = Math.max(1, ariaPosition(value)); // from nothing chosen, the first landmark is the pupil margin
  return STOPS.find((stop) => ariaPosition(stop) > at) ?? BEYOND_LIMBUS;
}

function landmarkBefore(value: Degrees | null): Degrees {
  return STOPS.findLast((stop) => ariaPosition(stop) < ariaPosition(value)) ?? 1;
}

/** What a screen reader says: "30 degrees, midway". */
export function speakDegrees(value: Degrees | null): string {
  if (value === null) return "not chosen yet";
  if (value === BEYOND_LIMBUS) return "over 45 degrees, beyond the limbus";
  return `${value} ${value === 1 ? "degree" : "degrees"}, ${placeName(value)}`;
}

function placeName(degrees: number): string {
  if (degrees < pupilMargin) return "inside the pupil";
  if (degrees === pupilMargin) return "pupil margin";
  if (degrees < midway) return "between pupil margin and midway";
  if (degrees === midway) return "midway";
  return degrees < limbus ? "between midway and limbus" : "limbus";
}
