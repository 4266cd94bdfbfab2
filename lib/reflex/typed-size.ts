import { BEYOND_LIMBUS, DEGREES_MAX, type Degrees } from "./finding";
import { degreesFromPrismDioptres } from "./prism";

export const SIZE_UNITS = ["degrees", "prism-dioptres"] as const;
export type SizeUnit = (typeof SIZE_UNITS)[number];

/** A size as a person typed it, kept with its unit beside the degrees it stands for. */
export type TypedSize = { value: number | typeof BEYOND_LIMBUS; unit: SizeUnit };

export type ReadSize = { ok: true; degrees: Degrees } | { ok: false; reason: string };

const ENTER_BEYOND = `Write >${DEGREES_MAX} where the reflex lies beyond the limbus.`;

/** The degrees a typed size stands for; prism dioptres go by 100·tan θ to the nearest whole degree. */
export function readTypedSize({ value, unit }: TypedSize): ReadSize {
  if (value === BEYOND_LIMBUS) return { ok: true, degrees: BEYOND_LIMBUS };
  if (value === 0) return refuse("A part of size 0 is no deviation: leave it out, or write ortho.");
  return unit === "degrees" ? readDegrees(value) : readPrismDioptres(value);
}

function readDegrees(value: number): ReadSize {
  if (value > DEGREES_MAX)
    return refuse(`${value}° is more than the ${DEGREES_MAX}° that can be read. ${ENTER_BEYOND}`);
  if (!Number.isInteger(value) || value < 1) {
    return refuse(`Degrees are whole numbers from 1 to ${DEGREES_MAX}. ${ENTER_BEYOND}`);
  }
  return { ok: true, degrees: value };
}

function readPrismDioptres(value: number): ReadSize {
  if (!Number.isFinite(value) || value < 0) return refuse("Prism dioptres are numbers above 0.");
  const degrees = Math.round(degreesFromPrismDioptres(value));
  if (degrees < 1) return refuse(`${value}Δ is less than half a degree: leave that part out, or write ortho.`);
  if (degrees > DEGREES_MAX) {
    return refuse(`${value}Δ is ${degrees}°, more than the ${DEGREES_MAX}° that can be read. ${ENTER_BEYOND}`);
  }
  return { ok: true, degrees };
}

function refuse(reason: string): ReadSize {
  return { ok: false, reason };
}
