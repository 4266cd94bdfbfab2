import type { PhotographParameters } from "@/lib/eyes/parameters";
import type { PhotographTruth } from "@/lib/eyes/truth-in-pixels";
import type { Finding, UnreadableReason } from "@/lib/reflex/finding";

/** A case of the demo as it is written down: the photograph is drawn, and the finding computed, from the parameters. */
export type CasePlan = {
  /** Three digits, in no order that tells anything. Names the file too. */
  code: string;
  /** A short neutral line for the lead, in the words the trade uses for what is seen. */
  note: string;
  isAnchor?: boolean;
  /** Set where the photograph is meant not to be readable, and why. */
  unreadable?: UnreadableReason;
  parameters: PhotographParameters;
};

/** A case of the demo as it is kept in db/seeds/demo-cases.json. */
export type DemoCase = {
  code: string;
  file: string;
  isAnchor: boolean;
  note: string;
  finding: Finding;
  parameters: PhotographParameters;
  /** Of an eye behind a closed lid, too: the eye is there, though nobody can read it. */
  truth: PhotographTruth;
};
