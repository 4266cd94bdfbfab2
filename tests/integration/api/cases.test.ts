import { beforeAll, describe, expect, it } from "vitest";
import { PATCH as changeCase, GET as getCase } from "@/app/api/cases/[caseId]/route";
import { POST as addCase, GET as listCases } from "@/app/api/cases/route";
import { CaseDetailSchema, CaseListSchema } from "@/lib/cases/schema";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { listObjectKeys } from "../../support/bucket";
import { callRoute } from "../../support/call-route";
import { caseFields, caseForm } from "../../support/case-form";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import { leftExo, makeCase, makeDraft, makeOpenRound, makePhotograph, rightEso } from "../../support/world";

describe("the case library", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
  });

  describe("GET /api/cases", () => {
    const findings: Record<string, Finding> = {
      aligned: ALIGNED,
      eso: rightEso(15),
      exo: leftExo(30),
      vertical: { ...ALIGNED, eye: "left", vertical: "hypo", verticalDegrees: 10 },
      combined: { ...rightEso(20), vertical: "hyper", verticalDegrees: ">45" },
      "not-readable": { readable: false, reason: "needs-cover-test" },
    };
    beforeAll(async () => {
      for (const [kind, finding] of Object.entries(findings)) {
        await makeCase(db(), people.own.lead, finding, { code: `kind.${kind}` });
      }
      const retired = await makeCase(db(), people.own.lead, ALIGNED, { code: "kind.retired" });
      await db()("cases").where({ id: retired }).update({ retired_at: new Date() });
      await db()("cases").where({ code: "kind.eso" }).update({ is_anchor: true, note: "100% sure_thing" });
      await makeCase(db(), people.other.lead, ALIGNED, { code: "kind.foreign" });
    });
    const codesFor = async (query: Record<string, string>) => {
      signInAs(people.own.lead.id);
      const { status, body } = await callRoute(listCases, { query });
      expect(status).toBe(200);
      return CaseListSchema.parse(body).cases.map(({ code }) => code.replace("kind.", ""));
    };

    itIsGuarded({ db, handler: listCases, roles: ["lead"], people: () => people });

    it("lists the department's own cases in force, by code, and counts all it has", async () => {
      signInAs(people.own.lead.id);
      const { body, headers } = await callRoute(listCases);
      const { cases, total } = CaseListSchema.parse(body);
      const expected = ["aligned", "combined", "eso", "exo", "not-readable", "vertical"];
      expect(cases.map(({ code }) => code)).toEqual(expected.map((kind) => `kind.${kind}`));
      expect(cases.map(({ finding }) => finding)).toEqual(expected.map((kind) => findings[kind]));
      expect(total).toBe(7);
      expect(headers.get("cache-control")).toBe("no-store");
    });
    it.each(Object.keys(findings))("finds of the kind %s exactly that case", async (kind) => {
      expect(await codesFor({ kind })).toEqual([kind]);
    });
    it("finds by part of a code or a note, in any case, and takes % and _ as they are", async () => {
      expect(await codesFor({ q: "ESO" })).toEqual(["eso"]);
      expect(await codesFor({ q: "sure_THING" })).toEqual(["eso"]);
      expect(await codesFor({ q: "%" })).toEqual(["eso"]);
      expect(await codesFor({ q: "_" })).toEqual(["eso"]);
      expect(await codesFor({ q: "\\" })).toEqual([]);
      expect(await codesFor({ q: "'; DROP TABLE cases; --" })).toEqual([]);
    });
    it("shows anchors and retired cases when asked", async () => {
      expect(await codesFor({ anchors: "only" })).toEqual(["eso"]);
      expect(await codesFor({ retired: "only" })).toEqual(["retired"]);
      expect(await codesFor({ retired: "with" })).toHaveLength(7);
    });
    it("answers 422 to a filter it does not know, by name or by value", async () => {
      signInAs(people.own.lead.id);
      expectFieldErrors(await callRoute(listCases, { query: { kinds: "eso" } }), ["#"]);
      expectFieldErrors(await callRoute(listCases, { query: { kind: "esotropia", retired: "yes" } }), [
        "#/kind",
        "#/retired",
      ]);
      expectFieldErrors(await callRoute(listCases, { query: { q: "x".repeat(101) } }), ["#/q"]);
    });
  });

  describe("POST /api/cases", () => {
    let photograph: Buffer;
    beforeAll(async () => {
      photograph = await makePhotograph();
    });
    const post = (fields: unknown, file: Uint8Array | undefined = photograph, name?: string) => {
      signInAs(people.own.lead.id);
      return callRoute(addCase, { method: "POST", body: caseForm(fields, file, name) });
    };
    const guarded = {
      db,
      handler: addCase,
      roles: ["lead"] as const,
      people: () => people,
      call: () => ({ method: "POST", body: caseForm(caseFields({ code: "guarded" }), photograph) }),
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);

    it("adds the case with its photograph, first reference and audit entry", async () => {
      const code = "a".repeat(24);
      const fields = caseFields({ code: ` ${code} `, note: "n".repeat(500), isAnchor: true });
      const { status, body, headers } = await post(fields, photograph, "my photograph.jpeg");
      expect(status).toBe(201);
      const { id } = CaseDetailSchema.pick({ id: true }).parse(body);
      expect(headers.get("location")).toBe(`/api/cases/${id}`);
      const detail = CaseDetailSchema.parse((await callRoute(getCase, { params: { caseId: id } })).body);
      expect(detail).toMatchObject({
        code,
        isAnchor: true,
        isRetired: false,
        finding: leftExo(20),
        width: 420,
        height: 184,
        originalName: "my photograph.jpeg",
        lastRoundNumber: null,
        rounds: [],
        references: [{ revision: 1, basis: "panel", uncertaintyDegrees: null, createdBy: people.own.lead.name }],
      });
      expect(await db()("audit_events").where({ target_id: id })).toMatchObject([
        { action: "case.created", actor_id: people.own.lead.id, department_id: people.own.lead.departmentId },
      ]);
    });

    it.each<[string, Record<string, unknown>, string[]]>([
      ["no code", { code: "" }, ["#/code"]],
      ["a code of 25 letters", { code: "a".repeat(25) }, ["#/code"]],
      ["a code with a space", { code: "C 1" }, ["#/code"]],
      ["a note of 501 letters", { note: "n".repeat(501) }, ["#/note"]],
      ["no consent", { consent: undefined }, ["#/consent"]],
      ["another consent", { consent: "assumed" }, ["#/consent"]],
      ["a field that does not exist", { colour: "blue" }, ["#"]],
      ["no reference", { reference: undefined }, ["#/reference"]],
      ["an unknown basis", { reference: { finding: ALIGNED, basis: "guess" } }, ["#/reference/basis"]],
      [
        "an uncertainty below 0",
        { reference: { finding: ALIGNED, basis: "panel", uncertaintyDegrees: -1 } },
        ["#/reference/uncertaintyDegrees"],
      ],
    ])("answers 422 to %s, points at it and keeps nothing", async (_, changes, pointers) => {
      expectFieldErrors(await changingNothing(db(), () => post(caseFields(changes))), pointers);
    });

    it.each<[string, unknown, string[]]>([
      ["a deviating eye without a direction", { ...ALIGNED, eye: "left" }, ["horizontal"]],
      ["a direction without an eye", { ...leftExo(20), eye: "none" }, ["eye"]],
      ["a direction without degrees", { ...leftExo(20), horizontalDegrees: null }, ["horizontalDegrees"]],
      ["degrees without a direction", { ...leftExo(20), verticalDegrees: 5 }, ["verticalDegrees"]],
      ["0 degrees", leftExo(0), ["horizontalDegrees"]],
      ["46 degrees", leftExo(46), ["horizontalDegrees"]],
      ["half a degree", leftExo(1.5), ["horizontalDegrees"]],
      ["no reason", { readable: false }, ["reason"]],
      ["a reason beside directions", { ...leftExo(20), reason: "blurred" }, [""]],
    ])("answers 422 to a reference with %s", async (_, finding, fields) => {
      const called = await changingNothing(db(), () => post(caseFields({ reference: { finding, basis: "panel" } })));
      expectFieldErrors(
        called,
        fields.map((field) => `#/reference/finding${field && `/${field}`}`),
      );
    });

    it("answers 422 to a character that a text cannot hold", async () => {
      expectFieldErrors(await changingNothing(db(), () => post(caseFields({ note: "a\u0000b" }))), ["#/note"]);
    });
    it("answers 422 without a photograph or with an empty one", async () => {
      const without = () => callRoute(addCase, { method: "POST", body: caseForm(caseFields()) });
      signInAs(people.own.lead.id);
      expectFieldErrors(await changingNothing(db(), without), ["#/photograph"]);
      expectFieldErrors(await changingNothing(db(), () => post(caseFields(), new Uint8Array())), ["#/photograph"]);
    });
    it("answers 400 to fields that are not JSON, and to what is no form", async () => {
      expectProblem(await changingNothing(db(), () => post("{code")), 400, "not-json");
      const form = { method: "POST", body: "code=1", headers: { "content-type": "text/plain" } };
      expectProblem(await changingNothing(db(), () => callRoute(addCase, form)), 400, "not-a-form");
    });

    it("answers 409 to a code in use, in capitals too, and keeps no photograph of it", async () => {
      expect((await post(caseFields({ code: "twice" }))).status).toBe(201);
      expectProblem(await changingNothing(db(), () => post(caseFields({ code: "TWICE" }))), 409, "code-in-use");
      signInAs(people.other.lead.id);
      const other = await callRoute(addCase, {
        method: "POST",
        body: caseForm(caseFields({ code: "twice" }), photograph),
      });
      expect(other.status).toBe(201); // another department's codes are its own
    });
    it("gives a code to exactly one of several uploads at once", async () => {
      const objects = (await listObjectKeys()).length;
      const answers = await Promise.all([1, 2, 3, 4].map(() => post(caseFields({ code: "at-once" }))));
      expect(answers.map(({ status }) => status).sort()).toEqual([201, 409, 409, 409]);
      expect(await db()("cases").where({ code: "at-once" })).toHaveLength(1);
      expect(await listObjectKeys()).toHaveLength(objects + 1);
    });
  });

  describe("GET /api/cases/[caseId]", () => {
    let caseId: string;
    beforeAll(async () => {
      caseId = await makeCase(db(), people.own.lead, leftExo(15));
    });
    itIsGuarded({
      db,
      handler: getCase,
      roles: ["lead"],
      people: () => people,
      call: () => ({ params: { caseId } }),
      param: "caseId",
    });

    it("tells in which rounds the case was shown, drafts apart from the last one", async () => {
      const items = [{ caseId, kind: "first" as const }];
      await makeOpenRound(db(), people.own.lead, { examiners: [people.own.examiner], items, title: "Shown" });
      await makeDraft(db(), people.own.lead, { examiners: [], items, title: "Planned" });
      signInAs(people.own.lead.id);
      const detail = CaseDetailSchema.parse((await callRoute(getCase, { params: { caseId } })).body);
      expect(detail.rounds.map(({ title, state }) => [title, state])).toEqual([
        ["Planned", "draft"],
        ["Shown", "open"],
      ]);
      expect(detail.lastRoundNumber).toBe(detail.rounds[1]?.number);
    });
  });

  describe("PATCH /api/cases/[caseId]", () => {
    let caseId: string;
    beforeAll(async () => {
      caseId = await makeCase(db(), people.own.lead, leftExo(15));
    });
    const patch = (body: unknown) => {
      signInAs(people.own.lead.id);
      return callRoute(changeCase, { method: "PATCH", params: { caseId }, body });
    };
    const guarded = {
      db,
      handler: changeCase,
      roles: ["lead"] as const,
      people: () => people,
      call: () => ({ method: "PATCH", params: { caseId }, body: { note: "guarded" } }),
      param: "caseId",
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);

    it("changes what is named and leaves the rest, with an audit entry", async () => {
      expect((await patch({ note: " a new note " })).body).toMatchObject({ note: "a new note", isAnchor: false });
      expect((await patch({ isAnchor: true })).body).toMatchObject({ note: "a new note", isAnchor: true });
      const [latest] = await db()("audit_events").where({ target_id: caseId }).orderBy("id", "desc");
      expect(latest).toMatchObject({ action: "case.changed", detail: { isAnchor: true } });
    });
    it("retires a case and takes it back", async () => {
      expect((await patch({ isRetired: true })).body).toMatchObject({ isRetired: true });
      expect((await patch({ isRetired: false })).body).toMatchObject({ isRetired: false });
    });
    it("answers 422 to other fields and to text too long, 400 to what is not JSON", async () => {
      expectFieldErrors(await changingNothing(db(), () => patch({ code: "new" })), ["#"]);
      expectFieldErrors(await changingNothing(db(), () => patch({ note: "n".repeat(501), isAnchor: "yes" })), [
        "#/note",
        "#/isAnchor",
      ]);
      expectProblem(await changingNothing(db(), () => patch("note=1")), 400, "not-json");
    });
    it("answers 422 to a character that a text cannot hold", async () => {
      expectFieldErrors(await changingNothing(db(), () => patch({ note: "a\u0000b" })), ["#/note"]);
    });
  });
});
