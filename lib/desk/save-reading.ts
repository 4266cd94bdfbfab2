import "server-only";
import type { Knex } from "knex";
import { conflict, notFound } from "@/lib/errors";
import { findReading, lockShowing, type Reader, upsertReading } from "./queries";
import type { ReadingInput, SavedReading } from "./schema";
import { requireOpenWindow } from "./window";

/**
 * Saves a reading of one showing. The same save sent twice counts once; an older save never replaces a newer one.
 * Throws not-found for somebody else's showing, or a conflict: before opening, after closing, handed in, or older.
 */
export async function saveReading(
  db: Knex,
  reader: Reader,
  itemId: string,
  input: ReadingInput,
  now = new Date(),
): Promise<SavedReading> {
  return db.transaction(async (trx) => {
    const showing = await lockShowing(trx, reader, itemId);
    if (!showing) throw notFound("case");
    const stored = await findReading(trx, itemId);
    if (stored?.saveId === input.saveId) return withoutSaveId(stored); // arrived before; the answer was lost
    requireOpenWindow(showing, now);
    if (stored && stored.revision >= input.revision) {
      throw conflict("older-reading", "A newer reading of this case was saved from another window. Reload to see it.");
    }
    await upsertReading(trx, itemId, input, showing, now);
    const { finding, confidence, seconds, revision } = input;
    return { finding, confidence, seconds, revision, savedAt: now.toISOString() };
  });
}

function withoutSaveId({ saveId: _, ...reading }: SavedReading & { saveId: string }): SavedReading {
  return reading;
}
