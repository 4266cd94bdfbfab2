import "server-only";
import type { Knex } from "knex";
import { notFound } from "@/lib/errors";
import { findOwnRound, listDeskItems, markOpened, type Reader } from "./queries";
import type { DeskSheet } from "./schema";

/**
 * A round as its examiner sees it, in the examiner's own order with own readings only. Opening it is noted.
 * Before the opening time there are no items to see. Throws not-found for a round the person is not assigned to.
 */
export async function openSheet(db: Knex, reader: Reader, roundId: string, now = new Date()): Promise<DeskSheet> {
  const round = await findOwnRound(db, reader, roundId, now);
  if (!round) throw notFound("round");
  const { assignmentId, ...sheet } = round;
  if (sheet.state === "waiting") return { ...sheet, items: [] };
  if (sheet.state === "open") await markOpened(db, assignmentId, now);
  return { ...sheet, items: await listDeskItems(db, assignmentId) };
}
