/**
 * Local times of a time zone, as date and time controls hold them ("2026-03-14T18:00"), and instants.
 * Zones are IANA names. No library: the Intl data of the engine knows every zone and its summer time.
 */

/** The local time of an instant in a zone, to the minute. */
export function toZonedInput(iso: string, zone: string): string {
  return localParts(new Date(iso), zone).slice(0, 16);
}

/**
 * The instant (ISO, UTC) of a local time in a zone. A time that the clocks skip in spring moves forward by what they
 * skip; of a time that they show twice in autumn the first is meant. Null when the text is no date and time.
 */
export function fromZonedInput(local: string, zone: string): string | null {
  if (!/^\d{4}-\d\d-\d\dT\d\d:\d\d$/.test(local)) return null;
  const wished = Date.parse(`${local}:00Z`);
  // The engine takes 30 February for 2 March.
  if (Number.isNaN(wished) || !new Date(wished).toISOString().startsWith(local)) return null;
  // The offset in force lies within a day of the wished time read as UTC; one of the two neighbours fits.
  const offsets = [wished - 86_400_000, wished + 86_400_000].map((instant) => offsetMs(instant, zone));
  const candidates = offsets.map((offset) => wished - offset);
  const exact = candidates.filter((instant) => instant + offsetMs(instant, zone) === wished);
  const instant = exact.length > 0 ? Math.min(...exact) : wished - (offsets[0] ?? 0);
  return new Date(instant).toISOString();
}

/** How far a zone's clocks are ahead of UTC at an instant, in milliseconds. */
function offsetMs(instant: number, zone: string): number {
  const seconds = Math.floor(instant / 1000) * 1000;
  return Date.parse(`${localParts(new Date(seconds), zone)}Z`) - seconds;
}

function localParts(date: Date, zone: string): string {
  const parts = new Intl.DateTimeFormat("en-GB", {
    timeZone: zone,
    hourCycle: "h23",
    year: "numeric",
    month: "2-digit",
    day: "2-digit",
    hour: "2-digit",
    minute: "2-digit",
    second: "2-digit",
  }).formatToParts(date);
  const part = (type: Intl.DateTimeFormatPartTypes) => parts.find((found) => found.type === type)?.value ?? "";
  const year = part("year").padStart(4, "0");
  return `${year}-${part("month")}-${part("day")}T${part("hour")}:${part("minute")}:${part("second")}`;
}
