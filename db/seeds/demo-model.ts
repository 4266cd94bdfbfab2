import { ALIGNED, DEGREES_MAX, type Degrees, type Finding, type ReadableFinding } from "@/lib/reflex/finding";

/**
 * How an invented examiner misreads. The shares are assumptions for the demo, not measurements: about 98% right
 * directions on clear deviations, 90% from 5 to 10 degrees and 70% below; degrees a slope of the true ones with a
 * spread of 2.3 degrees and a tenth of the size, and a habit of rounding to 5.
 */
export type ReadingHabit = "steady" | "ordinary" | "sliding" | "misses-verticals" | "learning" | "reverses-then-learns";

type Traits = {
  slope: number;
  biasDegrees: number;
  reverses: number;
  swapsEye: number;
  missesVertical: number;
  callsSquint: number;
  misses: number;
};

const CERTIFIED: Traits = {
  slope: 0.89,
  biasDegrees: 0,
  reverses: 0.01,
  swapsEye: 0.01,
  missesVertical: 0.06,
  callsSquint: 0.06,
  misses: 1,
};

/** The traits of a habit in the given round, counted from 0. */
export function traitsOf(habit: ReadingHabit, round: number): Traits {
  const untaught = Math.max(0, 1 - round / 4);
  switch (habit) {
    case "steady":
      return { ...CERTIFIED, slope: 0.95, missesVertical: 0.02, callsSquint: 0.03 };
    case "ordinary":
      return CERTIFIED;
    case "sliding":
      return { ...CERTIFIED, slope: 1, biasDegrees: 0.5 - 1.6 * round };
    case "misses-verticals":
      return { ...CERTIFIED, missesVertical: 0.65 };
    case "learning":
      return {
        ...CERTIFIED,
        slope: 0.9 - 0.2 * untaught,
        reverses: 0.03 + 0.06 * untaught,
        swapsEye: 0.04,
        missesVertical: 0.15 + 0.25 * untaught,
        callsSquint: 0.08 + 0.1 * untaught,
      };
    case "reverses-then-learns":
      return { ...CERTIFIED, slope: 0.88, reverses: round < 3 ? 0.55 : 0.05, missesVertical: 0.2, callsSquint: 0.12 };
  }
}

export type ModelReading = { finding: Finding; confidence: "sure" | "fairly-sure" | "unsure"; seconds: number };

/** One reading of a true finding by an examiner with these traits. `random` gives uniform numbers in [0, 1). */
export function readAs(truth: Finding, traits: Traits, random: () => number): ModelReading {
  const finding = truth.readable ? misread(truth, traits, random) : readUnreadable(truth, random);
  const isClear = finding.readable && sizeOf(truth) >= 10;
  return {
    finding,
    confidence: isClear && random() < 0.75 ? "sure" : random() < 0.7 ? "fairly-sure" : "unsure",
    seconds: Math.round(10 * (9 + 22 * random() ** 2 + (isClear ? 0 : 12 * random()))) / 10,
  };
}

function readUnreadable(truth: Finding, random: () => number): Finding {
  if (random() < 0.93) return truth;
  return deviation("left", "exo", estimate(15, CERTIFIED, random), "none", null);
}

function misread(truth: ReadableFinding, traits: Traits, random: () => number): Finding {
  if (random() < 0.006) return { readable: false, reason: "blurred" };
  if (truth.eye === "none") {
    if (random() >= traits.callsSquint) return truth;
    return deviation(random() < 0.5 ? "right" : "left", random() < 0.7 ? "exo" : "eso", 3 + Math.floor(7 * random()));
  }
  if (random() > chanceSeen(sizeOf(truth)) ** traits.misses) return ALIGNED;
  const eye = random() < traits.swapsEye ? other(truth.eye) : truth.eye;
  const isReversed = random() < traits.reverses;
  const seesVertical = truth.vertical !== "none" && (truth.horizontal === "none" || random() >= traits.missesVertical);
  const missesAll = truth.horizontal === "none" && random() < traits.missesVertical / 2;
  if (missesAll) return ALIGNED;
  const flip = <Direction>(direction: Direction, opposite: Direction) => (isReversed ? opposite : direction);
  const horizontal =
    truth.horizontal === "none" ? "none" : flip(truth.horizontal, truth.horizontal === "eso" ? "exo" : "eso");
  const vertical =
    truth.vertical === "none" || !seesVertical
      ? "none"
      : flip(truth.vertical, truth.vertical === "hyper" ? "hypo" : "hyper");
  return deviation(
    eye,
    horizontal,
    horizontal === "none" ? null : estimate(truth.horizontalDegrees, traits, random),
    vertical,
    vertical === "none" ? null : estimate(truth.verticalDegrees, traits, random),
  );
}

function chanceSeen(degrees: number): number {
  if (degrees >= 10) return 0.99;
  return degrees >= 5 ? 0.93 : 0.7;
}

function estimate(truth: Degrees | null, traits: Traits, random: () => number): Degrees {
  const size = truth === ">45" ? 52 : (truth ?? 0);
  const read = traits.slope * size + traits.biasDegrees + (2.3 + 0.1 * size) * gauss(random);
  if (read > DEGREES_MAX + 2.5) return ">45";
  const rounded = random() < 0.6 ? 5 * Math.round(read / 5) : Math.round(read);
  return Math.min(DEGREES_MAX, Math.max(1, rounded));
}

/** Box and Muller. */
function gauss(random: () => number): number {
  return Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
}

function sizeOf(finding: Finding): number {
  if (!finding.readable) return 0;
  const degrees = [finding.horizontalDegrees, finding.verticalDegrees].map((part) =>
    part === ">45" ? 50 : (part ?? 0),
  );
  return Math.max(...degrees);
}

function other(eye: "right" | "left"): "right" | "left" {
  return eye === "right" ? "left" : "right";
}

function deviation(
  eye: "right" | "left",
  horizontal: ReadableFinding["horizontal"],
  horizontalDegrees: Degrees | null,
  vertical: ReadableFinding["vertical"] = "none",
  verticalDegrees: Degrees | null = null,
): ReadableFinding {
  if (horizontal === "none" && vertical === "none") return ALIGNED;
  return { readable: true, eye, horizontal, horizontalDegrees, vertical, verticalDegrees };
}
