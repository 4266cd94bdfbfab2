import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";
import { loadRoundResults } from "@/lib/results/load-round-results";
import { RoundParams } from "@/lib/rounds/schema";

/** The results of a closed round; null while they are being computed. Answers 200, or a problem: 401, 403, 404, 409. */
export const GET = handle("results.read", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "round");
  return ok({ results: await loadRoundResults(db, actor, roundId) });
});
