import { openSheet } from "@/lib/desk/open-sheet";
import { DeskParams } from "@/lib/desk/schema";
import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** A round in my own order with my own readings, and nothing else. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("desk.use", async ({ params, actor, db }) => {
  const { roundId } = parsePath(params, DeskParams, "round");
  return ok(await openSheet(db, actor, roundId));
});
