import type { Browser } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { startApplication, type TestApplication } from "@/tests/support/application";
import { launchBrowser } from "@/tests/support/browser";

describe("a page of the built application", () => {
  let application: TestApplication;
  let browser: Browser;
  beforeAll(async () => {
    application = await startApplication();
    browser = await launchBrowser();
  });
  afterAll(async () => {
    await browser?.close();
    await application?.stop();
  });

  it("asks no other host for anything, and stays within its own content security policy", async () => {
    const page = await browser.newPage();
    const hosts = new Set<string>();
    const complaints: string[] = [];
    page.on("request", (request) => hosts.add(new URL(request.url()).host));
    page.on("console", (message) => message.type() === "error" && complaints.push(message.text()));
    page.on("pageerror", (error) => complaints.push(error.message));
    await page.goto(`${application.address}/sign-in`, { waitUntil: "networkidle" });
    // Scripts ran, or the page would be blank to whoever types into it.
    expect(await page.evaluate(() => document.querySelectorAll("input").length)).toBeGreaterThan(0);
    expect([...hosts]).toEqual([new URL(application.address).host]);
    expect(complaints).toEqual([]);
  });
  it("refuses what the policy forbids", async () => {
    const page = await browser.newPage();
    await page.goto(`${application.address}/sign-in`);
    const violation = await page.evaluate(
      () =>
        new Promise<string>((resolve) => {
          document.addEventListener("securitypolicyviolation", (event) => resolve(event.effectiveDirective));
          document.body.append(Object.assign(new Image(), { src: "http://other.example/a.png" }));
        }),
    );
    expect(violation).toBe("img-src");
  });
  it("tells browsers to be careful with it, and not what it is made with", async () => {
    const { headers } = await fetch(`${application.address}/sign-in`);
    expect(headers.get("x-powered-by")).toBeNull();
    expect(headers.get("x-content-type-options")).toBe("nosniff");
    expect(headers.get("referrer-policy")).toBe("same-origin");
    expect(headers.get("content-security-policy")).toContain("frame-ancestors 'none'");
    expect(headers.get("permissions-policy")).toContain("camera=()");
  });
});
