import { formatTime, type TimeForm, zoneName } from "./format-time";

type TimeProps = {
  /** An instant in ISO 8601, with its offset or Z. */
  iso: string;
  /** The department's time zone, an IANA name such as "Europe/Madrid". */
  zone: string;
  form?: TimeForm;
  /** Names the zone after the time, where somebody elsewhere could read it as theirs. */
  showsZone?: boolean;
  className?: string;
};

export function Time({ iso, zone, form = "moment", showsZone = false, className }: TimeProps) {
  return (
    <time dateTime={iso} title={`${formatTime(iso, zone, "moment")}, ${zoneName(zone)}`} className={className}>
      {formatTime(iso, zone, form)}
      {showsZone && ` (${zoneName(zone)})`}
    </time>
  );
}
