"use client";

import { useEffect } from "react";
import { z } from "zod";
import { parseTheme, THEME_COOKIE, THEMES, type Theme, themeCookie } from "@/lib/auth/theme";
import { sendJson } from "@/lib/http/fetch-json";

const Stored = z.object({ theme: z.enum(THEMES) });

/** Brings the theme kept on the account to a device that has none yet, and keeps a change on the account. */
export function useAccountTheme(accountTheme: Theme): (theme: Theme) => void {
  useEffect(() => {
    if (document.cookie.includes(`${THEME_COOKIE}=`)) return;
    document.documentElement.dataset.theme = parseTheme(accountTheme);
    // biome-ignore lint/suspicious/noDocumentCookie: the cookie store is missing from browsers still in use
    document.cookie = themeCookie(accountTheme);
  }, [accountTheme]);
  return (theme) => {
    // The device has it already; if the account does not hear of it now, it will at the next change.
    sendJson("PATCH", "/api/account", { theme }, Stored).catch(() => undefined);
  };
}
