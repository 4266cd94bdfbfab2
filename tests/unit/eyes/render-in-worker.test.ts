import { describe, expect, it } from "vitest";
import { drawPhotograph } from "@/lib/eyes/draw-photograph";
import { renderPhotograph } from "@/lib/eyes/render-in-worker";

const TINY = { seed: 12, width: 64, height: 28, supersample: 1, left: { esoDegrees: 20 } };

describe("renderPhotograph", { timeout: 60_000 }, () => {
  it("gives what drawing here gives", async () => {
    const there = await renderPhotograph(TINY);
    const here = drawPhotograph(TINY);
    expect(there.truth).toEqual(here.truth);
    expect([there.width, there.height]).toEqual([64, 28]);
    expect(Buffer.compare(there.data, here.data)).toBe(0);
  });

  it("leaves this thread free meanwhile", async () => {
    let ticks = 0;
    const timer = setInterval(() => {
      ticks += 1;
    }, 5);
    await renderPhotograph(TINY);
    clearInterval(timer);
    expect(ticks).toBeGreaterThan(5);
  });

  it("rejects when the drawing cannot be made", async () => {
    await expect(renderPhotograph({ ...TINY, width: -1 })).rejects.toThrow(RangeError);
  });
});
