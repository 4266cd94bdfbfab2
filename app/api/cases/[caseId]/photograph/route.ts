import { findPhotographKey } from "@/lib/cases/queries";
import { CaseParams } from "@/lib/cases/schema";
import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parsePath } from "@/lib/http/parse";
import { picture } from "@/lib/http/respond";
import { getObject } from "@/lib/storage/objects";
import { makeThumbnail } from "@/lib/uploads/make-thumbnail";

/** The photograph of a case, or with `?size=small` a thumbnail. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("cases.read", async ({ request, params, actor, db }) => {
  const { caseId } = parsePath(params, CaseParams, "case");
  const key = await findPhotographKey(db, actor.departmentId, caseId);
  if (!key) throw notFound("case");
  const { body } = await getObject(key);
  return picture(request.nextUrl.searchParams.get("size") === "small" ? await makeThumbnail(body) : body);
});
