import type { PixelPoint } from "@/lib/eyes/canvas";
import { findTruthInPixels, type PhotographTruth } from "@/lib/eyes/truth-in-pixels";
import type { CasePlan, DemoCase } from "./demo-case";
import { findingShown } from "./finding-shown";

/** Everything about a case but its picture; costs nothing, since truth and finding follow from the parameters. */
export function describeCase(plan: CasePlan): DemoCase {
  return {
    code: plan.code,
    file: `${plan.code}.jpg`,
    isAnchor: plan.isAnchor ?? false,
    note: plan.note,
    finding: plan.unreadable ? { readable: false, reason: plan.unreadable } : findingShown(plan.parameters),
    parameters: plan.parameters,
    truth: thinRings(findTruthInPixels(plan.parameters)),
  };
}

/** Every third point of a ring keeps its shape and a third of the file. */
function thinRings(truth: PhotographTruth): PhotographTruth {
  const thin = (ring: PixelPoint[]) => ring.filter((_, i) => i % 3 === 0);
  const { right, left } = truth.eyes;
  const thinEye = (eye: typeof right) => ({
    ...eye,
    limbus: thin(eye.limbus),
    midway: thin(eye.midway),
    pupilMargin: thin(eye.pupilMargin),
  });
  return { pxPerMm: truth.pxPerMm, eyes: { right: thinEye(right), left: thinEye(left) } };
}
