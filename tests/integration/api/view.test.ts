import { beforeAll, describe, expect, it } from "vitest";
import { GET as listCases } from "@/app/api/cases/route";
import { GET as listDesk } from "@/app/api/desk/rounds/route";
import { PUT as setView } from "@/app/api/view/route";
import { ROLES } from "@/lib/auth/roles";
import { VIEW_COOKIE, writeView } from "@/lib/auth/view";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { cookieValue, signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import { makePerson, type TestPerson } from "../../support/world";

describe("PUT /api/view", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  let both: TestPerson;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
    both = await makePerson(db(), people.own.lead.departmentId, ["lead", "examiner"]);
    const otherId = people.other.lead.departmentId;
    await db()("memberships").insert({ person_id: both.id, department_id: otherId, roles: ["trainee"] });
  });
  const put = (body: unknown) => callRoute(setView, { body });
  const guarded = {
    db,
    handler: setView,
    roles: ROLES,
    people: () => people,
    call: () => ({ body: { departmentId: people.own.lead.departmentId, role: "lead" } }),
  };
  itIsGuarded(guarded);
  itRefusesOtherSites(guarded);

  it("switches to a role of one's own, from the next request on", async () => {
    signInAs(both.id);
    expect((await callRoute(listCases)).status).toBe(200); // begins as lead
    const view = { departmentId: people.own.lead.departmentId, role: "examiner" as const };
    expect(await put(view)).toMatchObject({ status: 200, body: { landing: "/desk" } });
    expect(cookieValue(VIEW_COOKIE)).toBe(writeView(view));
    expectProblem(await callRoute(listCases), 403, "wrong-role");
    expect((await callRoute(listDesk)).status).toBe(200);
    expect((await put({ ...view, role: "lead" })).body).toEqual({ landing: "/rounds" });
    expect((await callRoute(listCases)).status).toBe(200);
  });
  it("switches to another department of one's own", async () => {
    signInAs(both.id);
    const view = { departmentId: people.other.lead.departmentId, role: "trainee" };
    expect((await put(view)).status).toBe(200);
    expectProblem(await callRoute(listCases), 403, "wrong-role");
  });
  it("answers 404 to a role not held, to one held elsewhere, and to a department not one's own, and stays", async () => {
    signInAs(both.id);
    for (const view of [
      { departmentId: people.own.lead.departmentId, role: "admin" },
      { departmentId: people.other.lead.departmentId, role: "lead" },
      { departmentId: crypto.randomUUID(), role: "lead" },
    ]) {
      expectProblem(await put(view), 404, "not-found");
    }
    signInAs(people.own.lead.id);
    expectProblem(await put({ departmentId: people.other.lead.departmentId, role: "lead" }), 404, "not-found");
    expect(cookieValue(VIEW_COOKIE)).toBeUndefined();
  });
  it("answers 422 to what is no role or department, 400 to what is not JSON", async () => {
    signInAs(both.id);
    expectFieldErrors(await put({ departmentId: "own", role: "owner" }), ["#/departmentId", "#/role"]);
    expectFieldErrors(await put({ ...guarded.call().body, personId: people.own.lead.id }), ["#"]);
    expectProblem(await put("lead"), 400, "not-json");
  });

  it("counts only where the database grants it: a forged cookie gives nothing", async () => {
    for (const view of [
      writeView({ departmentId: people.own.lead.departmentId, role: "lead" }),
      writeView({ departmentId: people.other.lead.departmentId, role: "lead" }),
      "lead",
      `${people.own.lead.departmentId}.lead.admin`,
    ]) {
      signInAs(people.own.examiner.id, { view });
      expectProblem(await callRoute(listCases), 403, "wrong-role");
    }
  });
  it("falls back to a role still held when the one acted in is taken away", async () => {
    const losing = await makePerson(db(), people.own.lead.departmentId, ["lead", "trainee"]);
    const view = writeView({ departmentId: people.own.lead.departmentId, role: "lead" });
    signInAs(losing.id, { view });
    expect((await callRoute(listCases)).status).toBe(200);
    await db()("memberships")
      .where({ person_id: losing.id })
      .update({ roles: ["trainee"] });
    expectProblem(await callRoute(listCases), 403, "wrong-role");
    expect((await callRoute(listDesk)).status).toBe(200);
  });
});
