import { listDeskRounds } from "@/lib/desk/queries";
import { handle } from "@/lib/http/handle";
import { ok } from "@/lib/http/respond";

/** The rounds that wait for me and those I have read. Answers 200, or a problem: 401, 403. */
export const GET = handle("desk.use", async ({ actor, db }) => {
  return ok({ rounds: await listDeskRounds(db, actor, new Date()) });
});
