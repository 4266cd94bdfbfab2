import "server-only";
import type { Knex } from "knex";
import { appendAudit } from "@/lib/audit/append-audit";
import type { Actor } from "@/lib/auth/actor";
import { conflict } from "@/lib/errors";
import { deleteObject, putObject } from "@/lib/storage/objects";
import { normalisePhotograph } from "@/lib/uploads/normalise-photograph";
import { insertCase, insertPhotograph, insertReference } from "./queries";
import type { NewCase } from "./schema";

export type Upload = { body: Uint8Array; name: string };

/**
 * Adds a case to the library: its photograph, decoded and encoded anew and stored under a key that says nothing, and
 * its first reference. Throws an AppError for an unusable photograph or a code in use; then nothing is kept.
 */
export async function createCase(
  db: Knex,
  actor: Pick<Actor, "id" | "departmentId">,
  input: NewCase,
  upload: Upload,
  now = new Date(),
): Promise<string> {
  const photograph = await normalisePhotograph(upload.body);
  const storageKey = `photographs/${crypto.randomUUID()}`;
  try {
    await putObject(storageKey, photograph.body, "image/jpeg"); // may be kept although its answer is lost
    return await db.transaction(async (trx) => {
      const photographId = await insertPhotograph(trx, {
        departmentId: actor.departmentId,
        storageKey,
        width: photograph.width,
        height: photograph.height,
        sizeBytes: photograph.body.byteLength,
        originalName: upload.name.slice(0, 255),
        consent: input.consent,
        uploadedBy: actor.id,
      });
      const caseId = await insertCase(trx, {
        departmentId: actor.departmentId,
        code: input.code,
        note: input.note,
        isAnchor: input.isAnchor,
        photographId,
        createdBy: actor.id,
      });
      if (!caseId) throw conflict("code-in-use", `The code ${input.code} is in use. Choose another one.`);
      await insertReference(trx, { caseId, revision: 1, ...input.reference, reason: "", createdBy: actor.id });
      await appendAudit(trx, {
        departmentId: actor.departmentId,
        actorId: actor.id,
        action: "case.created",
        targetType: "case",
        targetId: caseId,
        at: now,
      });
      return caseId;
    });
  } catch (error) {
    await deleteObject(storageKey).catch(() => undefined); // the first failure is the one to tell
    throw error;
  }
}
