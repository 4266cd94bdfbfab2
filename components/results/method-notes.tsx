import Link from "next/link";
import { formatNumber } from "@/lib/format/numbers";
import type { RoundResults } from "@/lib/results/schema";

/** What the figures rest on, in plain words. */
export function MethodNotes({ results }: { results: RoundResults }) {
  const { amongExaminers, kappa } = results.panel;
  return (
    <section className="max-w-read text-small text-ink-2">
      <h2 className="mb-2.5 text-h3 text-ink">Methods</h2>
      <p>
        Convention of the degrees: {results.round.convention}. Direction kappa compares eye, horizontal and vertical
        direction as one label, “not readable” among them; a purely vertical deviation may be named on either eye. Its
        interval is asymptotic (Fleiss, Cohen and Everitt 1969). Steps are 0, 15, 30, 45 and beyond 45 degrees. Limits
        of agreement follow Bland and Altman 1999 on pairs that are both readable and not beyond the limbus. Shares have
        Wilson intervals. Each case counts once; hidden repeats are left out.
      </p>
      <p className="mt-2">
        Everybody together:{" "}
        {kappa.ok ? `kappa against the reference ${formatNumber(kappa.kappa.estimate, 2)}` : kappa.reason}
        {amongExaminers.ok && `, Fleiss’ kappa among examiners ${formatNumber(amongExaminers.kappa.estimate, 2)}`}.
        Intervals of the panel resample the cases 1,000 times. Method version {results.methodVersion}, revision{" "}
        {results.revision} ({results.reason}).
      </p>
      <p className="mt-2">
        A score describes readings of this set under these conditions, not work in the clinic.{" "}
        <Link href="/method" className="whitespace-nowrap print:hidden">
          How each figure is computed
        </Link>
      </p>
    </section>
  );
}
