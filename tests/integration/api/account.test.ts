import { beforeAll, describe, expect, it } from "vitest";
import { PATCH as changeAccount } from "@/app/api/account/route";
import { ROLES } from "@/lib/auth/roles";
import { THEMES } from "@/lib/auth/theme";
import { callRoute } from "../../support/call-route";
import { changingNothing } from "../../support/changing-nothing";
import { useDatabase } from "../../support/database";
import { itIsGuarded, itRefusesOtherSites } from "../../support/guarded-route";
import { expectFieldErrors, expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";

describe("PATCH /api/account", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
  });
  const patch = (body: unknown) => callRoute(changeAccount, { method: "PATCH", body });
  const guarded = {
    db,
    handler: changeAccount,
    roles: ROLES,
    people: () => people,
    call: () => ({ method: "PATCH", body: { theme: "dark" } }),
  };
  itIsGuarded(guarded);
  itRefusesOtherSites(guarded);

  it.each(ROLES)("keeps the theme of somebody who is %s, and of nobody else", async (role) => {
    const others = () => db()("people").whereNot({ id: people.own[role].id }).orderBy("id");
    const before = await others();
    signInAs(people.own[role].id);
    for (const theme of THEMES) {
      expect(await patch({ theme })).toMatchObject({ status: 200, body: { theme } });
      expect(await db()("people").where({ id: people.own[role].id }).first()).toMatchObject({ theme });
    }
    expect(await others()).toEqual(before);
  });
  it("answers 422 to another theme and to any other field of a person, 400 to what is not JSON", async () => {
    signInAs(people.own.trainee.id);
    expectFieldErrors(await changingNothing(db(), () => patch({ theme: "sepia" })), ["#/theme"]);
    expectFieldErrors(await changingNothing(db(), () => patch({ theme: "dark", email: "a@test.example" })), ["#"]);
    expectFieldErrors(await changingNothing(db(), () => patch({})), ["#/theme"]);
    expectProblem(await changingNothing(db(), () => patch("dark")), 400, "not-json");
  });
});
