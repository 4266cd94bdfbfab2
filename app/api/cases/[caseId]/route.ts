import { changeCase } from "@/lib/cases/change-case";
import { findCaseDetail } from "@/lib/cases/queries";
import { CaseChange, CaseParams } from "@/lib/cases/schema";
import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parseJson, parsePath } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** One case with its references and rounds. Answers 200, or a problem: 401, 403, 404. */
export const GET = handle("cases.read", async ({ params, actor, db }) => {
  const { caseId } = parsePath(params, CaseParams, "case");
  const detail = await findCaseDetail(db, actor.departmentId, caseId);
  if (!detail) throw notFound("case");
  return ok(detail);
});

/** Changes note, anchor or retirement. Answers 200, or a problem: 400, 401, 403, 404, 422. */
export const PATCH = handle("cases.write", async ({ request, params, actor, db }) => {
  const { caseId } = parsePath(params, CaseParams, "case");
  await changeCase(db, actor, caseId, await parseJson(request, CaseChange));
  return ok(await findCaseDetail(db, actor.departmentId, caseId));
});
