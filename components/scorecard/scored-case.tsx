import { ReadingMap } from "@/components/charts/reading-map";
import { PhotographThumb } from "@/components/ui/photograph-thumb";
import { describeFinding } from "@/lib/reflex/describe-finding";
import { ERROR_KINDS, isBlunder } from "@/lib/reflex/error-kind";
import { explainReflex } from "@/lib/reflex/explain-reflex";
import type { Scorecard } from "@/lib/results/schema";

type Case = Scorecard["cases"][number];

/** One case with its photograph, the reference, the own reading, and what differed. */
export function ScoredCase({ each }: { each: Case }) {
  return (
    <li className="grid gap-x-6 gap-y-3 border-b border-hair py-5 first:border-t sm:grid-cols-2 lg:grid-cols-[20rem_minmax(0,1fr)_17rem]">
      {each.pictureHref && each.reference && (
        <OpenCase each={each} pictureHref={each.pictureHref} reference={each.reference} />
      )}
    </li>
  );
}

type OpenCaseProps = { each: Case; pictureHref: string; reference: NonNullable<Case["reference"]> };

function OpenCase({ each, pictureHref, reference }: OpenCaseProps) {
  const { place, reading, error } = each;
  return (
    <>
      <PhotographThumb
        src={pictureHref}
        width={each.width}
        height={each.height}
        ratio={2.29}
        className="self-start"
        alt={`Case ${place}: ${describeFinding(reference)} ${explainReflex(reference)}`}
      />
      <div>
        <h3 className="text-h3">Case {place}</h3>
        <dl className="mt-2 grid grid-cols-[max-content_minmax(0,1fr)] gap-x-4 gap-y-1">
          <dt className="text-ink-2">Reference</dt>
          <dd className="font-semibold">{describeFinding(reference)}</dd>
          <dt className="text-ink-2">You</dt>
          <dd className="font-semibold">{reading ? describeFinding(reading) : "Not read."}</dd>
        </dl>
        <p className="mt-2.5">
          <ErrorWord error={error} isRead={reading !== null} /> {explainReflex(reference)}
        </p>
        {each.repeatOfPlace !== null && (
          <p className="mt-1.5 text-small text-ink-2">
            Shown twice{each.isMirrored ? ", here mirrored" : ""}: also case {each.repeatOfPlace}. It is compared with
            that reading and does not count again.
          </p>
        )}
      </div>
      <ReadingMap reference={reference} own={reading ?? undefined} title={`Reading map of case ${place}`} />
    </>
  );
}

function ErrorWord({ error, isRead }: { error: string | null; isRead: boolean }) {
  if (!isRead) return null;
  if (error === null) return <b className="text-verdi">Agrees.</b>;
  const kind = ERROR_KINDS.find((each) => each === error) ?? null;
  const sentence = `${error.charAt(0).toUpperCase()}${error.slice(1)}.`;
  return <b className={isBlunder(kind) ? "text-oxide" : "text-tawny"}>{sentence}</b>;
}
