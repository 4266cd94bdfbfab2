import { cookies } from "next/headers";
import { LANDING } from "@/lib/auth/roles";
import { VIEW_COOKIE, ViewSchema, writeView } from "@/lib/auth/view";
import { notFound } from "@/lib/errors";
import { handle } from "@/lib/http/handle";
import { parseJson } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** Switches to another department or role of one's own. Answers 200 with the page to go to, or a problem: 401, 404, 422. */
export const PUT = handle("signed-in", async ({ request, actor }) => {
  const view = await parseJson(request, ViewSchema);
  const membership = actor.memberships.find(({ departmentId }) => departmentId === view.departmentId);
  if (!membership?.roles.includes(view.role)) throw notFound("role of yours");
  (await cookies()).set(VIEW_COOKIE, writeView(view), {
    httpOnly: true,
    sameSite: "lax",
    path: "/",
    maxAge: 31_536_000,
  });
  return ok({ landing: LANDING[view.role] });
});
