import { z } from "zod";

export const THEME_COOKIE = "evenglint-theme";
export const THEMES = ["system", "light", "dark"] as const;
export type Theme = (typeof THEMES)[number];

export const AccountChange = z.strictObject({ theme: z.enum(THEMES) });
