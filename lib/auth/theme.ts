import { z } from "zod";

/** Read on the server, so that the first paint has the theme; written in the browser by the switch. */
export const THEME_COOKIE = "evenglint-theme";
export const THEMES = ["system", "light", "dark"] as const;
export type Theme = (typeof THEMES)[number];

const THEME_AGE_MAX_S = 365 * 24 * 60 * 60;

/** What a cookie or an attribute says; anything else leaves the choice to the system. */
export function parseTheme(text: string | undefined): Theme {
  return THEMES.find((theme) => theme === text) ?? "system";
}

/** The cookie that keeps a theme on a device, as `document.cookie` takes it. */
export function themeCookie(theme: Theme): string {
  return `${THEME_COOKIE}=${theme}; Path=/; Max-Age=${THEME_AGE_MAX_S}; SameSite=Lax`;
}

export const AccountChange = z.strictObject({ theme: z.enum(THEMES) });
