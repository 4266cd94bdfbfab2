import "server-only";
import type { Knex } from "knex";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { lockRoundById } from "@/lib/rounds/queries";
import { examinerFigures, type ShownItem } from "./examiner-figures";
import { panelFigures } from "./panel-figures";
import {
  type AssignmentReadings,
  highestRevision,
  insertResult,
  latestResultReferences,
  listItemsWithReference,
  listReadingsByAssignment,
  type RoundItem,
} from "./queries";
import { METHOD_VERSION } from "./schema";

/**
 * Computes and stores the results of a closed round. Run again with the same references it changes nothing, so the job
 * may be repeated; after a reference has changed it adds a revision and leaves the earlier ones as they are.
 */
export async function computeResults(db: Knex, roundId: string, reason: string, now = new Date()): Promise<void> {
  await db.transaction(async (trx) => {
    const round = await lockRoundById(trx, roundId);
    if (!round || round.state === "draft" || round.state === "open") return; // sealed: nothing may be computed
    const items = await listItemsWithReference(trx, roundId);
    const computedWith = await latestResultReferences(trx, roundId);
    const isNew = items.some(({ itemId, referenceId }) => computedWith.get(itemId) !== referenceId);
    if (!isNew) return;
    const assignments = await listReadingsByAssignment(trx, roundId);
    const shown = assignments.map((assignment) => showingsOf(assignment, items));
    await insertResult(trx, {
      roundId,
      revision: (await highestRevision(trx, roundId)) + 1,
      methodVersion: METHOD_VERSION,
      reason,
      panel: panelFigures(shown),
      computedAt: now,
      references: items,
      examiners: assignments.map(({ assignmentId }, index) => ({
        assignmentId,
        figures: examinerFigures(shown[index] ?? []),
      })),
    });
  });
}

function showingsOf({ readings }: AssignmentReadings, items: readonly RoundItem[]): ShownItem[] {
  return items.map((item) => ({
    itemId: item.itemId,
    kind: item.kind,
    reading: readings.get(item.itemId) ?? null,
    reference: referenceAsShown(item),
  }));
}

/** A mirrored item shows the mirror image, so its expected finding has the other eye. */
export function referenceAsShown({ kind, reference }: Pick<RoundItem, "kind" | "reference">) {
  return kind === "mirrored" ? mirrorFinding(reference) : reference;
}
