import Link from "next/link";
import { PhotographThumb } from "@/components/ui/photograph-thumb";
import { caseLabel } from "@/lib/cases/case-kind";
import type { CaseSummary } from "@/lib/cases/schema";

export function CaseGrid({ cases }: { cases: CaseSummary[] }) {
  return (
    <ul className="grid grid-cols-1 gap-4 sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
      {cases.map((each) => (
        <li key={each.id}>
          <Link
            href={`/cases/${each.id}`}
            className="block h-full border border-hair bg-sheet text-ink no-underline hover:border-ink"
          >
            <PhotographThumb src={`${each.photographHref}?size=small`} width={640} height={280} alt="" />
            <span className="flex flex-wrap items-baseline gap-x-2.5 px-3 py-2 text-small">
              <b className="font-mono">{each.code}</b>
              <span className="font-mono">{caseLabel(each.finding)}</span>
              <span className="ml-auto text-ink-2">{caseUse(each)}</span>
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}

function caseUse({ isRetired, isAnchor, lastRoundNumber }: CaseSummary): string {
  if (isRetired) return "retired";
  const use = lastRoundNumber ? `round ${lastRoundNumber}` : "new";
  return isAnchor ? `anchor, ${use}` : use;
}
