import "server-only";
import type { Knex } from "knex";
import { type FindingColumns, findingColumnsOf, fromFindingColumns, toFindingColumns } from "@/lib/findings/columns";
import type { Finding } from "@/lib/reflex/finding";
import type { CaseChange, CaseDetail, CaseFilter, CaseKind, CaseSummary, Reference, ReferenceBasis } from "./schema";

/** The reference in force: the highest revision. Joined under the name `latest`. */
const LATEST_REFERENCE = `
  JOIN LATERAL (
    SELECT * FROM case_references WHERE case_references.case_id = cases.id ORDER BY revision DESC LIMIT 1
  ) latest ON TRUE`;

/** Each case is of exactly one kind, the one that `caseKind` gives it. */
const KIND_CONDITIONS: Record<CaseKind, string> = {
  aligned: "latest.readable AND latest.eye = 'none'",
  eso: "latest.horizontal = 'eso' AND latest.vertical = 'none'",
  exo: "latest.horizontal = 'exo' AND latest.vertical = 'none'",
  vertical: "latest.vertical <> 'none' AND latest.horizontal = 'none'",
  combined: "latest.vertical <> 'none' AND latest.horizontal <> 'none'",
  "not-readable": "NOT latest.readable",
};

type CaseRow = FindingColumns & {
  id: string;
  code: string;
  note: string;
  is_anchor: boolean;
  retired_at: Date | null;
  last_round_number: number | null;
};

function casesWithLatestReference(db: Knex, departmentId: string) {
  return db("cases")
    .joinRaw(LATEST_REFERENCE)
    .where("cases.department_id", departmentId)
    .select(
      db("items")
        .join("rounds", "rounds.id", "items.round_id")
        .whereRaw("items.case_id = cases.id")
        .whereNot("rounds.state", "draft")
        .max("rounds.number")
        .as("last_round_number"),
    )
    .select<CaseRow[]>(
      "cases.id",
      "cases.code",
      "cases.note",
      "cases.is_anchor",
      "cases.retired_at",
      ...findingColumnsOf("latest"),
    );
}

function toCaseSummary(row: CaseRow): CaseSummary {
  return {
    id: row.id,
    code: row.code,
    note: row.note,
    isAnchor: row.is_anchor,
    isRetired: row.retired_at !== null,
    finding: fromFindingColumns(row),
    lastRoundNumber: row.last_round_number,
    photographHref: `/api/cases/${row.id}/photograph`,
  };
}

export async function listCaseSummaries(db: Knex, departmentId: string, filter: CaseFilter): Promise<CaseSummary[]> {
  const query = casesWithLatestReference(db, departmentId).orderBy("cases.code");
  if (filter.q) {
    const pattern = `%${filter.q.replaceAll(/[\\%_]/g, "\\$&")}%`;
    query.where((either) => either.whereILike("cases.code", pattern).orWhereILike("cases.note", pattern));
  }
  if (filter.kind) query.whereRaw(KIND_CONDITIONS[filter.kind]);
  if (filter.anchors === "only") query.where("cases.is_anchor", true);
  if (filter.retired === undefined) query.whereNull("cases.retired_at");
  if (filter.retired === "only") query.whereNotNull("cases.retired_at");
  return (await query).map(toCaseSummary);
}

export async function countCases(db: Knex, departmentId: string): Promise<number> {
  const row = await db("cases").where({ department_id: departmentId }).count<{ count: string }>("* as count").first();
  return Number(row?.count ?? 0);
}

export async function findCaseDetail(db: Knex, departmentId: string, caseId: string): Promise<CaseDetail | null> {
  const row = await casesWithLatestReference(db, departmentId).where("cases.id", caseId).first();
  if (!row) return null;
  const photograph = await db("cases")
    .join("photographs", "photographs.id", "cases.photograph_id")
    .where("cases.id", caseId)
    .first("photographs.width", "photographs.height", "photographs.original_name", "photographs.consent", {
      case_created_at: "cases.created_at",
    });
  const rounds = await db("items")
    .join("rounds", "rounds.id", "items.round_id")
    .where("items.case_id", caseId)
    .groupBy("rounds.id")
    .orderBy("rounds.number", "desc")
    .select("rounds.id", "rounds.number", "rounds.title", "rounds.state");
  return {
    ...toCaseSummary(row),
    width: photograph.width,
    height: photograph.height,
    originalName: photograph.original_name,
    consent: photograph.consent,
    createdAt: photograph.case_created_at.toISOString(),
    references: await listReferences(db, caseId),
    rounds,
  };
}

async function listReferences(db: Knex, caseId: string): Promise<Reference[]> {
  const rows = await db("case_references")
    .leftJoin("people", "people.id", "case_references.created_by")
    .where("case_references.case_id", caseId)
    .orderBy("case_references.revision", "desc")
    .select("case_references.*", "people.name as author_name");
  return rows.map((row) => ({
    revision: row.revision,
    finding: fromFindingColumns(row),
    basis: row.basis,
    uncertaintyDegrees: row.uncertainty_degrees === null ? null : Number(row.uncertainty_degrees),
    reason: row.reason,
    createdAt: row.created_at.toISOString(),
    createdBy: row.author_name,
  }));
}

/** Where the photograph of a case is stored, or null when the department has no such case. */
export async function findPhotographKey(db: Knex, departmentId: string, caseId: string): Promise<string | null> {
  const row = await db("cases")
    .join("photographs", "photographs.id", "cases.photograph_id")
    .where({ "cases.id": caseId, "cases.department_id": departmentId })
    .first("photographs.storage_key");
  return row?.storage_key ?? null;
}

export type PhotographRecord = {
  departmentId: string;
  storageKey: string;
  width: number;
  height: number;
  sizeBytes: number;
  originalName: string;
  consent: string;
  uploadedBy: string;
};

export async function insertPhotograph(trx: Knex.Transaction, record: PhotographRecord): Promise<string> {
  const [row] = await trx("photographs")
    .insert({
      department_id: record.departmentId,
      storage_key: record.storageKey,
      width: record.width,
      height: record.height,
      size_bytes: record.sizeBytes,
      original_name: record.originalName,
      consent: record.consent,
      uploaded_by: record.uploadedBy,
    })
    .returning("id");
  return row.id;
}

export type CaseRecord = {
  departmentId: string;
  code: string;
  note: string;
  isAnchor: boolean;
  photographId: string;
  createdBy: string;
};

/** The id of the new case, or null when the department already uses the code. */
export async function insertCase(trx: Knex.Transaction, record: CaseRecord): Promise<string | null> {
  const rows = await trx("cases")
    .insert({
      department_id: record.departmentId,
      code: record.code,
      note: record.note,
      is_anchor: record.isAnchor,
      photograph_id: record.photographId,
      created_by: record.createdBy,
    })
    .onConflict(trx.raw("(department_id, lower(code))"))
    .ignore()
    .returning("id");
  return rows[0]?.id ?? null;
}

export type ReferenceRecord = {
  caseId: string;
  revision: number;
  finding: Finding;
  basis: ReferenceBasis;
  uncertaintyDegrees: number | null;
  reason: string;
  createdBy: string;
};

export async function insertReference(trx: Knex.Transaction, record: ReferenceRecord): Promise<void> {
  await trx("case_references").insert({
    case_id: record.caseId,
    revision: record.revision,
    ...toFindingColumns(record.finding),
    basis: record.basis,
    uncertainty_degrees: record.uncertaintyDegrees,
    reason: record.reason,
    created_by: record.createdBy,
  });
}

/** Locks a case for a change and gives the revision of its reference in force; null when there is no such case. */
export async function lockCase(trx: Knex.Transaction, departmentId: string, caseId: string): Promise<number | null> {
  const row = await trx("cases").where({ id: caseId, department_id: departmentId }).forUpdate().first("id");
  if (!row) return null;
  const latest = await trx("case_references").where({ case_id: caseId }).max<{ max: number }>("revision").first();
  return latest?.max ?? 0;
}

export async function updateCaseRow(trx: Knex.Transaction, caseId: string, change: CaseChange, now: Date) {
  await trx("cases")
    .where({ id: caseId })
    .update({
      ...(change.note !== undefined && { note: change.note }),
      ...(change.isAnchor !== undefined && { is_anchor: change.isAnchor }),
      ...(change.isRetired !== undefined && { retired_at: change.isRetired ? now : null }),
      id: caseId,
    });
}
