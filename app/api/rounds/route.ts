import { handle } from "@/lib/http/handle";
import { parseJson } from "@/lib/http/parse";
import { created, ok } from "@/lib/http/respond";
import { listRoundSummaries } from "@/lib/rounds/queries";
import { createDraft } from "@/lib/rounds/save-draft";
import { NewRound } from "@/lib/rounds/schema";

/** Every round of the department, newest first. Answers 200, or a problem: 401, 403. */
export const GET = handle("rounds.read", async ({ actor, db }) => {
  return ok({ rounds: await listRoundSummaries(db, actor.departmentId) });
});

/** Starts a draft under the next number. Answers 201, or a problem: 400, 401, 403, 422. */
export const POST = handle("rounds.write", async ({ request, actor, db }) => {
  const { title } = await parseJson(request, NewRound);
  const id = await createDraft(db, actor, title);
  return created({ id }, `/api/rounds/${id}`);
});
