import { describe, expect, it } from "vitest";
import { formatTime, zoneName } from "@/components/ui/format-time";

describe("formatTime", () => {
  it("writes the day of the department, not of the server", () => {
    const justBeforeMidnightUtc = "2026-03-14T23:30:00Z";
    expect(formatTime(justBeforeMidnightUtc, "Europe/Madrid", "moment")).toBe("15 March 2026, 00:30");
    expect(formatTime(justBeforeMidnightUtc, "America/Bogota", "moment")).toBe("14 March 2026, 18:30");
  });
  it("follows summer time", () => {
    // Madrid moves from UTC+1 to UTC+2 on 29 March 2026 at 01:00 UTC.
    expect(formatTime("2026-03-29T00:59:00Z", "Europe/Madrid", "clock")).toBe("01:59");
    expect(formatTime("2026-03-29T01:00:00Z", "Europe/Madrid", "clock")).toBe("03:00");
  });
  it("has a form for each place", () => {
    const iso = "2026-09-05T08:05:00+02:00";
    const forms = (["date", "day", "shortDay", "clock"] as const).map((form) => formatTime(iso, "Europe/Madrid", form));
    expect(forms).toEqual(["5 September 2026", "5 September", "5 Sep", "08:05"]);
  });
  it("refuses what is no instant and no zone", () => {
    expect(() => formatTime("soon", "Europe/Madrid", "date")).toThrow(RangeError);
    expect(() => formatTime("2026-03-14T18:00:00Z", "Europe/Nowhere", "date")).toThrow(RangeError);
  });
});

describe("zoneName", () => {
  it("names the place a clock belongs to", () => {
    expect(zoneName("America/Mexico_City")).toBe("Mexico City time");
    expect(zoneName("UTC")).toBe("UTC");
  });
});
