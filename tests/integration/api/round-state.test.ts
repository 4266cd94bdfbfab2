import { afterEach, beforeAll, describe, expect, it } from "vitest";
import { PUT as setState } from "@/app/api/rounds/[roundId]/state/route";
import { smallestGap } from "@/lib/rounds/draw-order";
import { removePictures } from "@/lib/rounds/publish";
import { deleteObject, getObject } from "@/lib/storage/objects";
import { listObjectKeys } from "../../support/bucket";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { useFaultyStorage } from "../../support/faulty-storage";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { listJobs, runDueJobs } from "../../support/jobs";
import { expectFieldErrors, expectProblem, expectUnforeseen } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  closeAndCompute,
  leftExo,
  makeCase,
  makeDraft,
  makeOpenRound,
  makePerson,
  type TestPerson,
  type TestRound,
} from "../../support/world";

const HOUR_MS = 3_600_000;

describe("PUT /api/rounds/[roundId]/state", () => {
  const db = useDatabase();
  const storage = useFaultyStorage();
  afterEach(() => storage.heal());
  let people: TwoDepartments;
  let lead: TestPerson;
  let caseIds: string[];
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    ({ lead } = people.own);
    caseIds = [];
    for (const degrees of [15, 20, 30]) caseIds.push(await makeCase(db(), lead, leftExo(degrees)));
  });

  const round = (changes: Partial<TestRound> = {}): TestRound => ({
    examiners: [people.own.examiner, people.own.trainee],
    items: [
      ...caseIds.map((caseId) => ({ caseId, kind: "first" as const })),
      ...caseIds.slice(0, 1).map((caseId) => ({ caseId, kind: "mirrored" as const })),
    ],
    ...changes,
  });
  const put = (roundId: string, to: unknown) => {
    signInAs(lead.id);
    return callRoute(setState, { params: { roundId }, body: { to } });
  };
  const refuse = (roundId: string, to: unknown) => changingNothing(db(), () => put(roundId, to));
  /** A round in each of its states. */
  const inState = {
    draft: () => makeDraft(db(), lead, round()),
    open: () => makeOpenRound(db(), lead, round()),
    closed: async () => {
      const roundId = await makeOpenRound(db(), lead, round());
      await closeAndCompute(db(), lead, roundId);
      return roundId;
    },
    released: async () => {
      const roundId = await inState.closed();
      expect((await put(roundId, "released")).status).toBe(200);
      return roundId;
    },
  };

  describe("whoever asks", () => {
    let roundId: string;
    beforeAll(async () => {
      roundId = await inState.draft();
    });
    const guarded = {
      db,
      handler: setState,
      roles: ["lead"] as const,
      people: () => people,
      call: () => ({ params: { roundId }, body: { to: "open" } }),
      param: "roundId",
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);
    it("answers 422 to a state that cannot be asked for, 400 to what is not JSON", async () => {
      expectFieldErrors(await refuse(roundId, "draft"), ["#/to"]);
      expectFieldErrors(await refuse(roundId, "deleted"), ["#/to"]);
      expectFieldErrors(await refuse(roundId, undefined), ["#/to"]);
      const text = { params: { roundId }, body: "open" };
      expectProblem(await changingNothing(db(), () => callRoute(setState, text)), 400, "not-json");
    });
  });

  it.each<[keyof typeof inState, string[]]>([
    ["draft", ["closed", "released"]],
    ["open", ["open", "released"]],
    ["closed", ["open", "closed"]],
    ["released", ["open", "closed", "released"]],
  ])("answers 409 to any step of a round that is %s but the next", async (state, steps) => {
    const roundId = await inState[state]();
    for (const to of steps) expectProblem(await refuse(roundId, to), 409, "round-state");
  });

  describe("publishing", () => {
    it("gives every item a picture, every examiner all items in an order, and queues the closing", async () => {
      const closesAt = new Date(Date.now() + 5 * HOUR_MS);
      const roundId = await makeDraft(db(), lead, round({ closesAt }));
      const keys = await listObjectKeys();
      expect((await put(roundId, "open")).body).toMatchObject({ id: roundId, state: "open" });

      const items = await db()("items").where({ round_id: roundId });
      const pictures = items.map(({ picture_key }) => picture_key);
      expect((await listObjectKeys()).filter((key) => !keys.includes(key)).sort()).toEqual(pictures.sort());
      const bodies = await Promise.all(
        pictures.map(async (key) => Buffer.from((await getObject(key)).body).toString("hex")),
      );
      expect(new Set(bodies).size).toBe(4);
      const places = await db()("assignment_items")
        .join("assignments", "assignments.id", "assignment_id")
        .join("items", "items.id", "item_id")
        .where("assignments.round_id", roundId)
        .orderBy("place");
      for (const { id } of round().examiners) {
        const own = places.filter(({ person_id }) => person_id === id);
        expect(own.map(({ place }) => place)).toEqual([1, 2, 3, 4]);
        expect(new Set(own.map(({ item_id }) => item_id))).toEqual(new Set(items.map((item) => item.id)));
        expect(smallestGap(own.map((each) => ({ id: each.item_id, twin: each.case_id })))).toBeGreaterThanOrEqual(2);
      }
      expect(await listJobs(db())).toContainEqual(
        expect.objectContaining({ task: "close-round", key: `close:${roundId}`, runAt: closesAt }),
      );
      expect(await db()("audit_events").where({ target_id: roundId, action: "round.open" })).toMatchObject([
        { actor_id: lead.id, department_id: lead.departmentId },
      ]);
    });

    it.each<[string, () => Partial<TestRound>, string[]]>([
      ["without cases", () => ({ items: [] }), ["#/items"]],
      ["without examiners", () => ({ examiners: [] }), ["#/examinerIds"]],
      ["without either", () => ({ items: [], examiners: [] }), ["#/items", "#/examinerIds"]],
      [
        "that closes in the past",
        () => ({ opensAt: new Date(Date.now() - 2 * HOUR_MS), closesAt: new Date(Date.now() - HOUR_MS) }),
        ["#/closesAt"],
      ],
    ])("answers 422 to a round %s", async (_, changes, pointers) => {
      const roundId = await makeDraft(db(), lead, round(changes()));
      expectFieldErrors(await refuse(roundId, "open"), pointers, "round-incomplete");
    });
    it("answers 422 to a round without its times", async () => {
      const roundId = await inState.draft();
      await db()("rounds").where({ id: roundId }).update({ closes_at: null });
      expectFieldErrors(await refuse(roundId, "open"), ["#/closesAt"], "round-incomplete");
      await db()("rounds").where({ id: roundId }).update({ opens_at: null });
      expectFieldErrors(await refuse(roundId, "open"), ["#/opensAt"], "round-incomplete");
    });
    it("answers 422 when a case was retired since it was chosen", async () => {
      const caseId = await makeCase(db(), lead, leftExo(10));
      const roundId = await makeDraft(db(), lead, round({ items: [{ caseId, kind: "first" }] }));
      await db()("cases").where({ id: caseId }).update({ retired_at: new Date() });
      expectFieldErrors(await refuse(roundId, "open"), ["#/items"], "round-incomplete");
    });
    it.each<[string, (personId: string) => Promise<unknown>]>([
      [
        "has become a lead",
        (personId) =>
          db()("memberships")
            .where({ person_id: personId })
            .update({ roles: ["examiner", "lead"] }),
      ],
      [
        "no longer reads",
        (personId) =>
          db()("memberships")
            .where({ person_id: personId })
            .update({ roles: ["admin"] }),
      ],
      ["was disabled", (personId) => db()("people").where({ id: personId }).update({ disabled_at: new Date() })],
    ])("answers 422 when a chosen examiner %s since", async (_, change) => {
      const changing = await makePerson(db(), lead.departmentId, ["examiner"]);
      const roundId = await makeDraft(db(), lead, round({ examiners: [people.own.examiner, changing] }));
      await change(changing.id);
      expectFieldErrors(await refuse(roundId, "open"), ["#/examinerIds"], "round-incomplete");
    });

    it("lets exactly one of two at once win, with one picture for each item", async () => {
      const roundId = await inState.draft();
      const objects = (await listObjectKeys()).length;
      const answers = await Promise.all([put(roundId, "open"), put(roundId, "open")]);
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
      expect(await listObjectKeys()).toHaveLength(objects + 4);
      expect(await db()("audit_events").where({ target_id: roundId, action: "round.open" })).toHaveLength(1);
      const orders = db()("assignments").where({ round_id: roundId }).select("id");
      expect(await db()("assignment_items").whereIn("assignment_id", orders)).toHaveLength(8);
    });

    it.each(["refused", "answer lost"] as const)(
      "publishes nothing when the storage fails midway (%s)",
      async (fault) => {
        const roundId = await inState.draft();
        const called = await changingNothing(db(), async () => {
          storage.failPutAfter(2, fault);
          const answer = await put(roundId, "open");
          storage.heal();
          return answer;
        });
        expectProblem(called, 503, "storage-unavailable");
        expect((await put(roundId, "open")).status).toBe(200); // and can be tried again
      },
    );
    it("publishes nothing when a photograph is missing", async () => {
      const caseId = await makeCase(db(), lead, leftExo(10));
      const roundId = await makeDraft(db(), lead, round({ items: [...round().items, { caseId, kind: "first" }] }));
      const [row] = await db()("cases")
        .join("photographs", "photographs.id", "photograph_id")
        .where("cases.id", caseId);
      await deleteObject(row.storage_key);
      expectUnforeseen(await refuse(roundId, "open"));
    });
    it("leaves no picture behind when the last step fails", async () => {
      const roundId = await inState.draft();
      await db().raw(`
        CREATE FUNCTION refuse_entry() RETURNS trigger LANGUAGE plpgsql AS $$ BEGIN RAISE EXCEPTION 'full'; END $$;
        CREATE TRIGGER refuse_entry BEFORE INSERT ON audit_events FOR EACH STATEMENT EXECUTE FUNCTION refuse_entry()`);
      try {
        expectUnforeseen(await refuse(roundId, "open"));
      } finally {
        await db().raw("DROP FUNCTION refuse_entry CASCADE");
      }
    });
    it("keeps the pictures of a publishing that was committed although its answer was lost", async () => {
      const roundId = await inState.open();
      const items = await db()("items").where({ round_id: roundId });
      await changingNothing(db(), () =>
        removePictures(
          db(),
          items.map(({ picture_key }) => picture_key),
        ),
      );
    });
  });

  describe("closing", () => {
    it("queues the results, which are computed once", async () => {
      const roundId = await inState.open();
      expect((await put(roundId, "closed")).body).toMatchObject({ state: "closed", closedAt: expect.any(String) });
      expect(await listJobs(db())).toContainEqual(
        expect.objectContaining({ task: "compute-results", key: `results:${roundId}` }),
      );
      await runDueJobs();
      expect(await db()("results").where({ round_id: roundId })).toMatchObject([{ revision: 1, reason: "closed" }]);
    });
    it("lets exactly one of two at once win", async () => {
      const roundId = await inState.open();
      const answers = await Promise.all([put(roundId, "closed"), put(roundId, "closed")]);
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
      expect(await db()("audit_events").where({ target_id: roundId, action: "round.closed" })).toHaveLength(1);
      await runDueJobs();
      expect(await db()("results").where({ round_id: roundId })).toHaveLength(1);
    });
  });

  describe("releasing", () => {
    it("answers 409 until the results are there", async () => {
      const roundId = await inState.open();
      await put(roundId, "closed");
      expectProblem(await refuse(roundId, "released"), 409, "results-pending");
      await runDueJobs();
      expect((await put(roundId, "released")).body).toMatchObject({ state: "released" });
      expect(await db()("audit_events").where({ target_id: roundId, action: "round.released" })).toHaveLength(1);
    });
    it("lets exactly one of two at once win", async () => {
      const roundId = await inState.closed();
      const answers = await Promise.all([put(roundId, "released"), put(roundId, "released")]);
      expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    });
  });
});
