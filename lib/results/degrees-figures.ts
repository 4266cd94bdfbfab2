import { BEYOND_LIMBUS, type Degrees, type ReadableFinding } from "@/lib/reflex/finding";
import { findingParts } from "@/lib/reflex/finding-parts";
import { signedComponents } from "@/lib/reflex/signed-components";
import { limitsOfAgreement } from "@/lib/statistics";
import type { ShownItem } from "./examiner-figures";
import type { DegreesFigures, LeftOut } from "./schema";

type Pair = { reading: number; reference: number };
/** A pair of degrees, or why there is none. */
type Compared = Pair | keyof LeftOut;

/** What is compared in degrees: the signed components, or the size alone. */
export const DEGREES_MEASURES = ["horizontal", "vertical", "size"] as const;
export type DegreesMeasure = (typeof DEGREES_MEASURES)[number];

/** Bias and limits of agreement of one measure, reading minus reference, and the pair behind each item. */
export function degreesFigures(items: readonly ShownItem[], measure: DegreesMeasure) {
  const compared = items.map((item) => compareDegrees(item, measure));
  return {
    figures: figuresOf(compared),
    pairs: compared.map((pair) => (typeof pair === "string" ? null : pair)),
  };
}

/**
 * The two numbers of degrees to compare, or why there are none.
 *
 * Signed components (eso +, right over left +, aligned 0) are compared wherever both are readable and not beyond the
 * limbus, so that they hold misses and reversals as well. The size of the larger part of the reference is compared
 * where its direction was read right: there one reversal does not outweigh every honest estimate.
 */
export function compareDegrees(item: ShownItem, measure: DegreesMeasure): Compared {
  const { reading, reference } = item;
  if (!reading) return "unread";
  if (!reading.readable || !reference.readable) return "notReadable";
  if (measure === "size") return compareSize(reading, reference);
  const read = signedComponents(reading)[measure];
  const assigned = signedComponents(reference)[measure];
  return read === null || assigned === null ? "beyondLimbus" : { reading: read, reference: assigned };
}

function compareSize(reading: ReadableFinding, reference: ReadableFinding): Compared {
  const component = largerPart(reference);
  if (!component) return "otherDirection";
  const read = findingParts(reading);
  const assigned = findingParts(reference);
  const isSameDirection =
    component === "horizontal"
      ? read.horizontal?.direction === assigned.horizontal?.direction
      : read.vertical?.sense === assigned.vertical?.sense;
  const readDegrees = read[component]?.degrees;
  const assignedDegrees = assigned[component]?.degrees;
  if (!isSameDirection || readDegrees === undefined || assignedDegrees === undefined) return "otherDirection";
  if (readDegrees === BEYOND_LIMBUS || assignedDegrees === BEYOND_LIMBUS) return "beyondLimbus";
  return { reading: readDegrees, reference: assignedDegrees };
}

function largerPart(finding: ReadableFinding): "horizontal" | "vertical" | null {
  const { horizontal, vertical } = findingParts(finding);
  if (!horizontal && !vertical) return null;
  return order(vertical?.degrees) > order(horizontal?.degrees) ? "vertical" : "horizontal";
}

function order(degrees: Degrees | undefined): number {
  return degrees === BEYOND_LIMBUS ? Number.POSITIVE_INFINITY : (degrees ?? 0);
}

function figuresOf(compared: readonly Compared[]): DegreesFigures {
  const pairs = compared.filter((pair) => typeof pair !== "string");
  const countOf = (reason: keyof LeftOut) => compared.filter((pair) => pair === reason).length;
  const limits = limitsOfAgreement(
    pairs.map(({ reading }) => reading),
    pairs.map(({ reference }) => reference),
  );
  return {
    limits: limits.ok
      ? { ok: true, n: limits.n, bias: limits.bias, sd: limits.sd, lower: limits.lower, upper: limits.upper }
      : limits,
    leftOut: {
      unread: countOf("unread"),
      notReadable: countOf("notReadable"),
      beyondLimbus: countOf("beyondLimbus"),
      otherDirection: countOf("otherDirection"),
    },
  };
}
