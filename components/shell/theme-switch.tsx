"use client";

import { useEffect, useState } from "react";
import { ChoiceGroup } from "@/components/ui/choice-group";
import { parseTheme, type Theme, themeCookie } from "./theme";

const CHOICES: readonly { value: Theme; label: string }[] = [
  { value: "system", label: "System" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
];

/** Light, dark, or as the system is set. It takes effect at once and is kept on this device. */
export function ThemeSwitch({ onThemeChange }: { onThemeChange?: (theme: Theme) => void }) {
  const [theme, setTheme] = useState<Theme | null>(null);
  useEffect(() => setTheme(parseTheme(document.documentElement.dataset.theme)), []);
  return (
    <ChoiceGroup
      legend="Theme"
      name="theme"
      choices={CHOICES}
      value={theme}
      onChange={(chosen) => {
        document.documentElement.dataset.theme = chosen;
        // biome-ignore lint/suspicious/noDocumentCookie: the cookie store is missing from browsers still in use
        document.cookie = themeCookie(chosen);
        setTheme(chosen);
        onThemeChange?.(chosen);
      }}
    />
  );
}
