import { describe, expect, it } from "vitest";
import {
  formatCount,
  formatInterval,
  formatNumber,
  formatShare,
  formatSigned,
  formatSignedInterval,
} from "@/lib/format/numbers";

describe("formatNumber", () => {
  it("uses the minus sign, not the hyphen", () => {
    expect(formatNumber(-9.7)).toBe("\u22129.7");
    expect(formatNumber(-0.123, 2)).toBe("\u22120.12");
  });
  it("never signs what rounds to zero", () => {
    expect(formatNumber(-0.04)).toBe("0.0");
    expect(formatSigned(0.04)).toBe("0.0");
    expect(formatSigned(-0.04)).toBe("0.0");
    expect(formatSigned(0)).toBe("0.0");
  });
  it("refuses what is not a number, so that NaN never reaches a page", () => {
    expect(() => formatNumber(Number.NaN)).toThrow(RangeError);
    expect(() => formatSigned(Number.POSITIVE_INFINITY)).toThrow(RangeError);
  });
});

describe("formatSigned and intervals", () => {
  it("shows the sign of a difference on both sides of zero", () => {
    expect(formatSigned(12)).toBe("+12.0");
    expect(formatSigned(-5, 0)).toBe("\u22125");
    expect(formatSignedInterval(-9.7, 12)).toBe("\u22129.7 to +12.0");
  });
  it("writes an interval with a word between, so that a minus is not read as a dash", () => {
    expect(formatInterval(0.621, 0.949)).toBe("0.62 to 0.95");
    expect(formatInterval(-0.1, 0.3)).toBe("\u22120.10 to 0.30");
  });
});

describe("formatShare and formatCount", () => {
  it("keeps the number and its unit on one line", () => {
    expect(formatShare(0.857)).toBe("86\u00a0%");
  });
  it("agrees the noun with the count", () => {
    expect(formatCount(1, "reading")).toBe("1 reading");
    expect(formatCount(0, "reading")).toBe("0 readings");
    expect(formatCount(1200, "category", "categories")).toBe("1\u00a0200 categories");
  });
});
