import fc from "fast-check";
import {
  ALIGNED,
  BEYOND_LIMBUS,
  DEGREES_MAX,
  type Degrees,
  type Eye,
  type Finding,
  type Horizontal,
  type ReadableFinding,
  UNREADABLE_REASONS,
  type Vertical,
} from "@/lib/reflex/finding";

export const arbitraryDegrees: fc.Arbitrary<Degrees> = fc.oneof(
  { weight: 9, arbitrary: fc.integer({ min: 1, max: DEGREES_MAX }) },
  { weight: 1, arbitrary: fc.constant(BEYOND_LIMBUS) },
);

const eye = fc.constantFrom<Eye>("right", "left");
const horizontal = { horizontal: fc.constantFrom<Horizontal>("eso", "exo"), horizontalDegrees: arbitraryDegrees };
const vertical = { vertical: fc.constantFrom<Vertical>("hyper", "hypo"), verticalDegrees: arbitraryDegrees };

/** A sound readable finding that deviates: horizontally, vertically or both. */
export const arbitraryDeviation: fc.Arbitrary<ReadableFinding> = fc
  .oneof(
    fc.record({ eye, ...horizontal }),
    fc.record({ eye, ...vertical }),
    fc.record({ eye, ...horizontal, ...vertical }),
  )
  .map((parts) => ({ ...ALIGNED, ...parts }));

/** Every sound finding: deviations, aligned, and not readable for each reason. */
export const arbitraryFinding: fc.Arbitrary<Finding> = fc.oneof(
  { weight: 8, arbitrary: arbitraryDeviation },
  { weight: 1, arbitrary: fc.constant<Finding>(ALIGNED) },
  {
    weight: 1,
    arbitrary: fc.constantFrom(...UNREADABLE_REASONS).map((reason): Finding => ({ readable: false, reason })),
  },
);
