import "server-only";
import type { Knex } from "knex";
import { type FieldError, invalid } from "@/lib/errors";
import { enqueue } from "@/lib/jobs/enqueue";
import { readingRolesOf } from "@/lib/people/queries";
import { deleteObject, getObject, putObject } from "@/lib/storage/objects";
import { makeItemPicture } from "@/lib/uploads/make-item-picture";
import { drawOrder } from "./draw-order";
import {
  type DraftItem,
  type ItemPicture,
  insertOrders,
  listAssignments,
  listDraftItems,
  pictureKeysInUse,
  type Round,
  setItemPicture,
  setRoundState,
  usableCaseIds,
} from "./queries";

type Publishing = {
  now: Date;
  random: () => number;
  /** Filled with the key of each picture before it is written: the bucket knows no transaction. */
  pictureKeys: string[];
};

/**
 * Publishes a locked draft inside the caller's transaction: every item gets a picture of its own, every examiner an
 * order of their own, and the closing is queued. When the transaction fails, the caller removes the pictures.
 */
export async function publish(trx: Knex.Transaction, round: Round, publishing: Publishing): Promise<void> {
  const { now, random, pictureKeys } = publishing;
  const items = await listDraftItems(trx, round.id);
  const assignments = await listAssignments(trx, round.id);
  const faults = [
    ...windowFaults(round, now),
    ...(await itemFaults(trx, round, items)),
    ...(await examinerFaults(trx, round, assignments)),
  ];
  if (faults.length > 0) throw invalid("The round cannot be published yet.", faults, "round-incomplete");

  for (const item of items) await setItemPicture(trx, await writePicture(item, random, pictureKeys));
  const showings = items.map(({ id, caseId }) => ({ id, twin: caseId }));
  const orders = assignments.map(({ id }) => ({ assignmentId: id, itemIds: drawOrder(showings, random) }));
  await insertOrders(trx, orders);
  await setRoundState(trx, round.id, "open", now);
  if (round.closesAt) {
    await enqueue(trx, "close-round", { roundId: round.id }, { key: `close:${round.id}`, runAt: round.closesAt });
  }
}

/**
 * Removes the pictures of a publishing that failed, as far as the bucket can be reached. One that an item names stays:
 * the transaction was committed after all, and only the answer to that was lost.
 */
export async function removePictures(db: Knex, keys: readonly string[]): Promise<void> {
  const named = await pictureKeysInUse(db, keys);
  await Promise.allSettled(keys.filter((key) => !named.has(key)).map((key) => deleteObject(key)));
}

async function writePicture(item: DraftItem, random: () => number, pictureKeys: string[]): Promise<ItemPicture> {
  const photograph = await getObject(item.storageKey);
  const picture = await makeItemPicture(photograph.body, { isMirrored: item.kind === "mirrored", random });
  const key = `pictures/${crypto.randomUUID()}`;
  pictureKeys.push(key); // before it is written: it may be kept although the answer is lost
  await putObject(key, picture.body, "image/jpeg");
  return { itemId: item.id, key, width: picture.width, height: picture.height };
}

function fault(field: string, detail: string): FieldError {
  return { pointer: `#/${field}`, detail };
}

function windowFaults({ opensAt, closesAt }: Round, now: Date): FieldError[] {
  if (!opensAt) return [fault("opensAt", "Set the day and time at which the round opens.")];
  if (!closesAt) return [fault("closesAt", "Set the day and time at which the round closes.")];
  if (closesAt <= opensAt) return [fault("closesAt", "The round must close after it opens.")];
  return closesAt <= now ? [fault("closesAt", "The closing time has passed. Choose a later one.")] : [];
}

async function itemFaults(trx: Knex.Transaction, round: Round, items: DraftItem[]): Promise<FieldError[]> {
  if (items.length === 0) return [fault("items", "Choose at least one case.")];
  const usable = await usableCaseIds(
    trx,
    round.departmentId,
    items.map(({ caseId }) => caseId),
  );
  const isUsable = items.every(({ caseId }) => usable.has(caseId));
  return isUsable ? [] : [fault("items", "A chosen case has been retired. Take it out.")];
}

async function examinerFaults(
  trx: Knex.Transaction,
  round: Round,
  assignments: { personId: string }[],
): Promise<FieldError[]> {
  if (assignments.length === 0) return [fault("examinerIds", "Choose at least one examiner.")];
  const readers = await readingRolesOf(
    trx,
    round.departmentId,
    assignments.map(({ personId }) => personId),
  );
  const canRead = assignments.every(({ personId }) => readers.has(personId));
  return canRead ? [] : [fault("examinerIds", "A chosen person can no longer read blind. Take that person out.")];
}
