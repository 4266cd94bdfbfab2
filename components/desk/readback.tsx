import { completeDraft, type DraftFinding } from "@/lib/desk/draft-finding";
import { describeFinding } from "@/lib/reflex/describe-finding";

/** The reading in words, or what is still missing. */
export function Readback({ draft }: { draft: DraftFinding }) {
  const complete = completeDraft(draft);
  return (
    <p aria-live="polite" className="min-h-[2.7em] font-serif text-standfirst">
      {"finding" in complete ? (
        describeFinding(complete.finding)
      ) : (
        <span className="text-ink-2 italic">Still to say: {complete.missing.join(", ")}.</span>
      )}
    </p>
  );
}
