import Link from "next/link";
import type { DriftBoard } from "@/lib/drift/schema";

/** The results behind the charts. */
export function RoundLinks({ rounds }: { rounds: DriftBoard["rounds"] }) {
  return (
    <section>
      <h2 className="mb-2 text-h3">Results of the rounds</h2>
      <ul className="flex flex-wrap gap-x-5 gap-y-1">
        {rounds.map(({ id, number, title }) => (
          <li key={id}>
            <Link href={`/rounds/${id}/results`}>
              R{number}. {title}
            </Link>
          </li>
        ))}
      </ul>
    </section>
  );
}
