import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parseJson, parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";
import { findRoundDetail } from "@/lib/rounds/queries";
import { saveDraft } from "@/lib/rounds/save-draft";
import { RoundDraft, RoundParams } from "@/lib/rounds/schema";

/** One round with its items and examiners, never a reading. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("rounds.read", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "round");
  const round = await findRoundDetail(db, actor.departmentId, roundId);
  if (!round) throw notFound("round");
  return ok(round);
});

/** Stores a draft whole. Answers 200, or a problem: 400, 401, 403, 404, 409 (published), 422. */
export const PUT = handle("rounds.write", async ({ request, params, actor, db }) => {
  const { roundId } = parsePath(params, RoundParams, "round");
  await saveDraft(db, actor, roundId, await parseJson(request, RoundDraft));
  return ok(await findRoundDetail(db, actor.departmentId, roundId));
});
