import type { Metadata, Viewport } from "next";
import { cookies } from "next/headers";
import type { ReactNode } from "react";
import { SkipLink } from "@/components/shell/skip-link";
import { parseTheme, THEME_COOKIE } from "@/lib/auth/theme";
import { faceClasses } from "./fonts";
import "./globals.css";

export const metadata: Metadata = {
  title: { default: "Evenglint", template: "%s · Evenglint" },
  description: "Calibration rounds for the corneal light reflex test.",
  applicationName: "Evenglint",
  robots: { index: false, follow: false },
  // Case numbers and degrees are not telephone numbers.
  formatDetection: { telephone: false, date: false, address: false, email: false },
};

export const viewport: Viewport = {
  colorScheme: "light dark",
  themeColor: [
    { media: "(prefers-color-scheme: light)", color: "#eff2ef" },
    { media: "(prefers-color-scheme: dark)", color: "#101614" },
  ],
};

/** The theme is read here, on the server, so that the first paint already has it. */
export default async function RootLayout({ children }: { children: ReactNode }) {
  const theme = parseTheme((await cookies()).get(THEME_COOKIE)?.value);
  return (
    <html lang="en" data-theme={theme} className={faceClasses}>
      <body>
        <SkipLink />
        {children}
      </body>
    </html>
  );
}
