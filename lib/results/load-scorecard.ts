import "server-only";
import type { Knex } from "knex";
import { notFound } from "@/lib/errors";
import { errorKind } from "@/lib/reflex/error-kind";
import { referenceAsShown } from "./compute-results";
import { findLatestResult, findResultRound, listItemsOfResult, type RoundItem } from "./queries";
import type { Scorecard } from "./schema";
import {
  findOwnFigures,
  listEarlierKappas,
  listOwnShowings,
  listSealedCaseIds,
  type OwnShowing,
} from "./scorecard-queries";

/**
 * The scorecard of one person for a released round: own figures, own readings, the references. Nobody else's reading,
 * name or figure is read here at all. Throws not-found for a round not released or not the person's.
 */
export async function loadScorecard(
  db: Knex,
  person: { id: string; departmentId: string },
  roundId: string,
): Promise<Scorecard> {
  const round = await findResultRound(db, person.departmentId, roundId);
  if (round?.state !== "released" || !round.releasedAt) throw notFound("scorecard");
  const result = await findLatestResult(db, roundId);
  const figures = result && (await findOwnFigures(db, result.id, person.id));
  if (!result || !figures) throw notFound("scorecard");
  const [items, showings, sealed, earlier] = await Promise.all([
    listItemsOfResult(db, result.id),
    listOwnShowings(db, roundId, person.id),
    listSealedCaseIds(db, person.id),
    listEarlierKappas(db, person, round.number),
  ]);
  const { id, number, title, convention, kappaFloor, releasedAt } = round;
  const isSealedItem = (itemId: string) => items.some((item) => item.itemId === itemId && sealed.has(item.caseId));
  return {
    round: { id, number, title, convention },
    releasedAt: releasedAt.toISOString(),
    kappaFloor,
    figures: { ...figures, items: figures.items.filter(({ itemId }) => !isSealedItem(itemId)) },
    earlier,
    cases: showings.flatMap((showing) => {
      const item = items.find(({ itemId }) => itemId === showing.itemId);
      return item ? [toCase(showing, item, { items, showings, sealed })] : [];
    }),
  };
}

type Context = { items: RoundItem[]; showings: OwnShowing[]; sealed: Set<string> };

function toCase(showing: OwnShowing, item: RoundItem, context: Context): Scorecard["cases"][number] {
  const isSealed = context.sealed.has(item.caseId);
  const reference = referenceAsShown(item);
  return {
    id: showing.id,
    place: showing.place,
    isSealed,
    pictureHref: isSealed ? null : `/api/desk/items/${showing.id}/picture`,
    width: showing.width,
    height: showing.height,
    reading: isSealed ? null : showing.reading,
    reference: isSealed ? null : reference,
    error: isSealed || !showing.reading ? null : errorKind(showing.reading, reference),
    repeatOfPlace: isSealed ? null : placeOfFirst(item, context),
    isMirrored: !isSealed && item.kind === "mirrored",
  };
}

function placeOfFirst(item: RoundItem, { items, showings }: Context): number | null {
  if (item.kind === "first") return null;
  const first = items.find(({ caseId, kind }) => caseId === item.caseId && kind === "first");
  return showings.find(({ itemId }) => itemId === first?.itemId)?.place ?? null;
}
