import { type Browser, chromium } from "playwright-core";

/** Debian's chromium, without a window. Root may not use its sandbox, and needs none for our own pages. */
export function launchBrowser(): Promise<Browser> {
  return chromium.launch({ executablePath: "/usr/bin/chromium", chromiumSandbox: process.getuid?.() !== 0 });
}
