"use client";

import { useId, useSyncExternalStore } from "react";
import { ChoiceGroup } from "@/components/ui/choice-group";
import { parseTheme, type Theme, themeCookie } from "@/lib/auth/theme";

const CHOICES: readonly { value: Theme; label: string }[] = [
  { value: "system", label: "System" },
  { value: "light", label: "Light" },
  { value: "dark", label: "Dark" },
];

/** Light, dark, or as the system is set. It takes effect at once and is kept on this device. */
export function ThemeSwitch({ onThemeChange }: { onThemeChange?: (theme: Theme) => void }) {
  const name = useId();
  // The page itself holds the theme, so that two switches on one page agree. The server shows none as chosen.
  const theme = useSyncExternalStore(watchTheme, readTheme, () => null);
  return (
    <ChoiceGroup
      legend="Theme"
      name={name}
      choices={CHOICES}
      value={theme}
      onChange={(chosen) => {
        document.documentElement.dataset.theme = chosen;
        // biome-ignore lint/suspicious/noDocumentCookie: the cookie store is missing from browsers still in use
        document.cookie = themeCookie(chosen);
        onThemeChange?.(chosen);
      }}
    />
  );
}

function readTheme(): Theme {
  return parseTheme(document.documentElement.dataset.theme);
}

function watchTheme(onChange: () => void): () => void {
  const observer = new MutationObserver(onChange);
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ["data-theme"] });
  return () => observer.disconnect();
}
