import { describe, expect, it } from "vitest";
import { parseTheme, THEMES, themeCookie } from "@/lib/auth/theme";

describe("parseTheme", () => {
  it("reads back what the cookie keeps", () => {
    for (const theme of THEMES) expect(parseTheme(themeCookie(theme).split(";")[0]?.split("=")[1])).toBe(theme);
  });
  it("leaves anything else to the system, so that a foreign cookie never reaches the page", () => {
    for (const text of [undefined, "", "DARK", 'dark" onload="']) expect(parseTheme(text)).toBe("system");
  });
});
