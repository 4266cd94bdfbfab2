import { beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { GET as listCases } from "@/app/api/cases/route";
import { GET as listDesk } from "@/app/api/desk/rounds/route";
import { authOptions } from "@/lib/auth/options";
import { hashPassword } from "@/lib/auth/password";
import { callRoute } from "../../support/call-route";
import { useDatabase } from "../../support/database";
import { expectProblem } from "../../support/problem";
import { signInAs } from "../../support/session";
import { makeDepartment, makePerson, type TestPerson } from "../../support/world";

/** Every verification that is done, with the hash it is done against: the work whose time could tell an address. */
const verified = vi.hoisted(() => [] as string[]);
vi.mock("@node-rs/argon2", async (importActual) => {
  const argon2 = await importActual<typeof import("@node-rs/argon2")>();
  const verify: typeof argon2.verify = (hashed, ...rest) => {
    verified.push(String(hashed));
    return argon2.verify(hashed, ...rest);
  };
  return { ...argon2, verify };
});

const PASSWORD = "correct horse battery staple";

describe("signing in", () => {
  const db = useDatabase();
  let departmentId: string;
  let person: TestPerson;
  let passwordHash: string;
  beforeAll(async () => {
    departmentId = await makeDepartment(db());
    passwordHash = await hashPassword(PASSWORD);
    person = await makePerson(db(), departmentId, ["lead"], { email: "Somebody@test.example", passwordHash });
  });
  beforeEach(() => {
    verified.length = 0;
  });
  const authorize = (input: unknown): Promise<unknown> => {
    const [provider] = authOptions().providers;
    return provider?.options?.authorize(input);
  };

  it("gives the id and the session version, and nothing else, for the right password", async () => {
    const expected = { id: person.id, sessionVersion: 1 };
    expect(await authorize({ email: "Somebody@test.example", password: PASSWORD })).toEqual(expected);
    expect(await authorize({ email: " SOMEBODY@test.example ", password: PASSWORD })).toEqual(expected);
  });
  it("answers a wrong password and an unknown address alike, after the same work", async () => {
    const wrong = await authorize({ email: person.email, password: "wrong" });
    const unknown = await authorize({ email: "nobody@test.example", password: "wrong" });
    expect([wrong, unknown]).toEqual([null, null]);
    expect(verified).toHaveLength(2);
    const cost = (hashed = "") => hashed.split("$").slice(1, 4);
    expect(cost(verified[0])).toEqual(["argon2id", "v=19", "m=19456,t=2,p=1"]);
    expect(cost(verified[1])).toEqual(cost(verified[0]));
    expect(verified[1]).not.toBe(verified[0]);
  });
  it("lets nobody in with a password for the decoy of an unknown address", async () => {
    await authorize({ email: "nobody@test.example", password: "" });
    const [decoy = ""] = verified;
    expect(await authorize({ email: "nobody@test.example", password: decoy })).toBeNull();
  });
  it.each<[string, unknown]>([
    ["no password", { email: "Somebody@test.example" }],
    ["an empty password", { email: "Somebody@test.example", password: "" }],
    [
      "a password of a thousand letters more",
      { email: "Somebody@test.example", password: `${PASSWORD}${" ".repeat(1000)}` },
    ],
    ["the hash for a password", { email: "Somebody@test.example", password: "$argon2id$v=19$m=19456,t=2,p=1$" }],
    ["a pattern for an address", { email: "%@test.example", password: PASSWORD }],
    ["two addresses", { email: ["Somebody@test.example"], password: PASSWORD }],
    ["an address that no text can hold", { email: "Somebody@test.example\u0000", password: PASSWORD }],
    ["nothing", undefined],
  ])("answers null to %s", async (_, input) => {
    expect(await authorize(input)).toBeNull();
  });
  it("tells nothing of the inside when the database fails: the message would stand in the address", async () => {
    await db().raw("ALTER TABLE people RENAME TO people_away");
    try {
      const failing = authorize({ email: person.email, password: PASSWORD });
      await expect(failing).rejects.toThrow(/^unavailable$/);
    } finally {
      await db().raw("ALTER TABLE people_away RENAME TO people");
    }
  });
  it("puts an id and a version in the token, and no right, name or address", async () => {
    const { jwt, session } = authOptions().callbacks ?? {};
    const user = { id: person.id, sessionVersion: 3, name: "Somebody", email: person.email };
    const token = await jwt?.({ token: { name: "Somebody", email: person.email, picture: "x" }, user, account: null });
    expect(token).toEqual({ sub: person.id, sessionVersion: 3 });
    const expires = "2031-01-01T00:00:00Z";
    const given = { session: { expires, user: { name: "Somebody" } }, token: token ?? {}, user } as never;
    expect(await session?.(given)).toEqual({ expires, personId: person.id, sessionVersion: 3 });
  });

  describe("ends", () => {
    const listed = async () => callRoute(listCases);
    let leaving: TestPerson;
    beforeEach(async () => {
      leaving = await makePerson(db(), departmentId, ["lead"], { passwordHash });
      signInAs(leaving.id);
      expect((await listed()).status).toBe(200);
    });
    it("at once for somebody who is disabled, who cannot sign in again either", async () => {
      await db()("people").where({ id: leaving.id }).update({ disabled_at: new Date() });
      expectProblem(await listed(), 401, "signed-out");
      expect(await authorize({ email: leaving.email, password: PASSWORD })).toBeNull();
      expect(verified).toHaveLength(1); // answered in the same time as an unknown address
    });
    it("at once when the session version is raised, and begins anew with the new one", async () => {
      await db()("people").where({ id: leaving.id }).update({ session_version: 2 });
      expectProblem(await listed(), 401, "signed-out");
      signInAs(leaving.id, { sessionVersion: 2 });
      expect((await listed()).status).toBe(200);
      expect(await authorize({ email: leaving.email, password: PASSWORD })).toMatchObject({ sessionVersion: 2 });
    });
    it("at once for somebody without a department, and for a session of nobody", async () => {
      await db()("memberships").where({ person_id: leaving.id }).delete();
      expectProblem(await listed(), 401, "signed-out");
      signInAs(crypto.randomUUID());
      expectProblem(await listed(), 401, "signed-out");
    });
    it("not when a role is taken away, which takes its rights from the next request on", async () => {
      await db()("memberships")
        .where({ person_id: leaving.id })
        .update({ roles: ["examiner"] });
      expectProblem(await listed(), 403, "wrong-role");
      expect((await callRoute(listDesk)).status).toBe(200);
    });
  });
});
