import { beforeAll, describe, expect, it } from "vitest";
import { GET as getScorecard } from "@/app/api/scorecards/[roundId]/route";
import { reviseReference } from "@/lib/cases/change-case";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { ScorecardSchema } from "@/lib/results/schema";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { showingIds } from "../../support/desk";
import { itIsGuarded } from "../../support/guarded-route";
import { runDueJobs } from "../../support/jobs";
import { expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  closeAndCompute,
  deviation,
  leftExo,
  makeCase,
  makeOpenRound,
  makePerson,
  readWholeRound,
  rightEso,
  type TestPerson,
} from "../../support/world";

describe("GET /api/scorecards/[roundId]", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  let trainee: TestPerson;
  let colleague: TestPerson;
  let roundId: string;
  let caseIds: string[];
  const references: Finding[] = [leftExo(20), rightEso(30), ALIGNED];
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    ({ trainee, examiner: colleague } = people.own);
    caseIds = [];
    for (const [index, reference] of references.entries()) {
      caseIds.push(
        await makeCase(db(), people.own.lead, reference, { code: `ZEBRA-${index}`, name: "kingfisher.jpg" }),
      );
    }
    const [twice = ""] = caseIds;
    const firsts = caseIds.map((caseId) => ({ caseId, kind: "first" as const }));
    roundId = await makeOpenRound(db(), people.own.lead, {
      examiners: [trainee, colleague],
      items: [...firsts, { caseId: twice, kind: "mirrored" }],
    });
    // The trainee leaves the last case unread; 23 degrees are the colleague's alone.
    await readWholeRound(db(), trainee, roundId, (caseId) => (caseId === caseIds[2] ? null : leftExo(20)));
    await readWholeRound(db(), colleague, roundId, () => deviation("right", "exo", 23));
  });
  const get = (person: TestPerson, id = roundId) => {
    signInAs(person.id);
    return callRoute(getScorecard, { params: { roundId: id } });
  };
  const scorecardOf = async (person: TestPerson, id = roundId) => ScorecardSchema.parse((await get(person, id)).body);

  it("answers 404 until the release, closed and computed or not", async () => {
    expectProblem(await get(trainee), 404, "not-found");
    await closeAndCompute(db(), people.own.lead, roundId);
    expectProblem(await get(trainee), 404, "not-found");
    await advanceRound(db(), people.own.lead, roundId, "released");
    expect((await get(trainee)).status).toBe(200);
  });
  itIsGuarded({
    db,
    handler: getScorecard,
    roles: ["examiner", "trainee"],
    people: () => people,
    call: () => ({ params: { roundId } }),
    param: "roundId",
  });

  it("gives each showing with my reading, the reference as shown and what differed", async () => {
    const { cases, figures } = await scorecardOf(trainee);
    expect(cases.map(({ place }) => place)).toEqual([1, 2, 3, 4]);
    const shown = cases.map(({ reading, reference, error, isMirrored }) => ({ reading, reference, error, isMirrored }));
    expect(shown).toEqual(
      expect.arrayContaining([
        { reading: leftExo(20), reference: leftExo(20), error: null, isMirrored: false },
        { reading: leftExo(20), reference: mirrorFinding(leftExo(20)), error: "other eye", isMirrored: true },
        { reading: leftExo(20), reference: rightEso(30), error: "horizontal direction reversed", isMirrored: false },
        { reading: null, reference: ALIGNED, error: null, isMirrored: false },
      ]),
    );
    const mirrored = cases.find(({ isMirrored }) => isMirrored);
    const twin = cases.find(({ place }) => place === mirrored?.repeatOfPlace);
    expect(twin?.reference).toEqual(leftExo(20));
    expect(figures).toMatchObject({ caseCount: 3, readCount: 2 });
  });
  it("names nobody else, no case and no stored object", async () => {
    const { body } = await get(trainee);
    const items = await db()("items").where({ round_id: roundId });
    const secrets = [
      ...[colleague, people.own.lead].flatMap(({ id, name, email }) => [id, name, email]),
      ...(await showingIds(db(), colleague, roundId)),
      ...items.flatMap(({ case_id, picture_key }) => [case_id, picture_key]),
      ...["ZEBRA", "kingfisher", "23"],
    ];
    const text = JSON.stringify(body).replaceAll(/T\d\d:\d\d:\d\d\.\d+Z/g, "");
    expect(secrets.filter((secret) => new RegExp(`(?<![0-9a-f.])${secret}(?![0-9a-f])`).test(text))).toEqual([]);
  });
  it("answers 404 to somebody of the department who was not in the round", async () => {
    expectProblem(await get(await makePerson(db(), trainee.departmentId, ["trainee"])), 404, "not-found");
  });
  it("does not change by what else the address says: whose it is comes from the session alone", async () => {
    signInAs(trainee.id);
    const query = { personId: colleague.id, examiner: colleague.id };
    expect((await callRoute(getScorecard, { params: { roundId, personId: colleague.id }, query })).body).toEqual(
      (await get(trainee)).body,
    );
  });
  it("uses the newest results after a reference has changed", async () => {
    const change = { finding: ALIGNED, basis: "panel" as const, uncertaintyDegrees: null, reason: "looked again" };
    await reviseReference(db(), people.own.lead, caseIds[1] ?? "", change);
    await runDueJobs();
    const { cases } = await scorecardOf(trainee);
    const errors = cases.flatMap(({ error }) => error ?? []);
    expect(errors.sort()).toEqual(["other eye", "squint called on an aligned pair"]);
  });

  it("seals a case again while it is in a round of mine that is not released", async () => {
    const [sealedCase = ""] = caseIds;
    const later = await makeOpenRound(db(), people.own.lead, {
      examiners: [trainee],
      items: [{ caseId: sealedCase, kind: "first" }],
    });
    const before = await scorecardOf(colleague);
    expect(before.cases.map(({ isSealed }) => isSealed)).toEqual([false, false, false, false]); // not in the later round

    const itemIds = await db()("items").where({ round_id: roundId, case_id: sealedCase }).pluck("id");
    const expectSealed = async () => {
      const { cases, figures } = await scorecardOf(trainee);
      const sealed = cases.filter(({ isSealed }) => isSealed);
      expect(sealed).toHaveLength(2); // the case and its mirrored twin
      for (const each of sealed) {
        const hidden = { pictureHref: null, reading: null, reference: null, error: null, repeatOfPlace: null };
        expect(each).toMatchObject({ ...hidden, isMirrored: false });
      }
      expect(figures.items.filter(({ itemId }) => itemIds.includes(itemId))).toEqual([]);
      expect(figures.items).toHaveLength(2);
    };
    await expectSealed();
    await readWholeRound(db(), trainee, later, () => leftExo(10));
    await closeAndCompute(db(), people.own.lead, later);
    await expectSealed();
    await advanceRound(db(), people.own.lead, later, "released");
    const { cases, earlier } = await scorecardOf(trainee, later);
    expect(cases).toMatchObject([{ isSealed: false, reference: leftExo(20) }]);
    expect((await scorecardOf(trainee)).cases.map(({ isSealed }) => isSealed)).toEqual([false, false, false, false]);
    expect(earlier).toEqual([{ number: 1, kappa: 0 }]); // of two cases one read right, as chance would have it
  });
});
