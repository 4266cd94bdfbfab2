import { beforeAll, describe, expect, it } from "vitest";
import { loadDriftBoard } from "@/lib/drift/load-drift-board";
import { ALIGNED } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { loadRoundResults } from "@/lib/results/load-round-results";
import { loadScorecard } from "@/lib/results/load-scorecard";
import { advanceRound } from "@/lib/rounds/advance-round";
import { useDatabase } from "../../support/database";
import {
  closeAndCompute,
  leftExo,
  makeCase,
  makeDepartment,
  makeOpenRound,
  makePerson,
  readWholeRound,
  rightEso,
  submitWholeRound,
  type TestPerson,
} from "../../support/world";

describe("the life of a round", () => {
  const db = useDatabase();
  let lead: TestPerson;
  let perfect: TestPerson;
  let reversing: TestPerson;
  let roundId: string;
  const cases = new Map<string, ReturnType<typeof leftExo>>();

  beforeAll(async () => {
    const departmentId = await makeDepartment(db());
    lead = await makePerson(db(), departmentId, ["lead"]);
    perfect = await makePerson(db(), departmentId, ["examiner"]);
    reversing = await makePerson(db(), departmentId, ["trainee"]);
    for (const finding of [leftExo(30), leftExo(15), rightEso(15), rightEso(40), ALIGNED, ALIGNED]) {
      cases.set(await makeCase(db(), lead, finding), finding);
    }
    const [first = ""] = cases.keys();
    const items = [...cases.keys()].map((caseId) => ({ caseId, kind: "first" as const }));
    roundId = await makeOpenRound(db(), lead, {
      examiners: [perfect, reversing],
      items: [...items, { caseId: first, kind: "repeat" }, { caseId: first, kind: "mirrored" }],
    });
    const truth = (caseId: string, kind: string) => {
      const finding = cases.get(caseId) ?? ALIGNED;
      return kind === "mirrored" ? mirrorFinding(finding) : finding;
    };
    await readWholeRound(db(), perfect, roundId, truth);
    await submitWholeRound(db(), perfect, roundId);
    await readWholeRound(db(), reversing, roundId, (caseId, kind) => {
      const finding = truth(caseId, kind);
      if (!finding.readable || finding.horizontal === "none") return finding;
      return { ...finding, horizontal: finding.horizontal === "eso" ? "exo" : "eso" };
    });
  });

  it("gives every item a picture of its own, and no two equal sizes or keys for a repeat and its twin", async () => {
    const items = await db()("items").where({ round_id: roundId });
    expect(new Set(items.map(({ picture_key }) => picture_key)).size).toBe(8);
  });

  it("shows nobody any results before it closes", async () => {
    await expect(loadRoundResults(db(), lead, roundId)).rejects.toMatchObject({ code: "round-sealed" });
  });

  it("computes, releases and shows each person their own", async () => {
    await closeAndCompute(db(), lead, roundId);
    await expect(loadScorecard(db(), perfect, roundId)).rejects.toMatchObject({ code: "not-found" });
    const results = await loadRoundResults(db(), lead, roundId);
    const figures = (id: string) => results?.examiners.find(({ personId }) => personId === id)?.figures;
    expect(figures(perfect.id)?.kappa).toMatchObject({ ok: true, n: 6, kappa: { estimate: 1 } });
    expect(figures(reversing.id)?.errorCounts).toEqual({ "horizontal direction reversed": 4 });
    expect(figures(perfect.id)?.horizontal.limits).toMatchObject({ ok: true, n: 6, bias: { estimate: 0 } });

    await advanceRound(db(), lead, roundId, "released");
    const scorecard = await loadScorecard(db(), reversing, roundId);
    expect(scorecard.cases).toHaveLength(8);
    expect(scorecard.cases.filter(({ repeatOfPlace }) => repeatOfPlace !== null)).toHaveLength(2);
    const board = await loadDriftBoard(db(), lead.departmentId);
    expect(board.examiners).toHaveLength(2);
    expect(board.panel.kappa.points).toHaveLength(1);
  });
});
