import { findOwnPictureKey } from "@/lib/desk/queries";
import { DeskItemParams } from "@/lib/desk/schema";
import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { picture } from "@/lib/http/respond";
import { getObject } from "@/lib/storage/objects";

/** The picture of one case of mine, once the round has opened. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("desk.use", async ({ params, actor, db }) => {
  const { itemId } = parsePath(params, DeskItemParams, "case");
  const key = await findOwnPictureKey(db, actor, itemId, new Date());
  if (!key) throw notFound("case");
  return picture((await getObject(key)).body);
});
