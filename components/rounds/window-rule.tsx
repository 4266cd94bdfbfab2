import { formatTime } from "@/components/ui/format-time";
import { ProgressRule } from "@/components/ui/progress-rule";

type WindowRuleProps = { opensAt: string; closesAt: string; now: string; zone: string };

const DAY_MS = 86_400_000;

/** The days of a round on the rule, the glint on today. */
export function WindowRule({ opensAt, closesAt, now, zone }: WindowRuleProps) {
  const opens = Date.parse(opensAt);
  const count = Math.max(2, Math.ceil((Date.parse(closesAt) - opens) / DAY_MS) + 1);
  const passed = Math.floor((Date.parse(now) - opens) / DAY_MS) + 1;
  const current = passed < 1 ? null : Math.min(count, passed);
  const every = Math.ceil(count / 4);
  const labels = Array.from({ length: count }, (_, index) => {
    if (index === count - 1)
      return `closes ${formatTime(closesAt, zone, "shortDay")} ${formatTime(closesAt, zone, "clock")}`;
    const isFarFromEnd = index < count / 2; // the last label is long and reaches far to the left on a phone
    return index % every === 0 && isFarFromEnd
      ? formatTime(new Date(opens + index * DAY_MS).toISOString(), zone, "shortDay")
      : null;
  });
  return (
    <ProgressRule
      label="Days of the round"
      count={count}
      done={current ?? 0}
      current={current}
      labels={labels}
      valueText={`Opens ${formatTime(opensAt, zone, "moment")}, closes ${formatTime(closesAt, zone, "moment")}`}
      isFilled
    />
  );
}
