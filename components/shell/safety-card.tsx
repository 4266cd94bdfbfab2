import type { ReactNode } from "react";
import { DataTable } from "@/components/ui/data-table";
import { Sheet } from "@/components/ui/sheet";

// NICE NG127 is the guideline on suspected neurological conditions, NG12 that on suspected cancer, and BJGP 2017 is
// 67(654): 42-43. They were read through the project's notes on the trade, not reprinted from the guidelines here.
const UNSOURCED = "common practice, no source";
const SIGNS = [
  {
    sign: "A new squint with loss of the red reflex",
    to: "ophthalmology",
    when: "immediately",
    source: "NICE NG127",
  },
  {
    sign: "A new squint with ataxia, vomiting or headache",
    to: "acute paediatrics",
    when: "immediately",
    source: "NICE NG127",
  },
  {
    sign: "An adult with a sudden squint or double vision; a pupil involved, ptosis, pain, or signs of giant cell arteritis",
    to: "emergency care",
    when: "immediately",
    source: UNSOURCED,
  },
  { sign: "A paralytic squint", to: "neurological assessment", when: "urgently", source: "NICE NG127" },
  {
    sign: "An absent red reflex",
    to: "ophthalmology",
    when: "urgently: consider an appointment within two weeks",
    source: "NICE NG12",
  },
  {
    sign: "A white or otherwise abnormal red reflex, limited abduction, double vision, nystagmus, a face turn, proptosis, or constant exotropia in a young child",
    to: "a clinician",
    when: "promptly, by the local pathway",
    source: "BJGP 2017",
  },
  { sign: "A new squint that is not paralytic", to: "ophthalmology", when: "by referral", source: "NICE NG127" },
  {
    sign: "A squint still there beyond about three months of age",
    to: "ophthalmology",
    when: "by referral",
    source: UNSOURCED,
  },
];

const COLUMNS = [
  { key: "sign", head: "What is seen", phone: "lead" },
  { key: "to", head: "To" },
  { key: "when", head: "When" },
  { key: "source", head: "Source" },
] as const;

/** The fixed card: which signs leave this program and go to a clinician. `contact` is the department's own number. */
export function SafetyCard({ contact }: { contact?: ReactNode }) {
  const rows = SIGNS.map((cells) => ({ id: cells.sign, cells }));
  return (
    <Sheet as="section" labelledBy="safety-card" isMarked>
      <h2 id="safety-card">Clinical safety card</h2>
      <p className="mt-2.5 mb-5 max-w-read">
        For a person in front of you, or a photograph that shows one of these signs. Do not use Evenglint to ask for an
        opinion. {contact ?? "Use your department’s own urgent contact and pathway."}
      </p>
      <DataTable caption="Signs that need a clinician" isCaptionHidden columns={COLUMNS} rows={rows} />
      <p className="mt-4 max-w-read text-small text-ink-2">
        Examine the red reflex in every child with a squint (AAP, AAPOS and AAO, Pediatrics 2008; 122: 1401 to 1404).
        Guidelines change: where your local pathway says otherwise, it decides.
      </p>
    </Sheet>
  );
}
