import type { Knex } from "knex";
import { expect, it } from "vitest";
import { ROLES, type Role } from "@/lib/auth/roles";
import { type CallOptions, callRoute, type Handler } from "./call-route";
import { changingNothing } from "./changing-nothing";
import { expectProblem } from "./problem";
import { signInAs } from "./session";
import type { TwoDepartments } from "./staff";

type GuardedRoute = {
  db: () => Knex;
  handler: Handler;
  /** Who may call; everybody else is refused. */
  roles: readonly Role[];
  people: () => TwoDepartments;
  /** A sound call in the own department. */
  call?: () => CallOptions;
  /** The parameter that names the row, where the path has one. */
  param?: string;
};

/** States what every route promises whoever calls it: who is let in, and that the rest learn and change nothing. */
export function itIsGuarded({ db, handler, roles, people, call = () => ({}), param }: GuardedRoute): void {
  const refuse = (options: CallOptions) => changingNothing(db(), () => callRoute(handler, options));

  it("answers 401 to whoever is not signed in", async () => {
    signInAs(null);
    expectProblem(await refuse(call()), 401, "signed-out");
  });

  it.each(ROLES.filter((role) => !roles.includes(role)))(
    "answers 403 to somebody acting as %s, before any body is read",
    async (role) => {
      signInAs(people().own[role].id);
      const options = call();
      const unreadable = options.body === undefined ? options : { ...options, body: "{" };
      expectProblem(await refuse(unreadable), 403, "wrong-role");
    },
  );

  if (param) {
    it("answers 404 alike for another department's row, a missing one and an id that is none", async () => {
      const [role = "lead"] = roles;
      const options = call();
      signInAs(people().other[role].id);
      const foreign = expectProblem(await refuse(options), 404, "not-found");
      signInAs(people().own[role].id);
      const named = (id: string) => refuse({ ...options, params: { ...options.params, [param]: id } });
      const missing = expectProblem(await named(crypto.randomUUID()), 404, "not-found");
      const misshapen = expectProblem(await named("1' OR '1'='1"), 404, "not-found");
      expect({ ...missing, requestId: "" }).toEqual({ ...foreign, requestId: "" });
      expect({ ...misshapen, requestId: "" }).toEqual({ ...foreign, requestId: "" });
    });
  }
}

/** The same for routes that change something: no page of another site may call them with a person's cookie. */
export function itRefusesOtherSites({ db, handler, roles, people, call = () => ({}) }: GuardedRoute): void {
  it.each<[string, Record<string, string>]>([
    ["another origin", { origin: "https://elsewhere.example" }],
    ["another port of this host", { origin: "http://localhost:4000" }],
    ["a page without an origin", { origin: "null" }],
    ["a cross-site request", { "sec-fetch-site": "cross-site" }],
    ["a neighbouring site", { "sec-fetch-site": "same-site" }],
  ])("answers 403 to %s", async (_, headers) => {
    const [role = "lead"] = roles;
    signInAs(people().own[role].id);
    const called = await changingNothing(db(), () => callRoute(handler, { ...call(), headers }));
    expectProblem(called, 403, "other-site");
  });
}
