import { ALIGNED, type Degrees, type Eye, type ReadableFinding } from "@/lib/reflex/finding";

type Parts = { eso?: Degrees; exo?: Degrees; hyper?: Degrees; hypo?: Degrees };

/** A finding in few words, for tests: `deviation("left", { exo: 30, hypo: 15 })`. Builds what it is told, sound or not. */
export function deviation(eye: Eye, { eso, exo, hyper, hypo }: Parts): ReadableFinding {
  return {
    ...ALIGNED,
    eye,
    horizontal: eso !== undefined ? "eso" : exo !== undefined ? "exo" : "none",
    horizontalDegrees: eso ?? exo ?? null,
    vertical: hyper !== undefined ? "hyper" : hypo !== undefined ? "hypo" : "none",
    verticalDegrees: hyper ?? hypo ?? null,
  };
}
