import sharp from "sharp";
import { beforeAll, describe, expect, it } from "vitest";
import { GET as getPicture } from "@/app/api/desk/items/[itemId]/picture/route";
import { GET as getSheet } from "@/app/api/desk/rounds/[roundId]/route";
import { PUT as handIn } from "@/app/api/desk/rounds/[roundId]/submission/route";
import { GET as listRounds } from "@/app/api/desk/rounds/route";
import { writeView } from "@/lib/auth/view";
import { DeskListSchema, DeskSheetSchema } from "@/lib/desk/schema";
import { submitRound } from "@/lib/desk/submit-round";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { showingIds } from "../../support/desk";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  closeAndCompute,
  leftExo,
  makeCase,
  makeDraft,
  makeOpenRound,
  makePerson,
  readWholeRound,
  type TestPerson,
  type TestRound,
} from "../../support/world";

const HOUR_MS = 3_600_000;
const hence = (hours: number) => new Date(Date.now() + hours * HOUR_MS);

describe("the desk", () => {
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
  const [first, repeat, mirrored] = ["first" as const, "repeat" as const, "mirrored" as const];
  const round = (changes: Partial<TestRound> = {}): TestRound => ({
    examiners: [examiner],
    items: [...caseIds.map((caseId) => ({ caseId, kind: first })), { caseId: caseIds[0] ?? "", kind: mirrored }],
    ...changes,
  });
  const sheetOf = async (roundId: string, person = examiner) => {
    signInAs(person.id);
    const { status, body } = await callRoute(getSheet, { params: { roundId } });
    expect(status).toBe(200);
    return DeskSheetSchema.parse(body);
  };

  describe("GET /api/desk/rounds", () => {
    itIsGuarded({ db, handler: listRounds, roles: ["examiner", "trainee"], people: () => people });

    it("lists my own published rounds with where I stand in each", async () => {
      const reader = await makePerson(db(), lead.departmentId, ["examiner"]);
      const mine = (title: string, changes: Partial<TestRound> = {}) =>
        makeOpenRound(db(), lead, round({ examiners: [reader], title, ...changes }));
      await makeDraft(db(), lead, round({ examiners: [reader], title: "draft" }));
      await makeOpenRound(db(), lead, round({ title: "somebody else's" }));
      await mine("waiting", { opensAt: hence(1) });
      await mine("open");
      const submitted = await mine("submitted");
      await readWholeRound(db(), reader, submitted, () => leftExo(20));
      await submitRound(db(), reader, submitted);
      await advanceRound(db(), lead, await mine("closed"), "closed");
      const released = await mine("released");
      await closeAndCompute(db(), lead, released);
      await advanceRound(db(), lead, released, "released");
      const late = await mine("past its time"); // not closed by the worker yet
      await db()("rounds")
        .where({ id: late })
        .update({ closes_at: new Date(Date.now() - 1) });

      signInAs(reader.id);
      const { rounds } = DeskListSchema.parse((await callRoute(listRounds)).body);
      expect(rounds.map(({ title, state, itemCount, readCount }) => [title, state, itemCount, readCount])).toEqual([
        ["past its time", "closed", 4, 0],
        ["released", "released", 4, 0],
        ["closed", "closed", 4, 0],
        ["submitted", "submitted", 4, 4],
        ["open", "open", 4, 0],
        ["waiting", "waiting", 4, 0],
      ]);
    });
    it("shows a person of two departments the rounds of the one acted in", async () => {
      const both = await makePerson(db(), lead.departmentId, ["examiner"]);
      const otherId = people.other.lead.departmentId;
      await db()("memberships").insert({ person_id: both.id, department_id: otherId, roles: ["examiner"] });
      const roundId = await makeOpenRound(db(), lead, round({ examiners: [both] }));
      const listed = async (departmentId: string) => {
        signInAs(both.id, { view: writeView({ departmentId, role: "examiner" }) });
        return DeskListSchema.parse((await callRoute(listRounds)).body).rounds.map(({ id }) => id);
      };
      expect(await listed(lead.departmentId)).toEqual([roundId]);
      expect(await listed(otherId)).toEqual([]);
      expectProblem(await callRoute(getSheet, { params: { roundId } }), 404, "not-found");
    });
  });

  describe("GET /api/desk/rounds/[roundId]", () => {
    let roundId: string;
    beforeAll(async () => {
      roundId = await makeOpenRound(db(), lead, round({ examiners: [examiner, people.own.trainee] }));
    });
    itIsGuarded({
      db,
      handler: getSheet,
      roles: ["examiner", "trainee"],
      people: () => people,
      call: () => ({ params: { roundId } }),
      param: "roundId",
    });

    it("answers 404 to an examiner of the department who is not in the round, and to everybody for a draft", async () => {
      signInAs((await makePerson(db(), lead.departmentId, ["examiner"])).id);
      expectProblem(await callRoute(getSheet, { params: { roundId } }), 404, "not-found");
      const draft = await makeDraft(db(), lead, round());
      signInAs(examiner.id);
      expectProblem(await callRoute(getSheet, { params: { roundId: draft } }), 404, "not-found");
    });
    it("is blind: places, pictures and own readings, and not a word more", async () => {
      await readWholeRound(db(), people.own.trainee, roundId, () => leftExo(37));
      signInAs(examiner.id);
      const { body } = await callRoute(getSheet, { params: { roundId } });
      const sheet = DeskSheetSchema.strict().parse(body);
      expect(sheet.items.map((item) => Object.keys(item).sort())).toEqual(
        Array(4).fill(["height", "id", "pictureHref", "place", "reading", "width"]),
      );
      expect(sheet.items.map(({ place, reading }) => [place, reading])).toEqual(
        [1, 2, 3, 4].map((place) => [place, null]),
      );
      const items = await db()("items").where({ round_id: roundId });
      const codes = await db()("cases").whereIn("id", caseIds);
      const secrets = [
        ...items.flatMap(({ id, case_id, picture_key }) => [id, case_id, picture_key]),
        ...codes.map(({ code }) => `"${code}"`),
        ...[people.own.trainee.id, people.own.trainee.name, "mirrored", "repeat", "37"],
      ];
      const text = JSON.stringify(body).replaceAll(/T\d\d:\d\d:\d\d\.\d+Z/g, "");
      expect(secrets.filter((secret) => new RegExp(`(?<![0-9a-f])${secret}(?![0-9a-f])`).test(text))).toEqual([]);
    });
    it("gives each examiner showings of their own in an order that stays", async () => {
      const mine = await sheetOf(roundId);
      expect((await sheetOf(roundId)).items).toEqual(mine.items);
      const theirs = await sheetOf(roundId, people.own.trainee);
      expect(theirs.items.filter(({ id }) => mine.items.some((own) => own.id === id))).toEqual([]);
    });
    it("notes the first opening, and only that", async () => {
      const opened = await makeOpenRound(db(), lead, round());
      const noted = async () => (await db()("assignments").where({ round_id: opened }).first()).opened_at;
      expect(await noted()).toBeNull();
      await sheetOf(opened);
      const at = await noted();
      expect(at).toBeInstanceOf(Date);
      await sheetOf(opened);
      expect(await noted()).toEqual(at);
    });
    it("shows no item before the opening", async () => {
      const waiting = await makeOpenRound(db(), lead, round({ opensAt: hence(1) }));
      expect(await changingNothing(db(), () => sheetOf(waiting))).toMatchObject({
        state: "waiting",
        items: [],
        itemCount: 4,
      });
    });
    it("still shows my readings after the closing", async () => {
      const closed = await makeOpenRound(db(), lead, round());
      await readWholeRound(db(), examiner, closed, () => leftExo(25));
      await advanceRound(db(), lead, closed, "closed");
      const { state, items } = await sheetOf(closed);
      expect(state).toBe("closed");
      expect(items.map(({ reading }) => reading?.finding)).toEqual(Array(4).fill(leftExo(25)));
    });
  });

  describe("GET /api/desk/items/[itemId]/picture", () => {
    let roundId: string;
    let itemId: string;
    beforeAll(async () => {
      roundId = await makeOpenRound(db(), lead, round({ examiners: [examiner, people.own.trainee] }));
      [itemId = ""] = await showingIds(db(), examiner, roundId);
    });
    const get = (id: string, person = examiner) => {
      signInAs(person.id);
      return callRoute(getPicture, { params: { itemId: id } });
    };
    itIsGuarded({
      db,
      handler: getPicture,
      roles: ["examiner", "trainee"],
      people: () => people,
      call: () => ({ params: { itemId } }),
      param: "itemId",
    });

    it("gives a picture without metadata or anything by which two showings could be matched", async () => {
      const seen = new Set<string>();
      for (const { id, width, height } of (await sheetOf(roundId)).items) {
        const { status, body, headers } = await get(id);
        if (!(body instanceof Uint8Array)) throw new Error("no picture");
        expect(status).toBe(200);
        expect([...headers.keys()].sort()).toEqual([
          "cache-control",
          "content-disposition",
          "content-length",
          "content-type",
        ]);
        const metadata = await sharp(body).metadata();
        expect(metadata).toMatchObject({ format: "jpeg", width, height });
        expect([metadata.exif, metadata.icc, metadata.xmp, metadata.iptc]).toEqual(Array(4).fill(undefined));
        seen.add(Buffer.from(body).toString("base64"));
      }
      expect(seen.size).toBe(4);
    });
    it("answers 404 for somebody else's showing, and for the item that it shows", async () => {
      const [theirs = ""] = await showingIds(db(), people.own.trainee, roundId);
      expectProblem(await get(theirs), 404, "not-found");
      expectProblem(await get((await db()("items").where({ round_id: roundId }).first()).id), 404, "not-found");
    });
    it("answers 404 before the opening", async () => {
      const waiting = await makeOpenRound(db(), lead, round({ opensAt: hence(1) }));
      const [early = ""] = await showingIds(db(), examiner, waiting);
      expectProblem(await get(early), 404, "not-found");
    });
    it("answers 404 in a released round for a case that is in a round still sealed", async () => {
      const reader = await makePerson(db(), lead.departmentId, ["examiner"]);
      const items = (count: number) => caseIds.slice(0, count).map((caseId) => ({ caseId, kind: first }));
      const past = await makeOpenRound(db(), lead, round({ examiners: [reader], items: items(3) }));
      await closeAndCompute(db(), lead, past);
      await advanceRound(db(), lead, past, "released");
      const ids = await showingIds(db(), reader, past);
      const shown = await db()("assignment_items")
        .join("items", "items.id", "item_id")
        .select("assignment_items.id", "case_id");
      const statuses = async () => Promise.all(ids.map(async (id) => (await get(id, reader)).status));
      expect(await statuses()).toEqual([200, 200, 200]);

      const next = await makeOpenRound(db(), lead, round({ examiners: [reader], items: items(1) }));
      const sealed = ids.map((id) => shown.find((each) => each.id === id)?.case_id === caseIds[0]);
      expect(await statuses()).toEqual(sealed.map((isSealed) => (isSealed ? 404 : 200)));
      await closeAndCompute(db(), lead, next);
      expect(await statuses()).toEqual(sealed.map((isSealed) => (isSealed ? 404 : 200)));
      await advanceRound(db(), lead, next, "released");
      expect(await statuses()).toEqual([200, 200, 200]);
    });
  });

  describe("PUT /api/desk/rounds/[roundId]/submission", () => {
    let roundId: string;
    beforeAll(async () => {
      roundId = await makeOpenRound(db(), lead, round({ examiners: [examiner, people.own.trainee] }));
      await readWholeRound(db(), examiner, roundId, () => leftExo(20));
    });
    const put = (id: string, person = examiner) => {
      signInAs(person.id);
      return callRoute(handIn, { params: { roundId: id }, method: "PUT" });
    };
    const guarded = {
      db,
      handler: handIn,
      roles: ["examiner", "trainee"] as const,
      people: () => people,
      call: () => ({ params: { roundId }, method: "PUT" }),
      param: "roundId",
    };
    itIsGuarded(guarded);
    itRefusesOtherSites(guarded);

    it("answers 409 while cases are unread, and names their places", async () => {
      const half = await makeOpenRound(db(), lead, round());
      await readWholeRound(db(), examiner, half, (caseId, kind) =>
        caseId === caseIds[0] || kind === repeat ? null : leftExo(20),
      );
      const { items } = await sheetOf(half);
      const unread = items.filter(({ reading }) => reading === null).map(({ place }) => place);
      expect(unread).toHaveLength(2);
      const { detail } = expectProblem(await changingNothing(db(), () => put(half)), 409, "readings-missing");
      expect([...detail.matchAll(/\d+/g)].map(([place]) => Number(place))).toEqual(unread);
    });
    it("hands in once, however often and however fast it is asked", async () => {
      const answers = await Promise.all([put(roundId), put(roundId), put(roundId)]);
      expect(answers.map(({ status }) => status)).toEqual([200, 200, 200]);
      expect(answers[0]?.body).toMatchObject({ state: "submitted", submittedAt: expect.any(String) });
      const again = await changingNothing(db(), () => put(roundId));
      expect(again.body).toEqual(answers[0]?.body);
      const mine = db()("assignments").where({ round_id: roundId, person_id: examiner.id }).select("id");
      expect(await db()("audit_events").whereIn("target_id", mine)).toMatchObject([{ action: "round.submitted" }]);
    });
    it("answers 409 before the opening, after the closing time and after the closing", async () => {
      const early = await makeOpenRound(db(), lead, round({ opensAt: hence(1) }));
      expectProblem(await changingNothing(db(), () => put(early)), 409, "round-not-open");
      const late = await makeOpenRound(db(), lead, round());
      await readWholeRound(db(), examiner, late, () => leftExo(20));
      await db()("rounds")
        .where({ id: late })
        .update({ closes_at: new Date(Date.now() - 1) });
      expectProblem(await changingNothing(db(), () => put(late)), 409, "round-closed");
      await advanceRound(db(), lead, late, "closed");
      expectProblem(await changingNothing(db(), () => put(late)), 409, "round-closed");
    });
  });
});
