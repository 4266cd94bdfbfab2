import { DataTable } from "@/components/ui/data-table";
import type { DriftBoard, DriftChart } from "@/lib/drift/schema";
import { formatSigned, formatSignedInterval } from "@/lib/format/numbers";
import { limitsText } from "./chart-points";

const COLUMNS = [
  { key: "round", head: "Round" },
  { key: "n", head: "Pairs", isNumeric: true },
  { key: "bias", head: "Bias (95 % interval)", isNumeric: true },
  { key: "limits", head: "Limits of agreement", isNumeric: true, phone: "end" as const },
];

export function LimitsOverRounds({ chart, rounds }: { chart: DriftChart; rounds: DriftBoard["rounds"] }) {
  return (
    <DataTable
      caption="Bias and limits of agreement of each round, degrees."
      columns={COLUMNS}
      className="mt-5"
      rows={chart.points.map((point) => ({
        id: point.roundId,
        cells: {
          round: rounds.find(({ id }) => id === point.roundId)?.title ?? "",
          n: point.n,
          bias: point.value ? biasText(point.value) : (point.reason ?? "–"),
          limits: limitsText(point),
        },
      }))}
    />
  );
}

function biasText({ estimate, low, high }: NonNullable<DriftChart["points"][number]["value"]>): string {
  const interval = low !== undefined && high !== undefined ? ` (${formatSignedInterval(low, high)})` : "";
  return `${formatSigned(estimate)}${interval}`;
}
