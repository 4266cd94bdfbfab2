import { createCase } from "@/lib/cases/create-case";
import { countCases, listCaseSummaries } from "@/lib/cases/queries";
import { readCaseForm } from "@/lib/cases/read-case-form";
import { CaseFilter } from "@/lib/cases/schema";
import { handle } from "@/lib/http/handle";
import { parseQuery } from "@/lib/http/parse";
import { created, ok } from "@/lib/http/respond";

/** The case library, filtered. Answers 200, or a problem: 401, 403, 422. */
export const GET = handle("cases.read", async ({ request, actor, db }) => {
  const filter = parseQuery(request, CaseFilter);
  const cases = await listCaseSummaries(db, actor.departmentId, filter);
  return ok({ cases, total: await countCases(db, actor.departmentId) });
});

/**
 * Adds a case: a form with the file `photograph` and the JSON field `case`.
 * Answers 201, or a problem: 400, 401, 403, 409 (code in use), 413, 415, 422.
 */
export const POST = handle("cases.write", async ({ request, actor, db }) => {
  const { input, upload } = await readCaseForm(request);
  const id = await createCase(db, actor, input, upload);
  return created({ id }, `/api/cases/${id}`);
});
