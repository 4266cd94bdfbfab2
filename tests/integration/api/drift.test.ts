import { beforeAll, describe, expect, it } from "vitest";
import { GET as getBoard } from "@/app/api/drift/route";
import { DriftBoardSchema } from "@/lib/drift/schema";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { itIsGuarded } from "../../support/guarded-route";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type Staff, type TwoDepartments } from "../../support/staff";
import {
  closeAndCompute,
  leftExo,
  makeCase,
  makeOpenRound,
  readWholeRound,
  rightEso,
  type TestPerson,
} from "../../support/world";

describe("GET /api/drift", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  const findings: Finding[] = [leftExo(20), leftExo(30), rightEso(15), rightEso(40), ALIGNED];
  const readings = new Map<string, Finding>();
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
  });

  /** A round on new cases, which every examiner reads with exo two degrees too small. */
  const play = async (staff: Staff, title: string, examiners: TestPerson[], end: "open" | "closed" | "released") => {
    const items: { caseId: string; kind: "first" }[] = [];
    for (const finding of findings) {
      const caseId = await makeCase(db(), staff.lead, finding);
      items.push({ caseId, kind: "first" });
      const isExo = finding.readable && finding.horizontal === "exo" && typeof finding.horizontalDegrees === "number";
      readings.set(caseId, isExo ? { ...finding, horizontalDegrees: Number(finding.horizontalDegrees) - 2 } : finding);
    }
    const roundId = await makeOpenRound(db(), staff.lead, { title, examiners, items });
    for (const each of examiners) {
      await readWholeRound(db(), each, roundId, (caseId) => readings.get(caseId) ?? null);
    }
    if (end === "open") return roundId;
    await closeAndCompute(db(), staff.lead, roundId);
    if (end === "released") await advanceRound(db(), staff.lead, roundId, "released");
    return roundId;
  };
  const board = async (person: TestPerson) => {
    signInAs(person.id);
    const { status, body } = await callRoute(getBoard);
    expect(status).toBe(200);
    return DriftBoardSchema.parse(body);
  };

  itIsGuarded({ db, handler: getBoard, roles: ["lead", "reviewer"], people: () => people });

  it("is empty, and no failure, before the first release", async () => {
    const { rounds, examiners, panel } = await board(people.own.reviewer);
    expect({ rounds, examiners, points: panel.kappa.points }).toEqual({ rounds: [], examiners: [], points: [] });
  });
  it("shows every examiner and the panel over the department's released rounds, oldest first", async () => {
    const { examiner, trainee } = people.own;
    const first = await play(people.own, "first", [examiner], "released");
    const second = await play(people.own, "second", [examiner, trainee], "released");
    await play(people.own, "closed", [examiner], "closed");
    await play(people.own, "open", [examiner], "open");
    await play(people.other, "foreign", [people.other.examiner], "released");

    const { rounds, examiners, panel } = await board(people.own.reviewer);
    expect(rounds.map(({ id, title }) => [id, title])).toEqual([
      [first, "first"],
      [second, "second"],
    ]);
    expect(examiners.map(({ personId }) => personId).sort()).toEqual([examiner.id, trainee.id].sort());
    // Exo is negative and two of five cases are 2° nearer to zero: a bias of +0.8.
    const row = examiners.find(({ personId }) => personId === examiner.id);
    expect(row?.horizontal.points).toMatchObject([
      { roundId: first, n: 5, value: { estimate: expect.closeTo(0.8, 10) } },
      { roundId: second, n: 5, value: { estimate: expect.closeTo(0.8, 10) } },
    ]);
    const late = examiners.find(({ personId }) => personId === trainee.id);
    expect(late?.kappa.points).toMatchObject([
      { roundId: first, n: 0, state: "none", reason: "did not take part" },
      { roundId: second, n: 5, value: { estimate: 1 } },
    ]);
    for (const chart of [panel.kappa, panel.horizontal, panel.vertical]) {
      expect(chart.points.map(({ roundId, n }) => [roundId, n])).toEqual([
        [first, 5],
        [second, 10],
      ]);
    }
    expect(await board(people.own.lead)).toEqual(await board(people.own.reviewer));
  });
});
