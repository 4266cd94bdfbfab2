import { saveReading } from "@/lib/desk/save-reading";
import { DeskItemParams, ReadingInput } from "@/lib/desk/schema";
import { handle } from "@/lib/http/handle";
import { parseJson, parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** Saves my reading of one case. Answers 200, or a problem: 400, 401, 403, 404, 409 (closed, handed in, older), 422. */
export const PUT = handle("desk.use", async ({ request, params, actor, db }) => {
  const { itemId } = parsePath(params, DeskItemParams, "case");
  return ok(await saveReading(db, actor, itemId, await parseJson(request, ReadingInput)));
});
