import { type Degrees, type Eye, findingFaults, type Horizontal, type ReadableFinding, type Vertical } from "./finding";

/** Which eye stands higher, whichever eye is named: right hyper and left hypo are the same deviation. */
export type VerticalSense = "right over left" | "left over right";

export type HorizontalPart = { direction: Horizontal; degrees: Degrees };
export type VerticalPart = { direction: Vertical; sense: VerticalSense; degrees: Degrees };
export type FindingParts = { horizontal: HorizontalPart | null; vertical: VerticalPart | null };

/** The parts of a readable finding, each with its degrees, or null where there is none. Throws RangeError on a faulty finding. */
export function findingParts(finding: ReadableFinding): FindingParts {
  const [fault] = findingFaults(finding);
  if (fault) throw new RangeError(`Not a finding: ${fault.message}`);
  const { eye, horizontal, horizontalDegrees, vertical, verticalDegrees } = finding;
  return {
    horizontal:
      horizontal === "none" || horizontalDegrees === null
        ? null
        : { direction: horizontal, degrees: horizontalDegrees },
    vertical:
      eye === "none" || vertical === "none" || verticalDegrees === null
        ? null
        : { direction: vertical, sense: verticalSense(eye, vertical), degrees: verticalDegrees },
  };
}

function verticalSense(eye: Eye, vertical: Vertical): VerticalSense {
  return (eye === "right") === (vertical === "hyper") ? "right over left" : "left over right";
}
