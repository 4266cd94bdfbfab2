import type { Browser, BrowserContext, Page } from "playwright-core";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { hashPassword } from "@/lib/auth/password";
import { closeDatabase, database } from "@/lib/database";
import { changeEnv } from "@/lib/env";
import { ALIGNED, type Finding } from "@/lib/reflex/finding";
import { advanceRound } from "@/lib/rounds/advance-round";
import { toZonedInput } from "@/lib/time/zoned";
// Shrout & Fleiss, Psychological Bulletin 1979; 86: 420-428, table 2: six targets, four judges.
import shroutFleiss from "../reference/icc-shrout-fleiss-1979.json";
// irr 0.84 (R), data anxiety: 20 subjects, scores 1 to 6; unweighted kappa of raters 1 and 2 recomputed with R.
import anxiety from "../reference/irr-anxiety.json";
import { startApplication, type TestApplication } from "../support/application";
import { launchBrowser } from "../support/browser";
import { testSettings } from "../support/database";
import {
  closeAndCompute,
  deviation,
  makeCase,
  makeDepartment,
  makeOpenRound,
  makePerson,
  makePhotograph,
  readWholeRound,
  type TestPerson,
} from "../support/world";

/**
 * The main job in a browser, as different people: a library, a round published, read blind by keys, closed, its results,
 * the release, a scorecard and the drift board. The numbers on the screen are held to published tables.
 */
const PASSWORD = "a password for this test only";
const ZONE = "Europe/London";
const HOUR_MS = 3_600_000;

/** The six scores of the published table as six directions; every kappa is the same under any naming. */
const FINDING_OF_SCORE: Finding[] = [
  ALIGNED,
  deviation("right", "eso", 15),
  deviation("left", "eso", 15),
  deviation("right", "exo", 15),
  deviation("left", "exo", 15),
  { readable: false, reason: "blurred" },
];
const KEYS_OF_SCORE = ["N", "RE1V", "LE1V", "RX1V", "LX1V", "Q1"];

const scores = anxiety.data.ratings.map(([first = 0, second = 0]) => ({ reference: first, reading: second }));

describe("the main job, end to end", () => {
  let application: TestApplication;
  let browser: Browser;
  let lead: TestPerson;
  let trainee: TestPerson;
  let reviewer: TestPerson;
  const pages: BrowserContext[] = [];

  beforeAll(async () => {
    application = await startApplication();
    changeEnv({ ...testSettings(), DATABASE_URL: application.databaseUrl });
    browser = await launchBrowser();
    const db = database();
    const passwordHash = await hashPassword(PASSWORD);
    const departmentId = await makeDepartment(db, "Department under test");
    const person = (name: string, roles: Parameters<typeof makePerson>[2]) =>
      makePerson(db, departmentId, roles, { name, email: `${name.toLowerCase()}@test.example`, passwordHash });
    lead = await person("Lena", ["lead"]);
    trainee = await person("Theo", ["trainee"]);
    reviewer = await person("Ruth", ["reviewer", "admin"]);
    // Nineteen of the twenty cases; the first is uploaded by hand.
    for (const [index, { reference }] of scores.entries()) {
      if (index > 0) await makeCase(db, lead, findingOf(reference), { code: codeOf(index) });
    }
  });

  afterAll(async () => {
    for (const context of pages) await context.close();
    await browser?.close();
    await closeDatabase();
    await application?.stop();
  });

  async function signIn(person: TestPerson): Promise<Page> {
    const context = await browser.newContext({ baseURL: application.address, viewport: { width: 1440, height: 1000 } });
    pages.push(context);
    const page = await context.newPage();
    await page.goto("/sign-in");
    await page.getByLabel("Work address").fill(person.email);
    await page.getByLabel("Password").fill(PASSWORD);
    await page.getByRole("button", { name: "Sign in" }).click();
    await page.waitForURL(({ pathname }) => pathname !== "/" && !pathname.startsWith("/sign-in"));
    return page;
  }

  it("refuses a wrong password, keeps the address, and lands each role on its page", async () => {
    const context = await browser.newContext({ baseURL: application.address });
    pages.push(context);
    const page = await context.newPage();
    await page.goto("/rounds");
    expect(new URL(page.url()).pathname).toBe("/sign-in");
    await page.getByLabel("Work address").fill(lead.email);
    await page.getByLabel("Password").fill("not this one");
    await page.getByRole("button", { name: "Sign in" }).click();
    await page.getByText("do not fit together").waitFor();
    expect(await page.getByLabel("Work address").inputValue()).toBe(lead.email);

    const landings = await Promise.all(
      [lead, trainee, reviewer].map(async (each) => new URL((await signIn(each)).url()).pathname),
    );
    expect(landings).toEqual(["/rounds", "/desk", "/drift"]);
  });

  it("switches between roles and signs out", async () => {
    const page = await signIn(reviewer);
    await page.getByText("Ruth").first().click();
    await page.getByRole("button", { name: "Administrator" }).click();
    await page.waitForURL("**/people");
    await page.goto("/drift");
    await page.getByRole("button", { name: "Go on as reviewer" }).click();
    await page.waitForURL("**/drift");
    await page.getByText("Ruth").first().click();
    await page.getByRole("button", { name: "Sign out" }).click();
    await page.waitForURL("**/sign-in**");
    await page.goto("/drift");
    expect(new URL(page.url()).pathname).toBe("/sign-in");
  });

  it("adds a case with its photograph and reference, after saying what is wrong with a first try", async () => {
    const page = await signIn(lead);
    await page.goto("/cases/new");
    await page
      .getByLabel("Photograph")
      .setInputFiles({ name: "notes.jpg", mimeType: "image/jpeg", buffer: Buffer.from("no picture") });
    await page.getByRole("radio", { name: /The eyes are drawn/ }).check();
    await page.getByLabel("Code").fill(codeOf(0));
    await answerByButtons(page, scores[0]?.reference ?? 0);
    await page.getByLabel("Rests on").selectOption({ label: "Expert panel" });
    await page.getByRole("button", { name: "Add the case" }).click();
    await page.getByText("This is not a photograph that can be used").first().waitFor();
    expect(await page.getByLabel("Code").inputValue()).toBe(codeOf(0));

    await page
      .getByLabel("Photograph")
      .setInputFiles({ name: "eyes.png", mimeType: "image/jpeg", buffer: await makePhotograph() });
    await page.getByRole("button", { name: "Add the case" }).click();
    await page.getByRole("heading", { name: `Case ${codeOf(0)}` }).waitFor();
    await page.goto("/cases");
    await page.getByText("20 of 20 cases shown").waitFor();
    await page.getByRole("link", { name: "Aligned" }).click();
    const aligned = scores.filter(({ reference }) => reference === 1).length;
    await page.getByText(`${aligned} of 20 cases shown`).waitFor();
  });

  it("composes and publishes a round", async () => {
    const page = await signIn(lead);
    await page.getByLabel("Title of round 1").fill("Round of the published table");
    await page.getByRole("button", { name: "Start a draft" }).click();
    await page.waitForURL("**/compose");
    await page.getByRole("button", { name: "Publish round 1" }).click();
    await page.getByText("The round cannot be published yet.").waitFor();
    const boxes = page.getByRole("region", { name: "Case library" }).getByRole("checkbox");
    for (const box of await boxes.all()) await box.check({ force: true });
    await page.getByLabel("Opens").fill(toZonedInput(new Date(Date.now() - HOUR_MS).toISOString(), ZONE));
    await page.getByLabel("Closes").fill(toZonedInput(new Date(Date.now() + 48 * HOUR_MS).toISOString(), ZONE));
    await page.getByRole("button", { name: "Choose all" }).click();
    await page.getByRole("button", { name: "Publish round 1" }).click();
    await page.getByText("Results are sealed").waitFor();
    await page.getByRole("row", { name: /Theo/ }).getByText("not begun").waitFor();
  });

  it("is read by keys alone, changed before handing in, and handed in", async () => {
    const page = await signIn(trainee);
    const wanted = await readingsByPlace(trainee.id);
    await page.getByRole("link", { name: "Start reading" }).click();
    for (const [index, score] of wanted.entries()) {
      await page.getByRole("heading", { name: `Case ${index + 1} of 20` }).waitFor();
      // The first case is misread on purpose, to be changed below.
      for (const key of keysOf(index === 0 ? otherScore(score) : score)) await page.keyboard.press(key);
      await page.keyboard.press("Enter");
    }
    await page.waitForURL("**/check");
    await page.getByRole("link", { name: "Change case 1", exact: true }).click();
    await page.getByRole("heading", { name: "Case 1 of 20" }).waitFor();
    for (const key of keysOf(wanted[0] ?? 1)) await page.keyboard.press(key);
    await page.keyboard.press("Enter");
    await page.waitForURL("**/check");
    await page.getByRole("button", { name: "Hand in 20 readings" }).click();
    await page.getByRole("dialog").getByRole("button", { name: "Hand in" }).click();
    await page.getByText("Handed in: 20 readings.").waitFor();
  });

  it("is followed and closed by the lead, who then sees the published figures", async () => {
    const page = await signIn(lead);
    await page.getByRole("link", { name: /Round of the published table/ }).click();
    await page.getByRole("row", { name: /Theo/ }).getByText("handed in").waitFor();
    await page.getByRole("button", { name: "Close the round…" }).click();
    await page.getByLabel("Type the number of the round").fill("1");
    await page.getByRole("dialog").getByRole("button", { name: "Close the round" }).click();
    await page.waitForURL("**/results", { timeout: 60_000 });
    const row = page.getByRole("table", { name: /Table 1/ }).getByRole("row", { name: /Theo/ });
    await row.waitFor();
    const { unweighted } = anxiety.expected.kappa12;
    await expectText(row, `${unweighted.kappa.toFixed(2)}`); // 0.12
    await expectText(row, "−0.11 to 0.35");
    await expectText(row, "30 %"); // observed agreement 0.3
    await expectConfusion(page);
    await page.getByRole("button", { name: "Release…" }).click();
    await page.getByLabel("Type the number of the round").fill("1");
    await page.getByRole("dialog").getByRole("button", { name: "Release" }).click();
    await page.getByText("released", { exact: true }).first().waitFor();
  });

  it("shows the trainee the own scorecard and nobody else", async () => {
    const page = await signIn(trainee);
    await page.getByRole("link", { name: "Scorecard" }).click();
    await page.getByRole("heading", { name: "Your scorecard" }).waitFor();
    const score = page.getByRole("region", { name: "Agreement score" });
    await expectText(score, "0.12");
    await expectText(score, "95 % interval −0.11 to 0.35");
    await page.getByRole("button", { name: /^All/ }).click();
    expect(await page.getByRole("heading", { level: 3, name: /^Case \d+$/ }).count()).toBe(20);
    expect(await page.content()).not.toContain("Lena");
  });

  it("shows limits of agreement worked by hand, and the drift board to the reviewer", async () => {
    // Judges 1 and 2 of Shrout & Fleiss as degrees: differences -7 -5 -4 -6 -5 -4, mean -31/6, SD 1.1690, so that the
    // limits are -5.1667 -/+ 1.96 * 1.1690 = -7.46 and -2.88.
    await playDegreesRound();
    const leadPage = await signIn(lead);
    await leadPage.getByRole("link", { name: /Degrees of the published table/ }).click();
    const row = leadPage.getByRole("table", { name: /Table 1/ }).getByRole("row", { name: /Theo/ });
    await expectText(row, "−5.2°");
    await expectText(row, "−7.5 to −2.9°");
    await expectText(row, "too few to say (6)");

    const page = await signIn(reviewer);
    await page.getByRole("heading", { name: "Drift board" }).waitFor();
    await page.getByRole("button", { name: "Horizontal bias" }).click();
    await page.getByRole("button", { name: /Theo/ }).click();
    const table = page.getByRole("table", { name: /Bias and limits of agreement of each round/ });
    await expectText(table.getByRole("row", { name: /Degrees of the published table/ }), "−7.5 to −2.9°");
  });

  async function playDegreesRound() {
    const db = database();
    const degrees = new Map<string, number>();
    for (const [judge1 = 0, judge2 = 0] of shroutFleiss.data.ratings) {
      degrees.set(await makeCase(db, lead, deviation("left", "eso", judge1)), judge2);
    }
    const items = [...degrees.keys()].map((caseId) => ({ caseId, kind: "first" as const }));
    const title = "Degrees of the published table";
    const roundId = await makeOpenRound(db, lead, { examiners: [trainee], items, title });
    await readWholeRound(db, trainee, roundId, (caseId) => deviation("left", "eso", degrees.get(caseId) ?? 0));
    await closeAndCompute(db, lead, roundId);
    await advanceRound(db, lead, roundId, "released");
  }
});

function codeOf(index: number): string {
  return `T${String(index + 1).padStart(2, "0")}`;
}

function findingOf(score: number): Finding {
  return FINDING_OF_SCORE[score - 1] ?? ALIGNED;
}

function keysOf(score: number): string[] {
  return [...(KEYS_OF_SCORE[score - 1] ?? "")].map((key) => key.toLowerCase());
}

function otherScore(score: number): number {
  return score === 1 ? 2 : 1;
}

/** What the published second rater says of each case, in the order in which this examiner sees the cases. */
async function readingsByPlace(personId: string): Promise<number[]> {
  const rows = await database()("assignment_items")
    .join("assignments", "assignments.id", "assignment_items.assignment_id")
    .join("items", "items.id", "assignment_items.item_id")
    .join("cases", "cases.id", "items.case_id")
    .where({ person_id: personId })
    .orderBy("place")
    .pluck("cases.code");
  return rows.map((code: string) => scores[Number(code.slice(1)) - 1]?.reading ?? 0);
}

async function answerByButtons(page: Page, score: number): Promise<void> {
  const finding = findingOf(score);
  if (!finding.readable || finding.eye === "none") throw new Error("The first case of the table deviates.");
  await page.getByRole("radio", { name: finding.eye === "right" ? "Right" : "Left" }).check({ force: true });
  await page.getByRole("radio", { name: finding.horizontal === "eso" ? /^Eso/ : /^Exo/ }).check({ force: true });
  await page
    .getByRole("group", { name: /Vertical/ })
    .first()
    .getByRole("radio", { name: "None" })
    .check({ force: true });
  await page.getByRole("radio", { name: /^15°/ }).check({ force: true });
}

async function expectText(place: ReturnType<Page["locator"]>, text: string): Promise<void> {
  await place.getByText(text).first().waitFor({ timeout: 15_000 });
}

/** The counts of the confusion table: rater 1 in rows, rater 2 in columns, counted here from the published ratings. */
async function expectConfusion(page: Page): Promise<void> {
  const table = page
    .getByRole("table")
    .filter({ has: page.getByRole("rowheader", { name: "L exo" }) })
    .first();
  const row = table.getByRole("row").filter({ has: page.getByRole("rowheader", { name: "L eso", exact: true }) });
  const cells = await row.getByRole("cell").allInnerTexts();
  // Rater 1 said 3 (here L eso) six times; with it rater 2 said 3 once, 4 three times, and 6 once … counted:
  const expected = [1, 2, 3, 4, 5, 6].map(
    (column) => scores.filter(({ reference, reading }) => reference === 3 && reading === column).length,
  );
  const counts = cells.map((text) => Number(text)).filter((count) => Number.isInteger(count) && count > 0);
  expect(counts.sort()).toEqual(expected.filter((count) => count > 0).sort());
}
