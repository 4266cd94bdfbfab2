import { handle } from "@/lib/http/handle";
import { parseJson, parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";
import { advanceRound } from "@/lib/rounds/advance-round";
import { findRoundDetail } from "@/lib/rounds/queries";
import { RoundParams, StateChange } from "@/lib/rounds/schema";

/** Publishes, closes or releases a round: one step, never back. Answers 200, or a problem: 400, 401, 403, 404, 409, 422. */
export const PUT = handle("rounds.advance", async ({ request, params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "round");
  const { to } = await parseJson(request, StateChange);
  await advanceRound(db, actor, roundId, to);
  return ok(await findRoundDetail(db, actor.departmentId, roundId));
});
