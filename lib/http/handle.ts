import "server-only";
import type { Knex } from "knex";
import { unstable_rethrow } from "next/navigation";
import type { NextRequest } from "next/server";
import type { Actor } from "@/lib/auth/actor";
import { requireActor } from "@/lib/auth/current-actor";
import { type Permission, requirePermission } from "@/lib/auth/permissions";
import { database } from "@/lib/database";
import { AppError } from "@/lib/errors";
import { logError } from "@/lib/log";
import { problemResponse } from "./problem";

type Params = Record<string, string | string[] | undefined>;
type Context = { params: Promise<Params> };
type Call = { request: NextRequest; params: Params; actor: Actor; db: Knex };

/**
 * Wraps a route handler: who is asking is read from the database, the permission is checked before any body is read,
 * and whatever is thrown becomes a problem.
 */
export function handle(permission: Permission | "signed-in", respond: (call: Call) => Promise<Response>) {
  return async (request: NextRequest, context: Context): Promise<Response> => {
    const requestId = crypto.randomUUID();
    try {
      refuseOtherSites(request);
      const db = database();
      const actor = await requireActor(db);
      if (permission !== "signed-in") requirePermission(actor, permission);
      return await respond({ request, params: await context.params, actor, db });
    } catch (error) {
      unstable_rethrow(error); // redirects and the like belong to Next
      if (!(error instanceof AppError)) logError(error, { requestId, path: request.nextUrl.pathname });
      return problemResponse(error, request.nextUrl.pathname, requestId);
    }
  };
}

/** A change must come from our own pages: the session cookie alone does not prove that the person meant it. */
function refuseOtherSites(request: NextRequest): void {
  if (request.method === "GET" || request.method === "HEAD") return;
  const site = request.headers.get("sec-fetch-site");
  const origin = request.headers.get("origin");
  const host = request.headers.get("x-forwarded-host") ?? request.headers.get("host");
  const isForeign =
    (site !== null && site !== "same-origin" && site !== "none") ||
    (origin !== null && !(URL.canParse(origin) && new URL(origin).host === host));
  if (isForeign) throw new AppError("forbidden", "other-site", "Changes can only be made from the application itself.");
}
