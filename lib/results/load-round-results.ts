import "server-only";
import type { Knex } from "knex";
import type { Actor } from "@/lib/auth/actor";
import { conflict, notFound } from "@/lib/errors";
import type { Finding } from "@/lib/reflex/finding";
import { referenceAsShown } from "./compute-results";
import { sameLabel } from "./examiner-figures";
import {
  findLatestResult,
  findResultRound,
  listExaminerFigures,
  listItemsOfResult,
  listReadingsByAssignment,
} from "./queries";
import type { RoundResults } from "./schema";

/**
 * The newest results of a round, or null while they are still being computed. The lead sees them from closing on,
 * everybody else who may read results from release on. Throws not-found, or a conflict while the round is sealed.
 */
export async function loadRoundResults(db: Knex, actor: Actor, roundId: string): Promise<RoundResults | null> {
  const round = await findResultRound(db, actor.departmentId, roundId);
  const isReleased = round?.state === "released";
  if (!round || (actor.role !== "lead" && !isReleased)) throw notFound("round");
  if (round.state === "draft" || round.state === "open") {
    throw conflict("round-sealed", "The round is sealed: nobody sees readings before it closes.");
  }
  const result = await findLatestResult(db, roundId);
  if (!result) return null;
  const [figures, items, assignments] = await Promise.all([
    listExaminerFigures(db, result.id),
    listItemsOfResult(db, result.id),
    listReadingsByAssignment(db, roundId),
  ]);
  const { id, number, title, state, convention, kappaFloor } = round;
  return {
    round: { id, number, title, state, convention },
    revision: result.revision,
    methodVersion: result.methodVersion,
    reason: result.reason,
    computedAt: result.computedAt.toISOString(),
    kappaFloor,
    panel: result.panel,
    examiners: assignments.flatMap(({ assignmentId, personId, name, assignedAs, submittedAt }) => {
      const own = figures.get(assignmentId);
      return own ? [{ personId, name, assignedAs, submittedAt: submittedAt?.toISOString() ?? null, figures: own }] : [];
    }),
    cases: items.map((item) => {
      const reference = referenceAsShown(item);
      const read = assignments.flatMap(({ readings }) => readings.get(item.itemId) ?? []);
      const agreed = read.filter((reading: Finding) => sameLabel(reading, reference));
      const { itemId, caseId, code, kind } = item;
      return { itemId, caseId, code, kind, reference, readCount: read.length, agreedCount: agreed.length };
    }),
  };
}
