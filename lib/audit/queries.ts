import "server-only";
import type { Knex } from "knex";
import type { AuditEntry } from "./schema";

const PAGE_SIZE = 100;

/** The newest events of a department, or those before a given one. */
export async function listAuditEvents(db: Knex, departmentId: string, before?: string): Promise<AuditEntry[]> {
  const query = db("audit_events")
    .leftJoin("people", "people.id", "audit_events.actor_id")
    .leftJoin("assignments", "assignments.id", "audit_events.target_id")
    .leftJoin("cases", "cases.id", "audit_events.target_id")
    .leftJoin("rounds", (join) =>
      join.on("rounds.id", "audit_events.target_id").orOn("rounds.id", "assignments.round_id"),
    )
    .where("audit_events.department_id", departmentId)
    .orderBy("audit_events.id", "desc")
    .limit(PAGE_SIZE)
    .select("audit_events.id", "audit_events.at", "audit_events.action", "people.name")
    .select("cases.code", "rounds.number");
  if (before) query.where("audit_events.id", "<", before);
  return (await query).map((row) => ({
    id: row.id,
    at: row.at.toISOString(),
    actor: row.name,
    action: row.action,
    target: row.number === null ? (row.code ? `Case ${row.code}` : "") : `Round ${row.number}`,
  }));
}
