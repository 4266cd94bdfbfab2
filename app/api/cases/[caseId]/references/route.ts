import { reviseReference } from "@/lib/cases/change-case";
import { findCaseDetail } from "@/lib/cases/queries";
import { CaseParams, ReferenceRevision } from "@/lib/cases/schema";
import { handle } from "@/lib/http/handle";
import { parseJson, parsePath } from "@/lib/http/parse";
import { created } from "@/lib/http/respond";

/** Gives a case a new reference, the old one kept. Answers 201 with the case, or a problem: 400, 401, 403, 404, 422. */
export const POST = handle("cases.write", async ({ request, params, actor, db }) => {
  const { caseId } = parsePath(params, CaseParams, "case");
  await reviseReference(db, actor, caseId, await parseJson(request, ReferenceRevision));
  return created(await findCaseDetail(db, actor.departmentId, caseId), `/api/cases/${caseId}`);
});
