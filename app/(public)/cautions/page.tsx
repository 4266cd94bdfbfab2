import type { Metadata } from "next";
import { Foot } from "@/components/shell/foot";
import { Page, PageHead } from "@/components/shell/page";
import { RunningHead } from "@/components/shell/running-head";
import { SafetyCard } from "@/components/shell/safety-card";
import { Standfirst } from "@/components/ui/standfirst";

export const metadata: Metadata = { title: "Cautions and safety card" };

const CAUTIONS = [
  {
    title: "What a score says",
    text: "A score describes readings of this set under these conditions, not work in the clinic.",
  },
  {
    title: "What the test can say",
    text: "The corneal light reflex test gives a rough estimate. Measurement is by cover tests with prisms. It does not replace cover testing, refraction or the examination of the fundus.",
  },
  { title: "Who decides", text: "Local protocols, supervision and licensed practice decide." },
  {
    title: "Photographs of people",
    text: "Only with consent for this use, cropped to the eyes, with metadata removed. Do not upload a current patient to get an opinion.",
  },
  {
    title: "A photograph that worries you",
    text: "A photograph with an unequal or white pupil reflex, or a new squint, goes to a clinician promptly, outside this program. If a photograph of the case library shows a sign that nobody acted on, stop, and tell the clinician who asked for consent. Leaving it out of the round is not enough.",
  },
];

export default function CautionsPage() {
  return (
    <>
      <RunningHead homeHref="/" />
      <Page>
        <PageHead title="Cautions and safety card" />
        <Standfirst isRuled className="mb-8">
          Evenglint is for quality assurance and training only. It is not for diagnosis, screening, referral or
          treatment decisions about any patient.
        </Standfirst>
        <div className="grid items-start gap-x-11 gap-y-8 lg:grid-cols-[minmax(0,2fr)_minmax(0,3fr)]">
          <dl className="border-t-2 border-ink">
            {CAUTIONS.map(({ title, text }) => (
              <div key={title} className="border-b border-hair py-3.5">
                <dt className="font-serif text-h3 font-medium">{title}</dt>
                <dd className="mt-1 max-w-read text-ink-2">{text}</dd>
              </div>
            ))}
          </dl>
          <SafetyCard />
        </div>
      </Page>
      <Foot />
    </>
  );
}
