import { setTimeout as sleep } from "node:timers/promises";
import { beforeAll, describe, expect, it } from "vitest";
import { PUT as save } from "@/app/api/desk/items/[itemId]/reading/route";
import { saveReading } from "@/lib/desk/save-reading";
import { SavedReadingSchema } from "@/lib/desk/schema";
import { submitRound } from "@/lib/desk/submit-round";
import { ALIGNED } from "@/lib/reflex/finding";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { readingInput, showingIds } from "../../support/desk";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { runDueJobs } from "../../support/jobs";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  leftExo,
  makeCase,
  makeOpenRound,
  makePerson,
  readWholeRound,
  rightEso,
  type TestPerson,
  type TestRound,
} from "../../support/world";

const HOUR_MS = 3_600_000;
const hence = (hours: number) => new Date(Date.now() + hours * HOUR_MS);

describe("PUT /api/desk/items/[itemId]/reading", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  let lead: TestPerson;
  let examiner: TestPerson;
  let caseIds: string[];
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    ({ lead, examiner } = people.own);
    caseIds = [];
    for (const degrees of [15, 20, 30]) caseIds.push(await makeCase(db(), lead, leftExo(degrees)));
  });

  /** A round of the examiner's own, and the showing that stands first in it. */
  const openRound = async (changes: Partial<TestRound> = {}) => {
    const items = caseIds.map((caseId) => ({ caseId, kind: "first" as const }));
    const roundId = await makeOpenRound(db(), lead, { examiners: [examiner], items, ...changes });
    const ids = await showingIds(db(), examiner, roundId);
    return { roundId, ids, itemId: ids[0] ?? "" };
  };
  const put = (itemId: string, body: unknown, person = examiner) => {
    signInAs(person.id);
    return callRoute(save, { params: { itemId }, body });
  };
  const refuse = (itemId: string, body: unknown, person?: TestPerson) =>
    changingNothing(db(), () => put(itemId, body, person));
  const storedOf = (itemId: string) => db()("readings").where({ assignment_item_id: itemId });

  describe("whoever asks", () => {
    let itemId: string;
    beforeAll(async () => {
      ({ itemId } = await openRound());
    });
    const guarded = {
      db,
      handler: save,
      roles: ["examiner", "trainee"] as const,
      people: () => people,
      call: () => ({ params: { itemId }, body: readingInput() }),
      param: "itemId",
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);
    it("answers 404 for somebody else's showing, in the same round too", async () => {
      const colleague = await makePerson(db(), lead.departmentId, ["examiner"]);
      expectProblem(await refuse(itemId, readingInput(), colleague), 404, "not-found");
      const shared = await openRound({ examiners: [examiner, colleague] });
      expectProblem(await refuse(shared.itemId, readingInput(), colleague), 404, "not-found");
    });

    it.each<[string, Record<string, unknown>, string[]]>([
      ["no finding", { finding: undefined }, ["#/finding"]],
      ["a finding without an eye", { finding: { ...leftExo(20), eye: "none" } }, ["#/finding/eye"]],
      ["an eye without a direction", { finding: { ...ALIGNED, eye: "left" } }, ["#/finding/horizontal"]],
      ["0 degrees", { finding: leftExo(0) }, ["#/finding/horizontalDegrees"]],
      ["46 degrees", { finding: leftExo(46) }, ["#/finding/horizontalDegrees"]],
      ["degrees as a text", { finding: { ...leftExo(1), horizontalDegrees: "20" } }, ["#/finding/horizontalDegrees"]],
      ["a reason that is none", { finding: { readable: false, reason: "tired" } }, ["#/finding/reason"]],
      ["no name of the save", { saveId: "1" }, ["#/saveId"]],
      ["revision 0", { revision: 0 }, ["#/revision"]],
      ["another confidence", { confidence: "certain" }, ["#/confidence"]],
      ["seconds below 0", { seconds: -1 }, ["#/seconds"]],
      ["a field that does not exist", { reference: ALIGNED }, ["#"]],
    ])("answers 422 to %s and keeps nothing", async (_, changes, pointers) => {
      expectFieldErrors(await refuse(itemId, readingInput(changes)), pointers);
    });
    it("answers 400 to what is not JSON", async () => {
      expectProblem(await refuse(itemId, "left exo"), 400, "not-json");
    });
  });

  it("keeps the reading with the convention of the round, and answers with what is kept", async () => {
    await db()("departments").where({ id: lead.departmentId }).update({ convention: "own", own_degrees_per_mm: 11.5 });
    const { itemId } = await openRound();
    await db()("departments")
      .where({ id: lead.departmentId })
      .update({ convention: "landmarks", own_degrees_per_mm: null });
    const input = readingInput({ finding: { ...leftExo(1), horizontalDegrees: ">45" }, confidence: "unsure" });
    const { status, body } = await put(itemId, input);
    expect(status).toBe(200);
    const { savedAt, ...kept } = SavedReadingSchema.parse(body);
    expect({ saveId: input.saveId, ...kept }).toEqual(input);
    expect(await storedOf(itemId)).toMatchObject([
      {
        save_id: input.saveId,
        convention: "own",
        own_degrees_per_mm: "11.50",
        horizontal_degrees: null,
        horizontal_beyond: true,
        seconds: "4.5",
        saved_at: new Date(savedAt),
      },
    ]);
  });
  it("replaces the reading by a later one, and remembers the first time", async () => {
    const { itemId } = await openRound();
    await put(itemId, readingInput());
    const [before] = await storedOf(itemId);
    expect((await put(itemId, readingInput({ revision: 2, finding: rightEso(15) }))).status).toBe(200);
    const [after] = await storedOf(itemId);
    expect(after).toMatchObject({ id: before.id, eye: "right", revision: 2, first_saved_at: before.first_saved_at });
  });

  it("counts the same save once, whether it comes again later, at once, or with other words", async () => {
    const { itemId } = await openRound();
    const input = readingInput();
    const answers = await Promise.all([put(itemId, input), put(itemId, input), put(itemId, input)]);
    expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
    const [first] = answers;
    expect(answers.map(({ body }) => body)).toEqual([first?.body, first?.body, first?.body]);
    expect((await refuse(itemId, input)).body).toEqual(first?.body);
    expect((await refuse(itemId, { ...input, finding: rightEso(40) })).body).toEqual(first?.body);
  });
  it("answers 409 to an older save and keeps the newer one", async () => {
    const { itemId } = await openRound();
    await put(itemId, readingInput({ revision: 5, finding: rightEso(15) }));
    for (const revision of [4, 5]) {
      expectProblem(await refuse(itemId, readingInput({ revision })), 409, "older-reading");
    }
  });

  it("answers 409 before the opening", async () => {
    const { itemId } = await openRound({ opensAt: hence(1) });
    expectProblem(await refuse(itemId, readingInput()), 409, "round-not-open");
  });
  it("takes a reading from the very moment of opening up to the closing, and not at it", async () => {
    const [opensAt, closesAt] = [hence(1), hence(2)];
    const { ids } = await openRound({ opensAt, closesAt });
    const saveAt = (id: string, ms: number) => saveReading(db(), examiner, id, readingInput(), new Date(ms));
    const [one = "", two = "", three = ""] = ids;
    await expect(saveAt(one, opensAt.getTime() - 1)).rejects.toMatchObject({ code: "round-not-open" });
    await saveAt(one, opensAt.getTime());
    await saveAt(two, closesAt.getTime() - 1);
    await expect(saveAt(three, closesAt.getTime())).rejects.toMatchObject({ code: "round-closed" });
    expect(await db()("readings").whereIn("assignment_item_id", ids)).toHaveLength(2);
  });
  it("answers 409 after the closing, and says that the reading was not counted but kept on the screen", async () => {
    const { roundId, itemId } = await openRound();
    await db()("rounds")
      .where({ id: roundId })
      .update({ closes_at: new Date(Date.now() - 1) });
    expectProblem(await refuse(itemId, readingInput()), 409, "round-closed");
    await advanceRound(db(), lead, roundId, "closed");
    const { detail } = expectProblem(await refuse(itemId, readingInput()), 409, "round-closed");
    expect(detail).toMatch(/not counted.*kept on your screen/);
  });
  it("answers 409 after handing in", async () => {
    const { roundId, itemId } = await openRound();
    await readWholeRound(db(), examiner, roundId, () => leftExo(20));
    await submitRound(db(), examiner, roundId);
    expectProblem(await refuse(itemId, readingInput({ revision: 2 })), 409, "round-submitted");
  });
  it("confirms after the closing a save that had arrived before, whose answer was lost", async () => {
    const { roundId, itemId } = await openRound();
    const input = readingInput();
    const { body } = await put(itemId, input);
    await advanceRound(db(), lead, roundId, "closed");
    expect(await refuse(itemId, input)).toMatchObject({ status: 200, body });
  });

  it("keeps the newest of 20 saves of one case at once", async () => {
    const { itemId } = await openRound();
    const revisions = Array.from({ length: 20 }, (_, index) => ((index * 7) % 20) + 1); // 1 to 20, not in order
    const inputs = revisions.map((revision) => readingInput({ revision, finding: leftExo(revision) }));
    const answers = await Promise.all(inputs.map((input) => put(itemId, input)));
    for (const answer of answers) if (answer.status !== 200) expectProblem(answer, 409, "older-reading");
    expect(await storedOf(itemId)).toMatchObject([{ revision: 20, horizontal_degrees: 20 }]);
  });
  it("keeps every one of 20 saves of 20 cases at once", async () => {
    const kinds = ["first", "repeat", "repeat", "repeat", "repeat", "mirrored", "mirrored"] as const;
    const items = kinds.flatMap((kind) => caseIds.map((caseId) => ({ caseId, kind })));
    const { ids } = await openRound({ items: items.slice(0, 20) });
    const answers = await Promise.all(ids.map((id, index) => put(id, readingInput({ finding: leftExo(index + 1) }))));
    expect(answers.map(({ status }) => status)).toEqual(Array(20).fill(200));
    for (const [index, id] of ids.entries())
      expect(await storedOf(id)).toMatchObject([{ horizontal_degrees: index + 1 }]);
  });

  describe("racing a close", () => {
    it("waits for a close under way, and is refused by it", async () => {
      const { roundId, itemId } = await openRound();
      const closing = await db().transaction();
      await advanceRound(closing, lead, roundId, "closed");
      const saving = put(itemId, readingInput());
      await sleep(300); // it must not have got through, nor been refused, before the close is decided
      expect(await storedOf(itemId)).toEqual([]);
      await closing.commit();
      expectProblem(await saving, 409, "round-closed");
      expect(await storedOf(itemId)).toEqual([]);
    });
    it("is taken when the close under way is given up", async () => {
      const { roundId, itemId } = await openRound();
      const closing = await db().transaction();
      await advanceRound(closing, lead, roundId, "closed");
      const saving = put(itemId, readingInput());
      await sleep(100);
      await closing.rollback();
      expect((await saving).status).toBe(200);
    });
    it("makes the close wait for a save under way, which then counts", async () => {
      const { roundId, itemId } = await openRound();
      const saving = await db().transaction();
      await saveReading(saving, examiner, itemId, readingInput());
      const closing = advanceRound(db(), lead, roundId, "closed");
      await sleep(300);
      expect(await db()("rounds").where({ id: roundId }).first()).toMatchObject({ state: "open" });
      await saving.commit();
      await closing;
      await runDueJobs();
      const [result] = await db()("examiner_results")
        .join("results", "results.id", "result_id")
        .where({ round_id: roundId });
      expect(result.figures).toMatchObject({ caseCount: 3, readCount: 1 });
    });
    it("never lands after the close: every save is kept and acknowledged, or neither", async () => {
      const examiners = [
        examiner,
        ...(await Promise.all([1, 2, 3].map(() => makePerson(db(), lead.departmentId, ["examiner"])))),
      ];
      const { roundId } = await openRound({ examiners });
      const saves: Promise<unknown>[] = [];
      const outcomes: { id: string; isKept: boolean }[] = [];
      for (const person of examiners) {
        for (const id of await showingIds(db(), person, roundId)) {
          const saving = saveReading(db(), person, id, readingInput()).then(
            () => outcomes.push({ id, isKept: true }),
            () => outcomes.push({ id, isKept: false }),
          );
          saves.push(saving);
          if (saves.length === 6) saves.push(advanceRound(db(), lead, roundId, "closed"));
        }
      }
      await Promise.all(saves);
      const rows = await db()("readings")
        .join("assignment_items", "assignment_items.id", "assignment_item_id")
        .join("assignments", "assignments.id", "assignment_id")
        .where({ round_id: roundId })
        .select("assignment_item_id");
      expect(rows.map((row) => row.assignment_item_id).sort()).toEqual(
        outcomes
          .filter(({ isKept }) => isKept)
          .map(({ id }) => id)
          .sort(),
      );
      expect(outcomes).toHaveLength(12);
      await runDueJobs();
      const figures = await db()("examiner_results")
        .join("results", "results.id", "result_id")
        .where({ round_id: roundId });
      expect(figures.reduce((total, row) => total + row.figures.readCount, 0)).toBe(rows.length);
    });
  });
});
