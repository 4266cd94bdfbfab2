import { beforeAll, describe, expect, it } from "vitest";
import { GET as getResults } from "@/app/api/rounds/[roundId]/results/route";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { RoundResultsAnswerSchema } from "@/lib/results/schema";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { itIsGuarded } from "../../support/guarded-route";
import { runDueJobs } from "../../support/jobs";
import { expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  leftExo,
  makeCase,
  makeDraft,
  makeOpenRound,
  readWholeRound,
  rightEso,
  submitWholeRound,
} from "../../support/world";

describe("GET /api/rounds/[roundId]/results", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  let roundId: string;
  let items: { caseId: string; kind: "first" | "mirrored" }[];
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    const { lead, examiner, trainee } = people.own;
    items = [];
    for (const [code, finding] of [
      ["R-1", leftExo(20)],
      ["R-2", leftExo(30)],
      ["R-3", rightEso(15)],
    ] as const) {
      items.push({ caseId: await makeCase(db(), lead, finding, { code }), kind: "first" });
    }
    items.push({ caseId: items[0]?.caseId ?? "", kind: "mirrored" });
    roundId = await makeOpenRound(db(), lead, { examiners: [examiner, trainee], items });
    // The examiner reads two of three as they are and the mirrored one as if it were not; the trainee reads one case.
    await readWholeRound(db(), examiner, roundId, (caseId) =>
      caseId === items[2]?.caseId ? rightEso(20) : leftExo(20),
    );
    await submitWholeRound(db(), examiner, roundId);
    await readWholeRound(db(), trainee, roundId, (caseId) => (caseId === items[2]?.caseId ? leftExo(15) : null));
  });
  const get = (role: "lead" | "reviewer" = "lead", id = roundId) => {
    signInAs(people.own[role].id);
    return callRoute(getResults, { params: { roundId: id } });
  };

  it("answers 409 to the lead and 404 to a reviewer while the round is sealed", async () => {
    expectProblem(await get("lead"), 409, "round-sealed");
    expectProblem(await get("reviewer"), 404, "not-found");
    const draft = await makeDraft(db(), people.own.lead, { examiners: [], items: [] });
    expectProblem(await get("lead", draft), 409, "round-sealed");
  });

  describe("after the closing", () => {
    beforeAll(async () => {
      await advanceRound(db(), people.own.lead, roundId, "closed");
    });
    itIsGuarded({
      db,
      handler: getResults,
      roles: ["lead", "reviewer"],
      people: () => people,
      call: () => ({ params: { roundId } }),
      param: "roundId",
    });

    it("gives none until they are computed, then every examiner's and every item's", async () => {
      expect((await get()).body).toEqual({ results: null });
      await runDueJobs();
      const { results } = RoundResultsAnswerSchema.parse((await get()).body);
      expect(results).toMatchObject({
        round: { id: roundId, state: "closed", convention: expect.any(String) },
        revision: 1,
        reason: "closed",
        panel: { examinerCount: 2, readCount: 4 },
      });
      const [reference] = [leftExo(20)];
      const item = (code: string, kind: string) =>
        results?.cases.find((each) => each.code === code && each.kind === kind);
      expect(item("R-1", "first")).toMatchObject({ reference, readCount: 1, agreedCount: 1 });
      expect(item("R-1", "mirrored")).toMatchObject({
        reference: mirrorFinding(reference),
        readCount: 1,
        agreedCount: 0,
      });
      expect(item("R-3", "first")).toMatchObject({ readCount: 2, agreedCount: 1 });
      const figures = (id: string) => results?.examiners.find(({ personId }) => personId === id)?.figures;
      // Differences of the examiner: 0, +10 (exo 20 for exo 30) and +5 (eso 20 for eso 15), so a bias of 5.
      expect(figures(people.own.examiner.id)).toMatchObject({
        caseCount: 3,
        readCount: 3,
        repeatCount: 1,
        horizontal: { limits: { ok: true, n: 3, bias: { estimate: 5 } } },
        errorCounts: { "size outside tolerance": 1 },
      });
      expect(figures(people.own.trainee.id)).toMatchObject({
        readCount: 1,
        horizontal: { limits: { ok: false, n: 1, reason: "fewer than three pairs" }, leftOut: { unread: 2 } },
        errorCounts: { "horizontal direction reversed": 1 },
      });
      const submitted = results?.examiners.filter(({ submittedAt }) => submittedAt !== null);
      expect(submitted?.map(({ personId }) => personId)).toEqual([people.own.examiner.id]);
    });
    it("answers 404 to a reviewer until the release", async () => {
      expectProblem(await get("reviewer"), 404, "not-found");
      await advanceRound(db(), people.own.lead, roundId, "released");
      expect((await get("reviewer")).body).toEqual((await get("lead")).body);
      expect((await get("reviewer")).status).toBe(200);
    });
  });
});
