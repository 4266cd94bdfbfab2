import { describe, expect, it } from "vitest";
import { measureLidClearance } from "@/lib/eyes/lid-clearance";

describe("measureLidClearance", () => {
  it("finds the reflex of an open eye well between the lids", () => {
    expect(measureLidClearance({ seed: 31 }, "right").reflex).toBeGreaterThan(4);
  });

  it("is negative where a lid hangs over the reflex, in that eye alone", () => {
    const drooping = { seed: 31, left: { opening: 0.35 } };
    expect(measureLidClearance(drooping, "left").reflex).toBeLessThan(0);
    expect(measureLidClearance(drooping, "right").reflex).toBeGreaterThan(4);
  });
});
