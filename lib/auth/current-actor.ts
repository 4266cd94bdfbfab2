import "server-only";
import type { Knex } from "knex";
import { cookies } from "next/headers";
import { redirect } from "next/navigation";
import { getServerSession } from "next-auth";
import { cache } from "react";
import { database } from "@/lib/database";
import { AppError } from "@/lib/errors";
import type { Actor } from "./actor";
import { loadActor } from "./load-actor";
import { authOptions } from "./options";
import { can, type Permission, rolesWith } from "./permissions";
import { readView, VIEW_COOKIE } from "./view";

async function findActor(db: Knex): Promise<Actor | null> {
  const session = await getServerSession(authOptions());
  if (!session?.personId || session.sessionVersion === undefined) return null;
  const view = readView((await cookies()).get(VIEW_COOKIE)?.value);
  return loadActor(db, { personId: session.personId, sessionVersion: session.sessionVersion }, view);
}

/** For route handlers: the actor, or a 401. */
export async function requireActor(db: Knex): Promise<Actor> {
  const actor = await findActor(db);
  if (!actor) throw new AppError("unauthenticated", "signed-out", "Your session has ended. Sign in again.");
  return actor;
}

/** For pages: the actor once per request, or the way to the sign-in page. */
export const signedInActor = cache(async (): Promise<Actor> => {
  const actor = await findActor(database());
  if (!actor) redirect("/sign-in");
  return actor;
});

/** For pages: the actor where the role acted in may do this; otherwise the page that offers to switch. */
export async function authorizePage(permission: Permission): Promise<Actor> {
  const actor = await signedInActor();
  if (!can(actor, permission)) redirect(`/switch?for=${rolesWith(permission).join(",")}`);
  return actor;
}

/** For the sign-in page, which sends people who are signed in on their way. */
export function actorIfSignedIn(): Promise<Actor | null> {
  return findActor(database());
}
