import { loadDriftBoard } from "@/lib/drift/load-drift-board";
import { handle } from "@/lib/http/handle";
import { ok } from "@/lib/http/respond";

/** The drift board over the released rounds. Answers 200, or a problem: 401, 403. */
export const GET = handle("drift.read", async ({ actor, db }) => {
  return ok(await loadDriftBoard(db, actor.departmentId));
});
