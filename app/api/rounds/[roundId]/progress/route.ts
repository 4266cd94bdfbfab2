import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";
import { findProgress } from "@/lib/rounds/queries";
import { RoundParams } from "@/lib/rounds/schema";

/** Who has read how many, never what. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("rounds.read", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "round");
  const progress = await findProgress(db, actor.departmentId, roundId);
  if (!progress) throw notFound("round");
  return ok(progress);
});
