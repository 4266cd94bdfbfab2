import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";
import { loadScorecard } from "@/lib/results/load-scorecard";
import { RoundParams } from "@/lib/rounds/schema";

/** My own figures and readings of a released round. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("scorecards.read", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "scorecard");
  return ok(await loadScorecard(db, actor, roundId));
});
