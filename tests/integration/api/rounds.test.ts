import { beforeAll, describe, expect, it } from "vitest";
import { GET as getProgress } from "@/app/api/rounds/[roundId]/progress/route";
import { GET as getRound, PUT as saveDraft } from "@/app/api/rounds/[roundId]/route";
import { GET as listRounds, POST as startDraft } from "@/app/api/rounds/route";
import { RoundDetailSchema, RoundListSchema, RoundProgressSchema } from "@/lib/rounds/schema";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  leftExo,
  makeCase,
  makeDraft,
  makeOpenRound,
  makePerson,
  readWholeRound,
  rightEso,
  type TestPerson,
} from "../../support/world";

describe("rounds", () => {
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
  const firsts = () => caseIds.map((caseId) => ({ caseId, kind: "first" as const }));

  describe("GET /api/rounds", () => {
    itIsGuarded({ db, handler: listRounds, roles: ["lead"], people: () => people });

    it("lists the department's own rounds, newest first, with what has been done", async () => {
      const read = await makeOpenRound(db(), lead, { examiners: [examiner], items: firsts(), title: "Half read" });
      await readWholeRound(db(), examiner, read, (caseId) => (caseId === caseIds[0] ? null : leftExo(20)));
      await makeDraft(db(), lead, { examiners: [], items: [], title: "Planned" });
      await makeDraft(db(), people.other.lead, { examiners: [], items: [], title: "Foreign" });
      signInAs(lead.id);
      const { rounds } = RoundListSchema.parse((await callRoute(listRounds)).body);
      expect(rounds.map(({ title, number }) => [title, number])).toEqual([
        ["Planned", 2],
        ["Half read", 1],
      ]);
      const counts = { itemCount: 3, examinerCount: 1, readingCount: 2, submittedCount: 0 };
      expect(rounds[1]).toMatchObject({ state: "open", ...counts });
    });
  });

  describe("POST /api/rounds", () => {
    const post = (body: unknown) => {
      signInAs(lead.id);
      return callRoute(startDraft, { method: "POST", body });
    };
    const guarded = {
      db,
      handler: startDraft,
      roles: ["lead"] as const,
      people: () => people,
      call: () => ({ method: "POST", body: { title: "guarded" } }),
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);

    it("starts a draft on the department's convention, with an audit entry", async () => {
      await db()("departments")
        .where({ id: lead.departmentId })
        .update({ convention: "own", own_degrees_per_mm: 11.5 });
      const { status, body, headers } = await post({ title: `  ${"t".repeat(80)} ` });
      await db()("departments")
        .where({ id: lead.departmentId })
        .update({ convention: "landmarks", own_degrees_per_mm: null });
      expect(status).toBe(201);
      const { id } = RoundDetailSchema.pick({ id: true }).parse(body);
      expect(headers.get("location")).toBe(`/api/rounds/${id}`);
      const row = await db()("rounds").where({ id }).first();
      expect(row).toMatchObject({
        title: "t".repeat(80),
        state: "draft",
        convention: "own",
        own_degrees_per_mm: "11.50",
      });
      expect(await db()("audit_events").where({ target_id: id })).toMatchObject([
        { action: "round.drafted", actor_id: lead.id },
      ]);
    });
    it("gives drafts started at once numbers that follow each other", async () => {
      const highest = await db()("rounds").where({ department_id: lead.departmentId }).max("number as number").first();
      const answers = await Promise.all([1, 2, 3, 4, 5].map((each) => post({ title: `At once ${each}` })));
      expect(answers.map(({ status }) => status)).toEqual([201, 201, 201, 201, 201]);
      const rows = await db()("rounds").whereLike("title", "At once%").orderBy("number");
      expect(rows.map(({ number }) => number - (highest?.number ?? 0))).toEqual([1, 2, 3, 4, 5]);
    });
    it.each<[string, unknown, string[]]>([
      ["no title", {}, ["#/title"]],
      ["a title of spaces", { title: "   " }, ["#/title"]],
      ["a title of 81 letters", { title: "t".repeat(81) }, ["#/title"]],
      ["a title that cannot be stored", { title: "a\u0000b" }, ["#/title"]],
      ["a field that does not exist", { title: "t", state: "open" }, ["#"]],
      ["a list", ["title"], ["#"]],
      ["null", null, ["#"]],
    ])("answers 422 to %s and starts nothing", async (_, body, pointers) => {
      expectFieldErrors(await changingNothing(db(), () => post(body)), pointers);
    });
    it("answers 400 to what is not JSON, and 413 to far too much of it", async () => {
      expectProblem(await changingNothing(db(), () => post("title")), 400, "not-json");
      signInAs(lead.id);
      const long = { method: "POST", body: { title: "t" }, headers: { "content-length": "1000001" } };
      expectProblem(await changingNothing(db(), () => callRoute(startDraft, long)), 413, "body-too-large");
    });
  });

  describe("GET /api/rounds/[roundId]", () => {
    let roundId: string;
    beforeAll(async () => {
      roundId = await makeOpenRound(db(), lead, { examiners: [examiner], items: firsts() });
      await readWholeRound(db(), examiner, roundId, () => leftExo(37));
    });
    itIsGuarded({
      db,
      handler: getRound,
      roles: ["lead"],
      people: () => people,
      call: () => ({ params: { roundId } }),
      param: "roundId",
    });
    it("gives the lead items and examiners of an open round, and no reading", async () => {
      signInAs(lead.id);
      const { body } = await callRoute(getRound, { params: { roundId } });
      expect(RoundDetailSchema.parse(body)).toMatchObject({ items: firsts(), examinerIds: [examiner.id] });
      expect(JSON.stringify(body)).not.toMatch(/\b37\b|finding|exo/);
    });
  });

  describe("PUT /api/rounds/[roundId]", () => {
    let roundId: string;
    beforeAll(async () => {
      roundId = await makeDraft(db(), lead, { examiners: [], items: [] });
    });
    const draft = (changes: Record<string, unknown> = {}) => ({
      title: "Composed",
      instructions: "",
      opensAt: "2031-03-01T09:00:00+01:00",
      closesAt: "2031-03-08T09:00:00Z",
      items: [...firsts(), { caseId: caseIds[0], kind: "repeat" }, { caseId: caseIds[0], kind: "mirrored" }],
      examinerIds: [examiner.id, people.own.trainee.id],
      ...changes,
    });
    const put = (body: unknown, id = roundId) => {
      signInAs(lead.id);
      return callRoute(saveDraft, { params: { roundId: id }, body });
    };
    const guarded = {
      db,
      handler: saveDraft,
      roles: ["lead"] as const,
      people: () => people,
      call: () => ({ method: "PUT", params: { roundId }, body: draft() }),
      param: "roundId",
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);

    it("stores the draft whole, items in their order, and again in place of the last", async () => {
      const detail = RoundDetailSchema.parse((await put(draft())).body);
      expect(detail).toMatchObject({ state: "draft", opensAt: "2031-03-01T08:00:00.000Z", items: draft().items });
      expect(detail.examinerIds.toSorted()).toEqual(draft().examinerIds.toSorted());
      const roles = await db()("assignments").where({ round_id: roundId }).orderBy("assigned_as");
      expect(roles.map(({ assigned_as }) => assigned_as)).toEqual(["examiner", "trainee"]);

      const fewer = { items: firsts().toReversed().slice(1), examinerIds: [], opensAt: null, closesAt: null };
      expect((await put(draft(fewer))).body).toMatchObject({ ...fewer, title: "Composed" });
    });
    it("keeps one of two drafts saved at once whole, never a mixture", async () => {
      const drafts = [
        draft({ title: "One", items: firsts().slice(0, 1), examinerIds: [examiner.id] }),
        draft({ title: "Two", items: firsts().slice(1), examinerIds: [people.own.trainee.id] }),
      ];
      const answers = await Promise.all(drafts.map((each) => put(each)));
      expect(answers.map(({ status }) => status)).toEqual([200, 200]);
      const { title, items, examinerIds } = RoundDetailSchema.parse(
        (await callRoute(getRound, { params: { roundId } })).body,
      );
      const kept = drafts.find((each) => each.title === title);
      expect({ items, examinerIds }).toEqual({ items: kept?.items, examinerIds: kept?.examinerIds });
    });

    it.each<[string, () => Record<string, unknown>, string[]]>([
      ["a closing before the opening", () => ({ closesAt: "2031-02-01T09:00:00Z" }), ["#/closesAt"]],
      ["a closing at the opening", () => ({ closesAt: "2031-03-01T08:00:00Z" }), ["#/closesAt"]],
      ["a day without a time", () => ({ opensAt: "2031-03-01" }), ["#/opensAt"]],
      ["a day that does not exist", () => ({ opensAt: "2031-02-30T09:00:00Z" }), ["#/opensAt"]],
      ["a case chosen twice", () => ({ items: [...firsts(), ...firsts()] }), ["#/items"]],
      ["a repeat without its case", () => ({ items: [{ caseId: caseIds[0], kind: "repeat" }] }), ["#/items"]],
      ["another kind of item", () => ({ items: [{ caseId: caseIds[0], kind: "twin" }] }), ["#/items/0/kind"]],
      ["a case that does not exist", () => ({ items: [{ caseId: crypto.randomUUID(), kind: "first" }] }), ["#/items"]],
      ["301 items", () => ({ items: Array(301).fill(firsts()[0]) }), ["#/items"]],
      ["an examiner chosen twice", () => ({ examinerIds: [examiner.id, examiner.id] }), ["#/examinerIds"]],
      ["a lead as examiner", () => ({ examinerIds: [lead.id] }), ["#/examinerIds"]],
      ["a reviewer as examiner", () => ({ examinerIds: [people.own.reviewer.id] }), ["#/examinerIds"]],
      ["another department's examiner", () => ({ examinerIds: [people.other.examiner.id] }), ["#/examinerIds"]],
      ["an examiner who is no id", () => ({ examinerIds: ["everybody"] }), ["#/examinerIds/0"]],
      ["instructions that cannot be stored", () => ({ instructions: "a\u0000b" }), ["#/instructions"]],
      ["instructions of 2,001 letters", () => ({ instructions: "i".repeat(2001) }), ["#/instructions"]],
      ["no title", () => ({ title: "" }), ["#/title"]],
      ["a field that does not exist", () => ({ state: "open" }), ["#"]],
    ])("answers 422 to %s and keeps the draft as it was", async (_, changes, pointers) => {
      expectFieldErrors(await changingNothing(db(), () => put(draft(changes()))), pointers);
    });
    it("answers 422 to another department's case, a retired one, and people who can no longer read", async () => {
      const foreign = await makeCase(db(), people.other.lead, leftExo(15));
      const retired = await makeCase(db(), lead, leftExo(15));
      await db()("cases").where({ id: retired }).update({ retired_at: new Date() });
      for (const caseId of [foreign, retired]) {
        const items = [{ caseId, kind: "first" }];
        expectFieldErrors(await changingNothing(db(), () => put(draft({ items }))), ["#/items"]);
      }
      const disabled = await makePerson(db(), lead.departmentId, ["examiner"]);
      await db()("people").where({ id: disabled.id }).update({ disabled_at: new Date() });
      const both = await makePerson(db(), lead.departmentId, ["lead", "examiner"]); // knows the references
      for (const { id } of [disabled, both]) {
        expectFieldErrors(await changingNothing(db(), () => put(draft({ examinerIds: [id] }))), ["#/examinerIds"]);
      }
    });
    it("answers 409 once the round is published", async () => {
      const published = await makeOpenRound(db(), lead, { examiners: [examiner], items: firsts() });
      expectProblem(await changingNothing(db(), () => put(draft(), published)), 409, "round-state");
    });
  });

  describe("GET /api/rounds/[roundId]/progress", () => {
    let roundId: string;
    beforeAll(async () => {
      const examiners = [examiner, people.own.trainee];
      roundId = await makeOpenRound(db(), lead, { examiners, items: firsts() });
      await readWholeRound(db(), examiner, roundId, (caseId) => (caseId === caseIds[2] ? null : rightEso(37)));
    });
    itIsGuarded({
      db,
      handler: getProgress,
      roles: ["lead"],
      people: () => people,
      call: () => ({ params: { roundId } }),
      param: "roundId",
    });
    it("says who has read how many, and nothing of what was read", async () => {
      signInAs(lead.id);
      const { body } = await callRoute(getProgress, { params: { roundId } });
      const { examiners, ...round } = RoundProgressSchema.parse(body);
      expect(round).toEqual({ state: "open", itemCount: 3, hasResults: false });
      const counts = Object.fromEntries(examiners.map(({ personId, readCount }) => [personId, readCount]));
      expect(counts).toEqual({ [examiner.id]: 2, [people.own.trainee.id]: 0 });
      expect(JSON.stringify(body)).not.toMatch(/\b37\b|finding|eso/);
    });
  });
});
