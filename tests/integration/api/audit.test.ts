import { beforeAll, describe, expect, it } from "vitest";
import { GET as listEvents } from "@/app/api/audit/route";
import { AUDIT_ACTION_WORDS } from "@/lib/audit/action-words";
import { AuditListSchema } from "@/lib/audit/schema";
import { changeCase, reviseReference } from "@/lib/cases/change-case";
import { closeWhenDue } from "@/lib/rounds/advance-round";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { itIsGuarded } from "../../support/guarded-route";
import { expectFieldErrors } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import { leftExo, makeCase, makeOpenRound, readWholeRound, submitWholeRound } from "../../support/world";

describe("the audit trail", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    const { lead, examiner } = people.own;
    const caseId = await makeCase(db(), lead, leftExo(37), { code: "A-1" });
    await changeCase(db(), lead, caseId, { isAnchor: true });
    const roundId = await makeOpenRound(db(), lead, { examiners: [examiner], items: [{ caseId, kind: "first" }] });
    await readWholeRound(db(), examiner, roundId, () => leftExo(37));
    await submitWholeRound(db(), examiner, roundId);
    await db()("rounds")
      .where({ id: roundId })
      .update({ closes_at: new Date(Date.now() - 1) });
    await closeWhenDue(db(), roundId);
    const change = { finding: leftExo(37), basis: "panel" as const, uncertaintyDegrees: null, reason: "checked" };
    await reviseReference(db(), lead, caseId, change);
    await makeCase(db(), people.other.lead, leftExo(20), { code: "FOREIGN" });
  });
  const list = async (query: Record<string, string> = {}) => {
    signInAs(people.own.admin.id);
    const { body } = await callRoute(listEvents, { query });
    return AuditListSchema.parse(body).events;
  };

  describe("GET /api/audit", () => {
    itIsGuarded({ db, handler: listEvents, roles: ["admin"], people: () => people });

    it("tells what happened in the department, newest first, by whom and to what", async () => {
      const { lead, examiner } = people.own;
      expect((await list()).map(({ action, actor, target }) => [action, actor, target])).toEqual([
        ["case.reference-revised", lead.name, "Case A-1"],
        ["round.closed", null, "Round 1"],
        ["round.submitted", examiner.name, "Round 1"],
        ["round.open", lead.name, "Round 1"],
        ["round.drafted", lead.name, "Round 1"],
        ["case.changed", lead.name, "Case A-1"],
        ["case.created", lead.name, "Case A-1"],
      ]);
    });
    it("has words for every action, and no finding in any entry", async () => {
      for (const { action } of await list()) expect(Object.keys(AUDIT_ACTION_WORDS)).toContain(action);
      const rows = await db()("audit_events").select("detail");
      expect(JSON.stringify(rows)).not.toMatch(/37|exo|finding/);
    });
    it("gives a hundred at a time, and those before a given one", async () => {
      const at = new Date();
      const departmentId = people.own.admin.departmentId;
      const entry = { department_id: departmentId, action: "case.changed", target_type: "case", at };
      await db()("audit_events").insert(Array.from({ length: 100 }, () => entry));
      const newest = await list();
      expect(newest).toHaveLength(100);
      const rest = await list({ before: newest.at(-1)?.id ?? "" });
      expect(rest).toHaveLength(7);
      const ids = [...newest, ...rest].map(({ id }) => Number(id));
      expect(ids).toEqual(ids.toSorted((a, b) => b - a));
      expect(await list({ before: "1" })).toEqual([]);
    });
    it("answers 422 to a place in the trail that is none, and to other filters", async () => {
      signInAs(people.own.admin.id);
      for (const before of ["abc", "-1", "1; DROP TABLE audit_events", "9".repeat(19)]) {
        expectFieldErrors(await callRoute(listEvents, { query: { before } }), ["#/before"]);
      }
      expect(await list({ before: "9".repeat(18) })).toHaveLength(100);
      signInAs(people.own.admin.id);
      expectFieldErrors(await callRoute(listEvents, { query: { after: "1" } }), ["#"]);
    });
  });

  describe("in the database", () => {
    it.each([
      "UPDATE audit_events SET action = 'nothing happened'",
      "UPDATE audit_events SET at = at WHERE FALSE",
      "DELETE FROM audit_events",
      "TRUNCATE audit_events",
      "TRUNCATE departments CASCADE",
      "INSERT INTO audit_events (id, action, target_type, at) VALUES (1, 'again', 'case', now()) ON CONFLICT (id) DO UPDATE SET action = 'again'",
    ])("cannot be changed: %s", async (statement) => {
      await changingNothing(db(), () =>
        expect(db().raw(statement)).rejects.toThrow("the audit trail cannot be changed"),
      );
    });
    it("keeps the people and departments that it names", async () => {
      const remove = (table: string, id: string) =>
        expect(db()(table).where({ id }).delete()).rejects.toThrow("foreign key");
      await changingNothing(db(), () => remove("people", people.own.lead.id));
      await changingNothing(db(), () => remove("departments", people.own.lead.departmentId));
    });
  });
});
