import { cookies } from "next/headers";
import { AccountChange, THEME_COOKIE } from "@/lib/auth/account";
import { setTheme } from "@/lib/auth/queries";
import { handle } from "@/lib/http/handle";
import { parseJson } from "@/lib/http/parse";
import { ok } from "@/lib/http/respond";

/** Keeps a person's theme, on the account and in a cookie for the first paint. Answers 200, or a problem: 401, 422. */
export const PATCH = handle("signed-in", async ({ request, actor, db }) => {
  const { theme } = await parseJson(request, AccountChange);
  await setTheme(db, actor.id, theme);
  (await cookies()).set(THEME_COOKIE, theme, { sameSite: "lax", path: "/", maxAge: 31_536_000 });
  return ok({ theme });
});
