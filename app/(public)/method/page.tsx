import type { Metadata } from "next";
import { Contents } from "@/components/method/contents";
import { METHOD_GROUPS } from "@/components/method/groups";
import { MethodEntryView } from "@/components/method/method-entry-view";
import { Foot } from "@/components/shell/foot";
import { Page, PageHead } from "@/components/shell/page";
import { RunningHead } from "@/components/shell/running-head";
import { Crumb } from "@/components/ui/crumb";
import { Standfirst } from "@/components/ui/standfirst";

export const metadata: Metadata = { title: "Method" };

export default function MethodPage() {
  return (
    <>
      <RunningHead homeHref="/" />
      <Page className="grid grid-cols-[minmax(0,1fr)] items-start gap-x-11 gap-y-6 lg:grid-cols-[12rem_minmax(0,1fr)]">
        <Contents groups={METHOD_GROUPS} />
        <div className="min-w-0 max-lg:row-start-1 max-lg:contents">
          <div className="max-lg:row-start-1">
            <PageHead
              crumb={<Crumb steps={[{ label: "Evenglint", href: "/" }, { label: "Method" }]} />}
              title="Method"
            />
            <Standfirst isRuled>
              How each figure in Evenglint is computed, where the formula is from, and what it cannot say. Every example
              is computed on this page, from published data, by the same code that scores a round; what the source
              printed stands beside it. <a href="#few-cases">What few cases are worth</a> comes before any figure.
            </Standfirst>
          </div>
          <div className="grid grid-cols-[minmax(0,1fr)] gap-12 lg:mt-12">
            {METHOD_GROUPS.map(({ id, title, entries }, index) => (
              <section key={id} className="grid grid-cols-[minmax(0,1fr)] gap-9">
                <h2 id={id} tabIndex={-1}>
                  <i className="mr-2 font-normal text-ink-2">{index + 1}</i>
                  {title}
                </h2>
                {entries.map((entry) => (
                  <MethodEntryView key={entry.id} entry={entry} />
                ))}
              </section>
            ))}
          </div>
        </div>
      </Page>
      <Foot />
    </>
  );
}
