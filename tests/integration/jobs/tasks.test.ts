import { afterEach, beforeAll, describe, expect, it, vi } from "vitest";
import { enqueue } from "@/lib/jobs/enqueue";
import { advanceRound } from "@/lib/rounds/advance-round";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { listJobs, runDueJobs } from "../../support/jobs";
import {
  leftExo,
  makeCase,
  makeDepartment,
  makeDraft,
  makeOpenRound,
  makePerson,
  readWholeRound,
  type TestPerson,
} from "../../support/world";

const HOUR_MS = 3_600_000;

describe("background work", () => {
  const db = useDatabase();
  let lead: TestPerson;
  let examiner: TestPerson;
  let caseIds: string[];
  beforeAll(async () => {
    const departmentId = await makeDepartment(db());
    lead = await makePerson(db(), departmentId, ["lead"]);
    examiner = await makePerson(db(), departmentId, ["examiner"]);
    caseIds = [];
    for (const degrees of [15, 20, 30]) caseIds.push(await makeCase(db(), lead, leftExo(degrees)));
  });
  afterEach(async () => {
    vi.useRealTimers();
    await db()("graphile_worker._private_jobs").delete();
  });

  /** A round that was published two hours ago and closes at a time that may have passed. */
  const makeRound = async (closesAt: Date) => {
    const opensAt = new Date(closesAt.getTime() - HOUR_MS);
    const items = caseIds.map((caseId) => ({ caseId, kind: "first" as const }));
    const roundId = await makeDraft(db(), lead, { examiners: [examiner], items, opensAt, closesAt });
    await advanceRound(db(), lead, roundId, "open", { now: new Date(opensAt.getTime() - HOUR_MS) });
    return roundId;
  };
  const ago = (ms: number) => new Date(Date.now() - ms);
  const stateOf = async (roundId: string) => (await db()("rounds").where({ id: roundId }).first("state")).state;
  const resultsOf = (roundId: string) => db()("results").where({ round_id: roundId });
  const queue = (task: "close-round" | "compute-results", roundId: string) =>
    db().transaction((trx) => enqueue(trx, task, { roundId, reason: "again" }, { key: `${task}:${roundId}` }));

  it("closes a round that is due, by itself, and computes its results", async () => {
    const roundId = await makeRound(ago(1000));
    await runDueJobs();
    expect(await stateOf(roundId)).toBe("closed");
    expect(await resultsOf(roundId)).toMatchObject([{ revision: 1, reason: "closed" }]);
    const entries = await db()("audit_events").where({ target_id: roundId, action: "round.closed" });
    expect(entries).toMatchObject([{ actor_id: null, department_id: lead.departmentId }]);
    expect(await listJobs(db())).toEqual([]);
  });
  it("closes it although this machine's clock is behind the database's", async () => {
    const closesAt = ago(1000);
    const roundId = await makeRound(closesAt);
    vi.useFakeTimers({ toFake: ["Date"], now: closesAt.getTime() - 5000 });
    await runDueJobs();
    vi.useRealTimers();
    expect(await stateOf(roundId)).toBe("closed");
  });
  it("leaves a round that is not due open, with its closing still queued", async () => {
    const closesAt = new Date(Date.now() + HOUR_MS);
    const roundId = await makeRound(closesAt);
    await changingNothing(db(), runDueJobs);
    expect(await listJobs(db())).toMatchObject([{ task: "close-round", key: `close:${roundId}`, runAt: closesAt }]);
  });
  it("does nothing for an open round or a draft, whatever job is run for it", async () => {
    const items = caseIds.map((caseId) => ({ caseId, kind: "first" as const }));
    const open = await makeOpenRound(db(), lead, { examiners: [examiner], items });
    await readWholeRound(db(), examiner, open, () => leftExo(20));
    const draft = await makeDraft(db(), lead, { examiners: [examiner], items });
    await db()("graphile_worker._private_jobs").delete();
    await changingNothing(db(), async () => {
      for (const roundId of [open, draft, crypto.randomUUID()]) {
        await queue("close-round", roundId);
        await queue("compute-results", roundId);
      }
      await runDueJobs();
    });
  });
  it("computes results once, however often and however many at once run the job", async () => {
    const roundId = await makeRound(ago(1000));
    await runDueJobs();
    const [before] = await resultsOf(roundId);
    for (let time = 0; time < 3; time++) {
      await queue("compute-results", roundId);
      await queue("close-round", roundId);
      await runDueJobs();
    }
    expect(await resultsOf(roundId)).toEqual([before]);
    const other = await makeRound(ago(1000));
    await Promise.all([runDueJobs(), runDueJobs(), runDueJobs()]);
    expect(await resultsOf(other)).toHaveLength(1);
    expect(await db()("audit_events").where({ target_id: other, action: "round.closed" })).toHaveLength(1);
  });
  it("leaves a round alone that the lead has closed before its time", async () => {
    const roundId = await makeRound(new Date(Date.now() + HOUR_MS));
    await advanceRound(db(), lead, roundId, "closed");
    await db()("graphile_worker._private_jobs").update({ run_at: new Date() });
    await runDueJobs();
    expect(await db()("audit_events").where({ target_id: roundId, action: "round.closed" })).toMatchObject([
      { actor_id: lead.id },
    ]);
  });
  it("keeps a job that failed, to be tried again", async () => {
    const roundId = await makeRound(ago(1000));
    await db().raw(`
      CREATE FUNCTION refuse_result() RETURNS trigger LANGUAGE plpgsql AS $$ BEGIN RAISE EXCEPTION 'full'; END $$;
      CREATE TRIGGER refuse_result BEFORE INSERT ON results FOR EACH STATEMENT EXECUTE FUNCTION refuse_result()`);
    try {
      await runDueJobs();
    } finally {
      await db().raw("DROP FUNCTION refuse_result CASCADE");
    }
    expect(await stateOf(roundId)).toBe("closed"); // the closing stands by itself
    expect(await resultsOf(roundId)).toEqual([]);
    expect(await listJobs(db())).toMatchObject([
      { task: "compute-results", attempts: 1, lastError: expect.any(String) },
    ]);
    await db()("graphile_worker._private_jobs").update({ run_at: new Date() });
    await runDueJobs();
    expect(await resultsOf(roundId)).toHaveLength(1);
  });
  it("takes the job back with the change that queued it", async () => {
    const roundId = await makeRound(new Date(Date.now() + HOUR_MS));
    await changingNothing(db(), async () => {
      const trx = await db().transaction();
      await advanceRound(trx, lead, roundId, "closed");
      await trx.rollback();
    });
  });
});
