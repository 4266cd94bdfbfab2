import { handle } from "@/lib/http/handle";
import { ok } from "@/lib/http/respond";
import { listPeople } from "@/lib/people/queries";

/** Everybody in the department, and who can read blind. Answers 200, or a problem: 401, 403. */
export const GET = handle("people.read", async ({ actor, db }) => {
  return ok({ people: await listPeople(db, actor.departmentId) });
});
