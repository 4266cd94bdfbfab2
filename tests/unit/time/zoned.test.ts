import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { fromZonedInput, toZonedInput } from "@/lib/time/zoned";

/**
 * Clock changes of 2026 (from memory; the engine's own zone data must agree): London 29 March 01:00 UTC and 25 October
 * 01:00 UTC, New York 8 March 07:00 UTC and 1 November 06:00 UTC.
 */
const LONDON = "Europe/London";
const NEW_YORK = "America/New_York";

describe("fromZonedInput", () => {
  it.each([
    [LONDON, "2026-01-15T18:00", "2026-01-15T18:00:00.000Z"],
    [LONDON, "2026-07-15T18:00", "2026-07-15T17:00:00.000Z"],
    [NEW_YORK, "2026-01-15T18:00", "2026-01-15T23:00:00.000Z"],
    [NEW_YORK, "2026-07-15T18:00", "2026-07-15T22:00:00.000Z"],
    ["Asia/Kathmandu", "2026-07-15T00:15", "2026-07-14T18:30:00.000Z"],
    ["Pacific/Kiritimati", "2026-01-01T00:30", "2025-12-31T10:30:00.000Z"],
    ["Pacific/Pago_Pago", "2026-01-01T23:30", "2026-01-02T10:30:00.000Z"],
    ["UTC", "2028-02-29T00:00", "2028-02-29T00:00:00.000Z"],
  ])("knows the offset of %s at %s", (zone, local, instant) => {
    expect(fromZonedInput(local, zone)).toBe(instant);
  });
  it.each([
    [LONDON, "2026-03-29T00:59", "2026-03-29T00:59:00.000Z"],
    [LONDON, "2026-03-29T02:00", "2026-03-29T01:00:00.000Z"],
    [NEW_YORK, "2026-03-08T01:59", "2026-03-08T06:59:00.000Z"],
    [NEW_YORK, "2026-03-08T03:00", "2026-03-08T07:00:00.000Z"],
    [LONDON, "2026-10-25T00:59", "2026-10-24T23:59:00.000Z"],
    [LONDON, "2026-10-25T02:00", "2026-10-25T02:00:00.000Z"],
    [NEW_YORK, "2026-11-01T00:59", "2026-11-01T04:59:00.000Z"],
    [NEW_YORK, "2026-11-01T02:00", "2026-11-01T07:00:00.000Z"],
  ])("is right up to the minute of a clock change in %s: %s", (zone, local, instant) => {
    expect(fromZonedInput(local, zone)).toBe(instant);
  });
  it.each([
    [LONDON, "2026-03-29T01:30", "2026-03-29T02:30"],
    [NEW_YORK, "2026-03-08T02:30", "2026-03-08T03:30"],
  ])("moves a time that %s skips in spring forward by what is skipped", (zone, skipped, meant) => {
    const instant = fromZonedInput(skipped, zone);
    expect(instant).toBe(fromZonedInput(meant, zone));
    expect(instant && toZonedInput(instant, zone)).toBe(meant);
  });
  it.each([
    [LONDON, "2026-10-25T01:30", "2026-10-25T00:30:00.000Z"],
    [NEW_YORK, "2026-11-01T01:30", "2026-11-01T05:30:00.000Z"],
  ])("means the first of two times that %s shows twice in autumn", (zone, local, instant) => {
    expect(fromZonedInput(local, zone)).toBe(instant);
  });
  it.each([
    "",
    "2026-01-15",
    "18:00",
    "2026-1-15T18:00",
    "2026-01-15T18:00:00",
    "2026-01-15T24:30",
    "2026-13-01T00:00",
    "2026-02-30T10:00",
    "2027-02-29T10:00",
    "2026-04-31T10:00",
    "tomorrow",
  ])("gives null for what is no date and time: %j", (text) => {
    expect(fromZonedInput(text, LONDON)).toBeNull();
  });
});

describe("toZonedInput", () => {
  it("shows the same local time twice in autumn, an hour apart", () => {
    expect(toZonedInput("2026-10-25T00:30:00.000Z", LONDON)).toBe("2026-10-25T01:30");
    expect(toZonedInput("2026-10-25T01:30:00.000Z", LONDON)).toBe("2026-10-25T01:30");
  });
  it("shows midnight as the hour 00 of the new day", () => {
    expect(toZonedInput("2026-01-01T05:00:00.000Z", NEW_YORK)).toBe("2026-01-01T00:00");
  });
});

describe("a local time and its instant", () => {
  const zones = fc.constantFrom(LONDON, NEW_YORK, "Asia/Kathmandu", "Australia/Lord_Howe", "Pacific/Apia", "UTC");
  const minutes = fc.integer({ min: Date.UTC(2015, 0) / 60_000, max: Date.UTC(2045, 0) / 60_000 });

  it("come back from one another, but for the hour that is shown twice, of which the first is meant", () => {
    fc.assert(
      fc.property(zones, minutes, (zone, minute) => {
        const instant = new Date(minute * 60_000);
        const local = toZonedInput(instant.toISOString(), zone);
        const back = fromZonedInput(local, zone);
        expect(back && toZonedInput(back, zone)).toBe(local);
        const laterByMs = instant.getTime() - Date.parse(back ?? "");
        expect([0, 30, 60].map((shown) => shown * 60_000)).toContain(laterByMs); // Lord Howe goes by half an hour
      }),
      { numRuns: 300 },
    );
  });
  it("come back at every minute of the days on which clocks change", () => {
    for (const [zone, day] of [
      [LONDON, Date.UTC(2026, 2, 29)],
      [LONDON, Date.UTC(2026, 9, 25)],
      [NEW_YORK, Date.UTC(2026, 2, 8)],
      [NEW_YORK, Date.UTC(2026, 10, 1)],
    ] as const) {
      const seen = new Map<string, string>();
      for (let minute = 0; minute < 24 * 60; minute += 5) {
        const instant = new Date(day + minute * 60_000).toISOString();
        const local = toZonedInput(instant, zone);
        if (!seen.has(local)) seen.set(local, instant);
        expect(fromZonedInput(local, zone)).toBe(seen.get(local));
      }
    }
  });
});
