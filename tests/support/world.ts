import type { Knex } from "knex";
import sharp from "sharp";
import type { Role } from "@/lib/auth/roles";
import { createCase } from "@/lib/cases/create-case";
import { listDeskItems } from "@/lib/desk/queries";
import { saveReading } from "@/lib/desk/save-reading";
import { submitRound } from "@/lib/desk/submit-round";
import { ALIGNED, type Finding, type ReadableFinding } from "@/lib/reflex/finding";
import { computeResults } from "@/lib/results/compute-results";
import { advanceRound } from "@/lib/rounds/advance-round";
import { createDraft, saveDraft } from "@/lib/rounds/save-draft";
import type { ItemKind } from "@/lib/rounds/schema";

/** A person of a department, in the shape the services take. */
export type TestPerson = Parameters<typeof advanceRound>[1];

let counter = 0;
const next = () => ++counter;

export async function makeDepartment(db: Knex, name = `Department ${next()}`): Promise<string> {
  const [row] = await db("departments").insert({ name, time_zone: "Europe/London" }).returning("id");
  return row.id;
}

/** A person without a usable password: tests sign in through `signInAs`. */
export async function makePerson(
  db: Knex,
  departmentId: string,
  roles: Role[],
  { name = `Person ${next()}`, email = `person-${next()}@test.example`, passwordHash = "none" } = {},
): Promise<TestPerson> {
  const [row] = await db("people").insert({ name, email, password_hash: passwordHash }).returning("id");
  await db("memberships").insert({ person_id: row.id, department_id: departmentId, roles });
  const [role = "examiner"] = roles;
  const place = { departmentId, departmentName: "", timeZone: "Europe/London", memberships: [] };
  return { id: row.id, name, email, theme: "system", role, ...place };
}

/** A small photograph; each is a little different, so that no two are equal by chance. */
export function makePhotograph(width = 420, height = 184): Promise<Buffer> {
  const shade = 90 + (next() % 120);
  const background = { r: shade, g: 120, b: 140 };
  return sharp({ create: { width, height, channels: 3, background } })
    .jpeg()
    .toBuffer();
}

export const leftExo = (degrees: number): ReadableFinding => deviation("left", "exo", degrees);
export const rightEso = (degrees: number): ReadableFinding => deviation("right", "eso", degrees);

export function deviation(eye: "right" | "left", horizontal: "eso" | "exo", degrees: number | ">45"): ReadableFinding {
  return { ...ALIGNED, eye, horizontal, horizontalDegrees: degrees };
}

export async function makeCase(
  db: Knex,
  lead: TestPerson,
  finding: Finding,
  { code = `C${next()}`, name = "original.jpg" } = {},
): Promise<string> {
  const reference = { finding, basis: "panel" as const, uncertaintyDegrees: null };
  const input = { code, note: "", isAnchor: false, consent: "drawn" as const, reference };
  return createCase(db, lead, input, { body: await makePhotograph(), name });
}

export type TestRound = {
  examiners: TestPerson[];
  items: { caseId: string; kind: ItemKind }[];
  opensAt?: Date;
  closesAt?: Date;
  title?: string;
};

const HOUR_MS = 3_600_000;

export async function makeDraft(db: Knex, lead: TestPerson, round: TestRound): Promise<string> {
  const title = round.title ?? `Round ${next()}`;
  const roundId = await createDraft(db, lead, title);
  await saveDraft(db, lead, roundId, {
    title,
    instructions: "",
    opensAt: (round.opensAt ?? new Date(Date.now() - HOUR_MS)).toISOString(),
    closesAt: (round.closesAt ?? new Date(Date.now() + 24 * HOUR_MS)).toISOString(),
    items: round.items,
    examinerIds: round.examiners.map(({ id }) => id),
  });
  return roundId;
}

export async function makeOpenRound(db: Knex, lead: TestPerson, round: TestRound): Promise<string> {
  const roundId = await makeDraft(db, lead, round);
  await advanceRound(db, lead, roundId, "open");
  return roundId;
}

/** Reads a whole round: `readingOf` says what the examiner makes of each item, by its case and kind. */
export async function readWholeRound(
  db: Knex,
  examiner: TestPerson,
  roundId: string,
  readingOf: (caseId: string, kind: ItemKind) => Finding | null,
): Promise<void> {
  const assignment = await db("assignments").where({ round_id: roundId, person_id: examiner.id }).first("id");
  const shown = await db("assignment_items")
    .join("items", "items.id", "assignment_items.item_id")
    .where({ assignment_id: assignment.id })
    .select("assignment_items.id", "items.case_id", "items.kind");
  for (const { id } of await listDeskItems(db, assignment.id)) {
    const item = shown.find((each) => each.id === id);
    const finding = item && readingOf(item.case_id, item.kind);
    if (!finding) continue;
    const input = { saveId: crypto.randomUUID(), revision: 1, finding, confidence: null, seconds: 1 };
    await saveReading(db, examiner, id, input);
  }
}

export async function submitWholeRound(db: Knex, examiner: TestPerson, roundId: string): Promise<void> {
  await submitRound(db, examiner, roundId);
}

/** Closes a round and computes its results, as the worker would. */
export async function closeAndCompute(db: Knex, lead: TestPerson, roundId: string): Promise<void> {
  await advanceRound(db, lead, roundId, "closed");
  await computeResults(db, roundId, "closed");
}
