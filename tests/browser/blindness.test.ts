import { readdirSync } from "node:fs";
import path from "node:path";
import sharp from "sharp";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { hashPassword } from "@/lib/auth/password";
import { closeDatabase, database } from "@/lib/database";
import { changeEnv } from "@/lib/env";
import { ALIGNED } from "@/lib/reflex/finding";
import { advanceRound } from "@/lib/rounds/advance-round";
import { startApplication, type TestApplication } from "../support/application";
import { testSettings } from "../support/database";
import { type Answer, findLeaks, type Secret, secretDegrees, secretWord } from "../support/leaks";
import { Visitor } from "../support/visitor";
import {
  closeAndCompute,
  deviation,
  makeCase,
  makeDepartment,
  makeOpenRound,
  makePerson,
  readWholeRound,
  type TestPerson,
} from "../support/world";

/**
 * Blindness: an examiner's browser walks every page and every API answer it can reach while a round is open, and no
 * reference, other reading, case code, storage key, original file name or repeat status may be found in any of it.
 */
const APP_FOLDER = path.join(import.meta.dirname, "../../app");
const PASSWORD = "a password for this test only";

describe("blindness of an open round", () => {
  let application: TestApplication;
  let visitor: Visitor;
  let secrets: Secret[];
  let ids: Record<string, string[]>;

  beforeAll(async () => {
    application = await startApplication();
    changeEnv({ ...testSettings(), DATABASE_URL: application.databaseUrl });
    const scene = await setScene();
    ({ secrets, ids } = scene);
    visitor = new Visitor(application.address);
    await visitor.signIn(scene.email, PASSWORD);
  });

  afterAll(async () => {
    await closeDatabase();
    await application?.stop();
  });

  it("tells nothing in any page, payload, header or picture", async () => {
    await walkEverything(visitor, ids);
    const reached = visitor.answers.filter(({ status }) => status === 200).map(({ url }) => url);
    // The walk is worth something only if it got to where the round is read.
    expect(reached).toContain("/desk");
    expect(reached.some((url) => /^\/desk\/[^/]+$/.test(url))).toBe(true);
    expect(reached.filter((url) => url.endsWith("/picture")).length).toBeGreaterThanOrEqual(7);
    expect(reached.some((url) => url.startsWith("/scorecards/"))).toBe(true);
    const ofRounds = await withoutPublicPages(visitor.answers, application.address);
    expect(await findLeaks(ofRounds, secrets)).toEqual([]);
  });

  it("refuses everything that belongs to the lead, the reviewer, other people or other departments", () => {
    const isTheirs = ({ url }: Answer) => /^\/api\/(cases|rounds|people|drift|audit)/.test(url);
    const statuses = new Set(visitor.answers.filter(isTheirs).map(({ status }) => status));
    statuses.delete(405); // routes without GET
    expect([...statuses]).toEqual([403]);
    const foreign = visitor.answers.filter(({ url }) => ids.foreign?.some((id) => url.includes(id)));
    expect(foreign.length).toBeGreaterThan(0);
    expect(foreign.filter(({ status, url }) => status === 200 && url.startsWith("/api/"))).toEqual([]);
  });

  it("gives a repeat and its twin pictures that differ in bytes and length, with the same headers", () => {
    const pictures = visitor.answers.filter(({ url, status }) => url.endsWith("/picture") && status === 200);
    const bodies = new Set(pictures.map(({ body }) => Buffer.from(body).toString("base64")));
    const urls = new Set(pictures.map(({ url }) => url));
    expect(bodies.size).toBe(urls.size);
    const names = new Set(pictures.map(({ headers }) => [...headers.keys()].sort().join()));
    expect(names.size).toBe(1);
  });

  it("finds each kind of leak when one is put in", async () => {
    const sample = visitor.answers.find(({ url, status }) => url.startsWith("/api/desk/rounds/") && status === 200);
    const photograph = visitor.answers.find(({ url, status }) => url.endsWith("/picture") && status === 200);
    if (!sample || !photograph) throw new Error("The walk has no answers to put leaks into.");
    const text = Buffer.from(sample.body).toString();
    const withBody = (body: string | Uint8Array): Answer => ({ ...sample, body: Buffer.from(body) });
    const leaky: Record<string, Answer> = {
      "a case code in JSON": withBody(text.replace("{", '{"code":"ZEBRA-17",')),
      "a case code in a server component's payload": withBody(`self.__next_f.push([1,"{\\"code\\":\\"ZEBRA-17\\"}"])`),
      "a case code behind base64": withBody(Buffer.from("a token that names ZEBRA-17 inside").toString("base64")),
      "a case code in a header": { ...sample, headers: new Headers({ "x-case": "zebra-17" }) },
      "a case code in an address": { ...sample, url: "/api/pictures/ZEBRA%2D17.jpg" },
      "a reference in JSON": withBody(text.replace("{", '{"reference":{"horizontalDegrees":37},')),
      "a reference in words": withBody("<p>Left eye, exotropia 37°, no vertical part.</p>"),
      "another reading": withBody('{\\"horizontalDegrees\\":23}'),
      "a repeat's status": withBody(text.replace("{", '{"kind":"repeat",')),
      "an original file name": withBody("patient-photo-kingfisher.jpg"),
      "metadata in a picture": {
        ...photograph,
        body: await sharp(photograph.body)
          .withExif({ IFD0: { ImageDescription: "case" } })
          .toBuffer(),
      },
      "a validator of the storage": {
        ...photograph,
        headers: new Headers({ "content-type": "image/jpeg", etag: '"1"' }),
      },
    };
    for (const [kind, answer] of Object.entries(leaky)) {
      expect(await findLeaks([answer], secrets), kind).not.toEqual([]);
    }
  });
});

/**
 * One examiner with an open round of six cases, one repeat and one mirrored item, another examiner who has read it, an
 * earlier released round with an anchor that is in both, and a department next door. Every secret is recognisable.
 */
async function setScene() {
  const db = database();
  const departmentId = await makeDepartment(db, "Department under test");
  const lead = await makePerson(db, departmentId, ["lead"], { name: "Lead Walrus", email: "walrus@test.example" });
  const passwordHash = await hashPassword(PASSWORD);
  const email = "examiner@test.example";
  const examiner = await makePerson(db, departmentId, ["examiner"], { name: "Examiner Self", email, passwordHash });
  const colleague = await makePerson(db, departmentId, ["examiner"], {
    name: "Colleague Narwhal",
    email: "narwhal@test.example",
  });
  const findings = [
    deviation("left", "exo", 37),
    deviation("right", "eso", 41),
    deviation("left", "eso", 43),
    deviation("right", "exo", 39),
    { ...ALIGNED, eye: "right" as const, vertical: "hyper" as const, verticalDegrees: 38 },
    deviation("left", "exo", 36),
  ];
  const caseIds: string[] = [];
  for (const [index, finding] of findings.entries()) {
    caseIds.push(
      await makeCase(db, lead, finding, { code: `ZEBRA-${17 + index}`, name: "patient-photo-kingfisher.jpg" }),
    );
  }
  const [anchor = "", second = ""] = caseIds;
  const readAs = (degrees: number) => () => deviation("right", "eso", degrees);

  const plainCase = await makeCase(db, lead, deviation("right", "eso", 15), { code: "OPEN-1" });
  const releasedId = await makeOpenRound(db, lead, {
    examiners: [examiner, colleague],
    items: [anchor, plainCase].map((caseId) => ({ caseId, kind: "first" as const })),
  });
  await readWholeRound(db, examiner, releasedId, readAs(12));
  await readWholeRound(db, colleague, releasedId, readAs(23));
  await closeAndCompute(db, lead, releasedId);
  await advanceRound(db, lead, releasedId, "released");

  const openId = await makeOpenRound(db, lead, {
    examiners: [examiner, colleague],
    items: [
      ...caseIds.map((caseId) => ({ caseId, kind: "first" as const })),
      { caseId: anchor, kind: "repeat" },
      { caseId: second, kind: "mirrored" },
    ],
  });
  await readWholeRound(db, colleague, openId, readAs(23));
  const foreign = await makeNeighbour();

  const items = await db("items").where({ round_id: openId });
  const photographs = await db("photographs").where({ department_id: departmentId });
  const showings = await db("assignment_items").join("assignments", "assignments.id", "assignment_items.assignment_id");
  const own = showings.filter(({ person_id }) => person_id === examiner.id);
  const others = showings.filter(({ person_id }) => person_id !== examiner.id);
  const ownIds = await db("assignment_items")
    .whereIn(
      "assignment_id",
      own.map(({ assignment_id }) => assignment_id),
    )
    .pluck("id");
  const otherIds = await db("assignment_items")
    .whereIn(
      "assignment_id",
      others.map(({ assignment_id }) => assignment_id),
    )
    .pluck("id");
  return {
    email,
    ids: {
      roundId: [openId, releasedId, foreign.roundId],
      itemId: [...ownIds, ...otherIds],
      caseId: [plainCase, foreign.caseId],
      foreign: [...otherIds, foreign.roundId, foreign.caseId],
    },
    secrets: secretsOf({ lead, colleague, items, photographs, caseIds, foreign: foreign.lead }),
  };
}

async function makeNeighbour() {
  const db = database();
  const departmentId = await makeDepartment(db, "Department Pangolin");
  const lead = await makePerson(db, departmentId, ["lead"], { name: "Lead Pangolin" });
  const caseId = await makeCase(db, lead, deviation("left", "exo", 37), { code: "PANGOLIN-1" });
  const reader = await makePerson(db, departmentId, ["examiner"]);
  const roundId = await makeOpenRound(db, lead, { examiners: [reader], items: [{ caseId, kind: "first" }] });
  return { lead, caseId, roundId };
}

type SecretSources = {
  lead: TestPerson;
  colleague: TestPerson;
  foreign: TestPerson;
  items: { id: string; picture_key: string }[];
  photographs: { id: string; storage_key: string }[];
  caseIds: string[];
};

function secretsOf({ lead, colleague, foreign, items, photographs, caseIds }: SecretSources): Secret[] {
  const people = [lead, colleague, foreign];
  return [
    secretWord("case code", "ZEBRA-"),
    secretWord("case code next door", "PANGOLIN"),
    secretWord("original file name", "kingfisher"),
    ...[37, 41, 43, 39, 38, 36].map((degrees) => secretDegrees("reference", degrees)),
    secretDegrees("another reading", 23),
    {
      what: "repeat status",
      pattern: /"kind"\s*:|"(repeat|mirrored|isMirrored|isAnchor)"\s*:\s*true|repeatOfPlace"\s*:\s*\d/,
    },
    ...people.flatMap(({ name, email, id }) => [name, email, id].map((word) => secretWord("another person", word))),
    ...items.flatMap(({ id, picture_key }) => [secretWord("item id", id), secretWord("storage key", picture_key)]),
    ...photographs.map(({ storage_key }) => secretWord("storage key", storage_key)),
    ...caseIds.map((id) => secretWord("case id", id)),
  ];
}

/** Opens every page and route of the application with every id, the payload of each page, and every link found. */
async function walkEverything(visitor: Visitor, ids: Record<string, string[]>): Promise<void> {
  const visited = new Set<string>();
  const waiting = appPaths().flatMap((pattern) => fillIn(pattern, ids));
  while (waiting.length > 0) {
    const url = waiting.pop() ?? "";
    if (visited.has(url)) continue;
    visited.add(url);
    const answer = await visitor.get(url);
    const location = answer.headers.get("location");
    if (location) waiting.push(new URL(location, "http://localhost").pathname);
    if (url.startsWith("/api/")) continue;
    await visitor.get(url, { RSC: "1" }); // what the browser gets when it moves within the application
    for (const [, href] of Buffer.from(answer.body)
      .toString()
      .matchAll(/(?:href|src)="(\/[^"]*)"/g)) {
      if (href && !href.startsWith("/_next/")) waiting.push(href.replaceAll("&amp;", "&"));
    }
  }
}

/** Leaves out pages that a stranger gets byte for byte, such as the method: they know nothing of any round. */
async function withoutPublicPages(answers: readonly Answer[], address: string): Promise<Answer[]> {
  const stranger = new Visitor(address);
  const kept: Answer[] = [];
  for (const answer of answers) {
    const isPage = answer.status === 200 && answer.headers.get("content-type")?.startsWith("text/html");
    const seen = isPage ? await stranger.get(answer.url) : null;
    if (!seen || !Buffer.from(seen.body).equals(Buffer.from(answer.body))) kept.push(answer);
  }
  return kept;
}

/** The address of every page and route handler, as the folders of app/ say. */
function appPaths(): string[] {
  const files = readdirSync(APP_FOLDER, { recursive: true, encoding: "utf8" });
  return files
    .filter((file) => /(^|\/)(page\.tsx|route\.ts)$/.test(file) && !file.includes("[..."))
    .map(
      (file) =>
        `/${path
          .dirname(file)
          .split("/")
          .filter((part) => !/^\(.*\)$/.test(part) && part !== ".")
          .join("/")}`,
    );
}

function fillIn(pattern: string, ids: Record<string, string[]>): string[] {
  const name = /\[(\w+)\]/.exec(pattern)?.[1];
  if (!name) return [pattern];
  return (ids[name] ?? []).flatMap((id) => fillIn(pattern.replace(`[${name}]`, id), ids));
}
