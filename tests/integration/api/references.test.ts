import { setTimeout as sleep } from "node:timers/promises";
import { beforeAll, describe, expect, it } from "vitest";
import { POST as revise } from "@/app/api/cases/[caseId]/references/route";
import { GET as getCase } from "@/app/api/cases/[caseId]/route";
import { GET as getResults } from "@/app/api/rounds/[roundId]/results/route";
import { reviseReference } from "@/lib/cases/change-case";
import { CaseDetailSchema } from "@/lib/cases/schema";
import { ALIGNED } from "@/lib/reflex/finding";
import { RoundResultsAnswerSchema } from "@/lib/results/schema";
import { advanceRound } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { listJobs, runDueJobs } from "../../support/jobs";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import {
  closeAndCompute,
  leftExo,
  makeCase,
  makeDraft,
  makeOpenRound,
  readWholeRound,
  rightEso,
} from "../../support/world";

describe("POST /api/cases/[caseId]/references", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  let caseId: string;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    caseId = await makeCase(db(), people.own.lead, leftExo(20));
  });
  const revision = (changes: Record<string, unknown> = {}) => ({
    finding: leftExo(30),
    basis: "cover-test",
    uncertaintyDegrees: 2.5,
    reason: "measured anew",
    ...changes,
  });
  const post = (body: unknown, id = caseId) => {
    signInAs(people.own.lead.id);
    return callRoute(revise, { method: "POST", params: { caseId: id }, body });
  };
  const guarded = {
    db,
    handler: revise,
    roles: ["lead"] as const,
    people: () => people,
    call: () => ({ method: "POST", params: { caseId }, body: revision() }),
    param: "caseId",
  };
  itIsGuarded(guarded);
  itRefusesOtherSites(guarded);

  it("puts a new revision in force and keeps the old one as it was", async () => {
    const id = await makeCase(db(), people.own.lead, leftExo(20));
    const [before] = await db()("case_references").where({ case_id: id });
    const { status, body, headers } = await post(revision(), id);
    expect(status).toBe(201);
    expect(headers.get("location")).toBe(`/api/cases/${id}`);
    const detail = CaseDetailSchema.parse(body);
    expect(detail.finding).toEqual(leftExo(30));
    expect(detail.references).toMatchObject([
      { revision: 2, finding: leftExo(30), basis: "cover-test", uncertaintyDegrees: 2.5, reason: "measured anew" },
      { revision: 1, finding: leftExo(20), basis: "panel", uncertaintyDegrees: null, reason: "" },
    ]);
    expect(await db()("case_references").where({ case_id: id, revision: 1 })).toEqual([before]);
    expect(await db()("audit_events").where({ target_id: id, action: "case.reference-revised" })).toMatchObject([
      { actor_id: people.own.lead.id, detail: { revision: 2, reason: "measured anew" } },
    ]);
  });

  it.each<[string, Record<string, unknown>, string[]]>([
    ["no reason", { reason: undefined }, ["#/reason"]],
    ["a reason of two letters", { reason: " no " }, ["#/reason"]],
    ["a reason that cannot be stored", { reason: "a\u0000b, remeasured" }, ["#/reason"]],
    ["a finding that breaks a rule", { finding: { ...leftExo(20), eye: "none" } }, ["#/finding/eye"]],
    ["no finding", { finding: undefined }, ["#/finding"]],
    ["an unknown basis", { basis: "memory" }, ["#/basis"]],
    ["an uncertainty over 45°", { uncertaintyDegrees: 46 }, ["#/uncertaintyDegrees"]],
    ["a field that does not exist", { revision: 7 }, ["#"]],
  ])("answers 422 to %s and changes nothing", async (_, changes, pointers) => {
    expectFieldErrors(await changingNothing(db(), () => post(revision(changes))), pointers);
  });
  it("answers 400 to what is not JSON", async () => {
    expectProblem(await changingNothing(db(), () => post("finding=exo")), 400, "not-json");
  });

  it("gives each of several revisions at once a number of its own and loses none", async () => {
    const id = await makeCase(db(), people.own.lead, ALIGNED);
    const answers = await Promise.all([10, 20, 30].map((degrees) => post(revision({ finding: leftExo(degrees) }), id)));
    expect(answers.map(({ status }) => status)).toEqual([201, 201, 201]);
    const detail = CaseDetailSchema.parse((await callRoute(getCase, { params: { caseId: id } })).body);
    expect(detail.references.map((reference) => reference.revision)).toEqual([4, 3, 2, 1]);
    const sizes = await db()("case_references").where({ case_id: id }).whereNot({ revision: 1 });
    expect(sizes.map(({ horizontal_degrees }) => horizontal_degrees).sort()).toEqual([10, 20, 30]);
  });

  describe("and the results that rest on it", () => {
    const resultsOf = async (roundId: string) => {
      signInAs(people.own.lead.id);
      const { body } = await callRoute(getResults, { params: { roundId } });
      return RoundResultsAnswerSchema.parse(body).results;
    };
    const makeRound = async (id: string, kind: "first" | "mirrored" = "first") => {
      const items = [{ caseId: id, kind: "first" as const }, ...(kind === "mirrored" ? [{ caseId: id, kind }] : [])];
      const roundId = await makeOpenRound(db(), people.own.lead, { examiners: [people.own.examiner], items });
      await readWholeRound(db(), people.own.examiner, roundId, () => leftExo(30));
      return roundId;
    };

    it("are computed anew for closed rounds, with the old revision kept as it was", async () => {
      const id = await makeCase(db(), people.own.lead, rightEso(30));
      const roundId = await makeRound(id, "mirrored");
      await closeAndCompute(db(), people.own.lead, roundId);
      const stored = () =>
        db()("results")
          .where({ round_id: roundId, revision: 1 })
          .join("examiner_results as own", "own.result_id", "id");
      const before = await stored();
      expect(before).toHaveLength(1);

      await post(revision({ finding: leftExo(30), reason: "eyes were swapped" }), id);
      await runDueJobs();
      expect(await stored()).toEqual(before);
      const results = await resultsOf(roundId);
      expect(results).toMatchObject({ revision: 2, reason: expect.stringContaining("eyes were swapped") });
      expect(results?.cases.map(({ kind, reference, agreedCount }) => [kind, reference, agreedCount])).toEqual([
        ["first", leftExo(30), 1],
        ["mirrored", { ...leftExo(30), eye: "right" }, 0],
      ]);
      const used = await db()("result_references")
        .join("results", "results.id", "result_id")
        .join("case_references", "case_references.id", "reference_id")
        .where("results.round_id", roundId)
        .orderBy("results.revision")
        .select("results.revision as result", "case_references.revision as reference");
      expect(used.map(({ result, reference }) => [result, reference])).toEqual([
        [1, 1],
        [1, 1],
        [2, 2],
        [2, 2],
      ]);
    });

    it("are not computed for rounds that are open or a draft, whose results will use what is in force then", async () => {
      const id = await makeCase(db(), people.own.lead, rightEso(30));
      const roundId = await makeRound(id);
      await makeDraft(db(), people.own.lead, { examiners: [], items: [{ caseId: id, kind: "first" }] });
      await post(revision({ finding: leftExo(30) }), id);
      await runDueJobs();
      expect(
        await db()("results").whereIn("round_id", db()("items").where({ case_id: id }).select("round_id")),
      ).toEqual([]);
      await closeAndCompute(db(), people.own.lead, roundId);
      expect(await resultsOf(roundId)).toMatchObject({
        revision: 1,
        cases: [{ reference: leftExo(30), agreedCount: 1 }],
      });
    });

    it("do not miss a reference that is revised while the round closes", async () => {
      const id = await makeCase(db(), people.own.lead, rightEso(30));
      const roundId = await makeRound(id);
      const revising = await db().transaction();
      const change = { finding: leftExo(30), basis: "panel" as const, uncertaintyDegrees: null, reason: "swapped" };
      await reviseReference(revising, people.own.lead, id, change);
      const closing = advanceRound(db(), people.own.lead, roundId, "closed"); // may have to wait for the commit
      await Promise.race([closing, sleep(1000)]);
      await runDueJobs(); // cannot see the new reference yet
      await revising.commit();
      await closing;
      await runDueJobs();
      expect(await resultsOf(roundId)).toMatchObject({ cases: [{ reference: leftExo(30), agreedCount: 1 }] });
      expect(await listJobs(db())).not.toContainEqual(expect.objectContaining({ task: "compute-results" }));
    });
  });
});
