import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fitText, keepReadable, spreadLabels } from "@/components/charts/place-labels";

const wish = fc.record({ centre: fc.integer({ min: 0, max: 400 }), size: fc.integer({ min: 4, max: 30 }) });

describe("spreadLabels", () => {
  it("leaves labels alone that have room", () => {
    expect(
      spreadLabels(
        [
          { centre: 20, size: 10 },
          { centre: 60, size: 10 },
        ],
        0,
        100,
      ),
    ).toEqual([20, 60]);
  });
  it("moves two that collide apart by equal amounts", () => {
    expect(
      spreadLabels(
        [
          { centre: 50, size: 10 },
          { centre: 50, size: 10 },
        ],
        0,
        100,
        2,
      ),
    ).toEqual([44, 56]);
  });
  it("never lets two overlap, nor leaves the room, whatever is asked", () => {
    fc.assert(
      fc.property(fc.array(wish, { maxLength: 8 }), (wishes) => {
        const centres = spreadLabels(wishes, 0, 400, 2);
        const placed = wishes
          .map(({ size }, i) => ({ from: (centres[i] ?? 0) - size / 2, to: (centres[i] ?? 0) + size / 2 }))
          .sort((a, b) => a.from - b.from);
        const isWrong = placed.some(
          (label, i) =>
            label.from < -1e-6 || label.to > 400 + 1e-6 || label.from < (placed[i - 1]?.to ?? -2) + 2 - 1e-6,
        );
        expect(isWrong).toBe(false);
      }),
    );
  });
  it("keeps the order of the wishes, so that upper stays above lower", () => {
    const [first = 0, second = 0, third = 0] = spreadLabels(
      [
        { centre: 12, size: 18 },
        { centre: 10, size: 18 },
        { centre: 11, size: 18 },
      ],
      0,
      200,
    );
    expect(second).toBeLessThan(third);
    expect(third).toBeLessThan(first);
  });
});

describe("keepReadable", () => {
  it("keeps the latest label and drops what would touch it", () => {
    const labels = [0, 20, 40, 60].map((centre) => ({ centre, size: 30 }));
    expect(keepReadable(labels, 4)).toEqual([false, true, false, true]);
  });
  it("keeps everything where there is room", () => {
    expect(keepReadable([0, 50, 100].map((centre) => ({ centre, size: 20 })))).toEqual([true, true, true]);
  });
});

describe("fitText", () => {
  const measure = (text: string) => text.length * 10;
  it("shortens only what does not fit", () => {
    expect(fitText("Adaeze Winmarsh", 150, measure)).toBe("Adaeze Winmarsh");
    expect(fitText("Adaeze Winmarsh", 100, measure)).toBe("Adaeze Wi…");
    expect(fitText("Adaeze Winmarsh", 80, measure)).toBe("Adaeze…"); // no space before the ellipsis
  });
});
