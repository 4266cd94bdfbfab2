import { openSheet } from "@/lib/desk/open-sheet";
import { DeskParams } from "@/lib/desk/schema";
import { submitRound } from "@/lib/desk/submit-round";
import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** Hands in a round; a second time changes nothing. Answers 200, or a problem: 401, 403, 404, 409. */
export const PUT = handle("desk.use", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, DeskParams, "round");
  await submitRound(db, actor, roundId);
  return ok(await openSheet(db, actor, roundId));
});
