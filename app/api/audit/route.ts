import { listAuditEvents } from "@/lib/audit/queries";
import { AuditFilter } from "@/lib/audit/schema";
import { handle } from "@/lib/http/handle";
import { parseQuery } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** The audit trail of the department, newest first. Answers 200, or a problem: 401, 403, 422. */
export const GET = handle("audit.read", async ({ request, actor, db }) => {
  const { before } = parseQuery(request, AuditFilter);
  return ok({ events: await listAuditEvents(db, actor.departmentId, before) });
});
