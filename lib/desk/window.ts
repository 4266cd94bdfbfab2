import { conflict } from "@/lib/errors";
import type { RoundState } from "@/lib/rounds/schema";

type Window = { state: RoundState; opensAt: Date; closesAt: Date; submittedAt: Date | null };

/** Throws a conflict that says why nothing can be read now: not open yet, closed, or handed in. */
export function requireOpenWindow({ state, opensAt, closesAt, submittedAt }: Window, now: Date): void {
  if (state !== "open" || closesAt <= now) {
    throw conflict("round-closed", "The round has closed. This reading was not counted; it is kept on your screen.");
  }
  if (submittedAt) throw conflict("round-submitted", "You have handed in this round. It can no longer be changed.");
  if (opensAt > now) throw conflict("round-not-open", "The round has not opened yet.");
}
