import { setTheme } from "@/lib/auth/queries";
import { AccountChange } from "@/lib/auth/theme";
import { handle } from "@/lib/http/handle";
import { parseJson } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** Keeps a person's theme on the account, for the next device. Answers 200, or a problem: 400, 401, 422. */
export const PATCH = handle("signed-in", async ({ request, actor, db }) => {
  const { theme } = await parseJson(request, AccountChange);
  await setTheme(db, actor.id, theme);
  return ok({ theme });
});
