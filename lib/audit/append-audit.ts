import "server-only";
import type { Knex } from "knex";

export type AuditEvent = {
  departmentId: string;
  /** Null when the program acted by itself, such as at the closing time. */
  actorId: string | null;
  action: string;
  targetType: "case" | "round" | "assignment" | "person";
  targetId: string;
  /** Facts worth keeping; never a finding of a round that is not released. */
  detail?: Record<string, unknown>;
  at: Date;
};

/** Writes to the audit trail in the caller's transaction: what happened and its entry are committed together. */
export async function appendAudit(trx: Knex.Transaction, event: AuditEvent): Promise<void> {
  await trx("audit_events").insert({
    department_id: event.departmentId,
    actor_id: event.actorId,
    action: event.action,
    target_type: event.targetType,
    target_id: event.targetId,
    detail: JSON.stringify(event.detail ?? {}),
    at: event.at,
  });
}
