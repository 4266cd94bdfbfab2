"use client";

import Link from "next/link";
import useSWR from "swr";
import { ReadingMap } from "@/components/charts/reading-map";
import { PageHead } from "@/components/shell/page";
import { Crumb } from "@/components/ui/crumb";
import { DefinitionList } from "@/components/ui/definition-list";
import { Photograph } from "@/components/ui/photograph";
import { Tag } from "@/components/ui/tag";
import { Time } from "@/components/ui/time";
import { type CaseDetail, CaseDetailSchema, REFERENCE_BASIS_NAMES } from "@/lib/cases/schema";
import { fetchJson, type ProblemError } from "@/lib/http/fetch-json";
import { describeFinding } from "@/lib/reflex/describe-finding";
import { CaseActions } from "./case-actions";
import { ReferenceHistory } from "./reference-history";
import { ReviseReference } from "./revise-reference";

/** One case: photograph, reference with its revisions, the rounds it was in. */
export function CasePage({ initial, zone }: { initial: CaseDetail; zone: string }) {
  const { data: detail = initial, mutate } = useSWR<CaseDetail, ProblemError>(
    `/api/cases/${initial.id}`,
    (url: string) => fetchJson(url, CaseDetailSchema),
    { fallbackData: initial, revalidateOnMount: false },
  );
  const show = (next: CaseDetail) => mutate(next, { revalidate: false });
  const [reference] = detail.references;
  return (
    <>
      <PageHead
        crumb={<Crumb steps={[{ label: "Case library", href: "/cases" }, { label: `Case ${detail.code}` }]} />}
        title={`Case ${detail.code}`}
        lede={detail.note || undefined}
        actions={
          <>
            {detail.isAnchor && <Tag tone="info">anchor</Tag>}
            {detail.isRetired && <Tag tone="mute">retired</Tag>}
            <CaseActions detail={detail} onChange={show} />
          </>
        }
      />
      <Photograph
        src={detail.photographHref}
        width={detail.width}
        height={detail.height}
        alt={`Case ${detail.code}: ${describeFinding(detail.finding)}`}
        className="max-h-[60dvh] w-auto"
      />
      <div className="mt-8 grid items-start gap-11 lg:grid-cols-[minmax(0,1fr)_22rem]">
        <div className="grid gap-8">
          <section>
            <h2 className="mb-3 text-h2">About the photograph</h2>
            <DefinitionList
              items={[
                { term: "Size", detail: `${detail.width} × ${detail.height} pixels` },
                { term: "Uploaded as", detail: detail.originalName },
                { term: "Added", detail: <Time iso={detail.createdAt} zone={zone} /> },
                {
                  term: "Consent",
                  detail: detail.consent === "drawn" ? "drawn eyes; nobody is shown" : "patient’s consent for this use",
                },
              ]}
            />
          </section>
          <section>
            <h2 className="mb-3 text-h2">Rounds</h2>
            {detail.rounds.length === 0 && <p className="text-ink-2">Not shown in any round yet.</p>}
            <ul className="flex flex-wrap gap-x-4 gap-y-1">
              {detail.rounds.map(({ id, number, title, state }) => (
                <li key={id}>
                  <Link href={`/rounds/${id}`}>
                    {number}. {title}
                  </Link>{" "}
                  <span className="text-small text-ink-2">{state}</span>
                </li>
              ))}
            </ul>
          </section>
          <ReferenceHistory references={detail.references} zone={zone} />
        </div>
        <aside className="grid gap-5">
          <h2 className="border-b-2 border-ink pb-2 text-h2">Reference</h2>
          <p className="font-serif text-standfirst">{describeFinding(detail.finding)}</p>
          <ReadingMap reference={detail.finding} title={`Reference of case ${detail.code}`} />
          {reference && (
            <p className="text-small text-ink-2">
              {REFERENCE_BASIS_NAMES[reference.basis]}
              {reference.uncertaintyDegrees !== null && `, uncertainty ${reference.uncertaintyDegrees}°`}. Revision{" "}
              {reference.revision}
              {reference.createdBy && ` by ${reference.createdBy}`},{" "}
              <Time iso={reference.createdAt} zone={zone} form="date" />.
            </p>
          )}
          <ReviseReference detail={detail} onRevised={show} />
        </aside>
      </div>
    </>
  );
}
