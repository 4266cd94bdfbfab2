import { describeFinding } from "@/lib/reflex/describe-finding";
import type { Finding } from "@/lib/reflex/finding";
import { ChartTable } from "./chart-table";
import { groupFindings } from "./reading-map-words";

type ReadingMapTableProps = { reference?: Finding; own?: Finding; others?: readonly Finding[]; title: string };

/** The same readings as ReadingMap; those of others together, without names. */
export function ReadingMapTable({ reference, own, others = [], title }: ReadingMapTableProps) {
  const rows = [
    ...(reference ? [{ id: "reference", cells: ["Reference", describeFinding(reference), "1"] }] : []),
    ...(own ? [{ id: "own", cells: ["You", describeFinding(own), "1"] }] : []),
    ...groupFindings(others).map(({ text, count }) => ({ id: text, cells: ["Others", text, String(count)] })),
  ];
  const columns = [{ label: "Who" }, { label: "Finding" }, { label: "Readings", isNumber: true }];
  return <ChartTable caption={title} columns={columns} rows={rows} />;
}
