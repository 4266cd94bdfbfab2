const MONTHS = [
  ...["January", "February", "March", "April", "May", "June"],
  ...["July", "August", "September", "October", "November", "December"],
];

/** date: 14 March 2026; day: 14 March; shortDay: 14 Mar; clock: 18:00; moment: 14 March 2026, 18:00. */
export type TimeForm = "date" | "day" | "shortDay" | "clock" | "moment";

/**
 * An instant as people of one time zone write it.
 *
 * Only the numbers come from Intl: month names and punctuation differ between the server's and the browser's language
 * data, and a text that changes on hydration is an error.
 * Throws RangeError when `iso` is no instant or `zone` (an IANA name) is unknown.
 */
export function formatTime(iso: string, zone: string, form: TimeForm): string {
  const parts = new Intl.DateTimeFormat("en-GB", {
    timeZone: zone,
    hourCycle: "h23",
    ...({ year: "numeric", month: "numeric", day: "numeric", hour: "2-digit", minute: "2-digit" } as const),
  }).formatToParts(new Date(iso));
  const part = (type: Intl.DateTimeFormatPartTypes) => parts.find((found) => found.type === type)?.value ?? "";
  const month = MONTHS[Number(part("month")) - 1] ?? "";
  const day = `${Number(part("day"))} ${month}`;
  const clock = `${part("hour")}:${part("minute")}`;
  switch (form) {
    case "date":
      return `${day} ${part("year")}`;
    case "day":
      return day;
    case "shortDay":
      return `${Number(part("day"))} ${month.slice(0, 3)}`;
    case "clock":
      return clock;
    case "moment":
      return `${day} ${part("year")}, ${clock}`;
  }
}

/** "Madrid time" for Europe/Madrid; a zone without a place keeps its name. */
export function zoneName(zone: string): string {
  const place = zone.split("/").at(-1)?.replaceAll("_", " ") ?? zone;
  return zone.includes("/") ? `${place} time` : zone;
}
