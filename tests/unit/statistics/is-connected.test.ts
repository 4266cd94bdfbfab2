import { describe, expect, it } from "vitest";
import { isConnected } from "@/lib/statistics/is-connected";

describe("isConnected", () => {
  it("follows links through both factors", () => {
    // 0 and 1 share nothing, but both meet 2: 0-0, 2-0, 2-1, 1-1.
    expect(isConnected([0, 2, 2, 1], [0, 0, 1, 1])).toBe(true);
    expect(isConnected([0, 2, 1], [0, 0, 1])).toBe(false);
  });

  it("keeps levels of the two factors apart even when their numbers are equal", () => {
    expect(isConnected([0, 1], [1, 0])).toBe(false);
  });

  it("takes a long chain, and calls nothing connected", () => {
    const chain = Array.from({ length: 4000 }, (_, i) => i);
    expect(
      isConnected(
        chain,
        chain.map((i) => Math.ceil(i / 2) * 2),
      ),
    ).toBe(false);
    expect(isConnected([...chain, ...chain], [...chain, ...chain.map((i) => i + 1)])).toBe(true);
    expect(isConnected([], [])).toBe(true);
  });
});
