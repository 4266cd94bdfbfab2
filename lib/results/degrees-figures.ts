import { BEYOND_LIMBUS, type Degrees, type Finding } from "@/lib/reflex/finding";
import { findingParts } from "@/lib/reflex/finding-parts";
import { signedComponents } from "@/lib/reflex/signed-components";
import { limitsOfAgreement } from "@/lib/statistics";
import type { ShownItem } from "./examiner-figures";
import type { DegreesFigures, LeftOut } from "./schema";

type Pair = { reading: number; reference: number };
/** A pair of degrees, or why there is none. */
type Compared = Pair | keyof LeftOut;

/** Bias and limits of the horizontal component (degrees, eso +), and the pair behind each item. */
export function horizontalFigures(items: readonly ShownItem[]) {
  return componentFigures(items, "horizontal");
}

/** Bias and limits of the vertical component (degrees, right over left +), and the pair behind each item. */
export function verticalFigures(items: readonly ShownItem[]) {
  return componentFigures(items, "vertical");
}

function componentFigures(items: readonly ShownItem[], component: "horizontal" | "vertical") {
  const compared = items.map((item) => compareComponent(item, component));
  return {
    figures: figuresOf(compared),
    pairs: compared.map((pair) => (typeof pair === "string" ? null : pair)),
  };
}

/**
 * Bias and limits of the size alone (degrees, without direction) of the larger part of the reference, where its
 * direction was read right. Aligned pairs have no size and are left out.
 */
export function sizeFigures(items: readonly ShownItem[]): DegreesFigures {
  return figuresOf(items.map(compareSize));
}

/**
 * The two signed components, compared where both are readable, not beyond the limbus and of one direction (none counts
 * as one). A reversed or missed direction is a blunder to be counted: one of them would outweigh every honest estimate.
 */
export function compareComponent({ reading, reference }: ShownItem, component: "horizontal" | "vertical"): Compared {
  if (!reading) return "unread";
  if (!reading.readable || !reference.readable) return "notReadable";
  const read = signedComponents(reading)[component];
  const assigned = signedComponents(reference)[component];
  if (read === null || assigned === null) return "beyondLimbus";
  return Math.sign(read) === Math.sign(assigned) ? { reading: read, reference: assigned } : "otherDirection";
}

function compareSize({ reading, reference }: ShownItem): Compared {
  if (!reading) return "unread";
  if (!reading.readable || !reference.readable) return "notReadable";
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

function largerPart(finding: Finding): "horizontal" | "vertical" | null {
  if (!finding.readable) return null;
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
