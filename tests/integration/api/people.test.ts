import { beforeAll, describe, expect, it } from "vitest";
import { GET as listPeople } from "@/app/api/people/route";
import type { Role } from "@/lib/auth/roles";
import { PeopleListSchema } from "@/lib/people/schema";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { itIsGuarded } from "../../support/guarded-route";
import { signInAs } from "../../support/session";
import { makeTwoDepartments, type TwoDepartments } from "../../support/staff";
import { makePerson } from "../../support/world";

describe("GET /api/people", () => {
  const db = useDatabase();
  let people: TwoDepartments;
  beforeAll(async () => {
    people = await makeTwoDepartments(db());
  });
  const list = async () => {
    signInAs(people.own.admin.id);
    const { body } = await callRoute(listPeople);
    return PeopleListSchema.parse(body).people;
  };

  itIsGuarded({ db, handler: listPeople, roles: ["lead", "admin"], people: () => people });

  it("lists the people of the department by name, and of no other", async () => {
    const names = (await list()).map(({ name }) => name);
    expect(names.toSorted()).toEqual(names);
    expect(new Set(names)).toEqual(new Set(Object.values(people.own).map(({ name }) => name)));
  });
  it("tells nothing beyond its schema: no password, no theme, no other department", async () => {
    signInAs(people.own.admin.id);
    const { body } = await callRoute(listPeople);
    expect(
      PeopleListSchema.strict().extend({ people: PeopleListSchema.shape.people.element.strict().array() }).parse(body),
    ).toEqual(body);
  });
  it.each<[Role[], string | null]>([
    [["examiner"], "examiner"],
    [["trainee"], "trainee"],
    [["trainee", "examiner"], "examiner"],
    [["examiner", "reviewer", "admin"], "examiner"],
    [["reviewer"], null],
    [["admin"], null],
    [["lead", "examiner"], null], // knows the references
    [["lead", "trainee"], null],
  ])("says of somebody who is %s that they read as %s", async (roles, readsAs) => {
    const { id } = await makePerson(db(), people.own.lead.departmentId, roles);
    expect((await list()).find((person) => person.id === id)).toMatchObject({ roles, readsAs, isDisabled: false });
  });
  it("still lists somebody who was disabled, and says so", async () => {
    const { id } = await makePerson(db(), people.own.lead.departmentId, ["examiner"]);
    await db()("people").where({ id }).update({ disabled_at: new Date() });
    expect((await list()).find((person) => person.id === id)).toMatchObject({ isDisabled: true });
  });
});
