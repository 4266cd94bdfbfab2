import { formatCount } from "@/lib/format/numbers";
import { tallyGroups } from "./tally";

export type ErrorTallyRow = {
  kind: string;
  label: string;
  hint: string;
  count: number;
  /** Where the readings of this kind are shown. */
  href?: string;
};

/** Kinds of error among `total` readings: one stroke a reading, in fives, with the number beside it. */
export function ErrorTally({ rows, total }: { rows: ErrorTallyRow[]; total: number }) {
  const together = rows.reduce((sum, row) => sum + row.count, 0);
  return (
    <table className="w-full border-collapse border-b border-ink text-table">
      <thead>
        <tr className="*:border-b *:border-edge *:pb-2 *:text-small *:font-semibold *:text-ink-2">
          <th scope="col" className="text-left">
            Kind
          </th>
          <th scope="col" colSpan={2} className="text-right">
            Readings
          </th>
        </tr>
      </thead>
      <tbody>
        {rows.map(({ kind, label, hint, count, href }) => (
          <tr key={kind} className="*:border-b *:border-hair *:py-2.5">
            <th scope="row" className="pr-4 text-left font-normal">
              <span className="block font-semibold">{href && count > 0 ? <a href={href}>{label}</a> : label}</span>
              <span className="block text-small text-ink-2">{hint}</span>
            </th>
            <td aria-hidden="true" className="w-2/5 max-w-60">
              <Strokes count={count} />
            </td>
            <td className="w-12 text-right font-mono text-table">{count}</td>
          </tr>
        ))}
      </tbody>
      <tfoot>
        <tr className="*:py-2.5 *:text-small *:text-ink-2">
          <th scope="row" colSpan={2} className="text-left font-normal">
            Together, of {formatCount(total, "reading")}
          </th>
          <td className="text-right font-mono">{together}</td>
        </tr>
      </tfoot>
    </table>
  );
}

/** Groups wrap as whole fives, so that a long tally stays countable. */
function Strokes({ count }: { count: number }) {
  return (
    <span className="flex flex-wrap gap-x-2.5 gap-y-1">
      {tallyGroups(count).map((strokes, i) => (
        // biome-ignore lint/suspicious/noArrayIndexKey: a group of strokes has no identity but its place
        <svg key={i} aria-hidden="true" width={strokes === 5 ? 26 : 20} height={20} className="stroke-ink stroke-[1.8]">
          {Array.from({ length: Math.min(strokes, 4) }, (_, at) => `M${4.5 + at * 5.5} 3v14`).map((d) => (
            <path key={d} d={d} />
          ))}
          {strokes === 5 && <path d="M1 16.5L25 3.5" />}
        </svg>
      ))}
    </span>
  );
}
