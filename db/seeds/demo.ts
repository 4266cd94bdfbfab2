import "server-only";
import { readFile } from "node:fs/promises";
import path from "node:path";
import type { Knex } from "knex";
import { z } from "zod";
import { hashPassword } from "@/lib/auth/password";
import { createCase } from "@/lib/cases/create-case";
import { listDeskItems, type Reader } from "@/lib/desk/queries";
import { saveReading } from "@/lib/desk/save-reading";
import { submitRound } from "@/lib/desk/submit-round";
import { FindingSchema } from "@/lib/findings/schema";
import type { Finding } from "@/lib/reflex/finding";
import { mirrorFinding } from "@/lib/reflex/mirror-finding";
import { computeResults } from "@/lib/results/compute-results";
import { advanceRound } from "@/lib/rounds/advance-round";
import { createDraft, saveDraft } from "@/lib/rounds/save-draft";
import { seededRandom } from "@/lib/statistics/random";
import { readAs, traitsOf } from "./demo-model";
import { DEMO_DEPARTMENT, DEMO_PASSWORD, DEMO_PEOPLE, type DemoPerson } from "./demo-people";
import { chooseItems, type DemoRound, demoRounds, type LibraryCase } from "./demo-rounds";

type Seeded = DemoPerson & Reader;
type Context = { trx: Knex.Transaction; lead: Actor; readers: Seeded[]; library: DemoCase[] };
type Actor = Parameters<typeof createDraft>[1];
type DemoCase = LibraryCase & { finding: Finding };

/** What the renderer wrote beside each picture, as far as the demo needs it. */
const DrawnCases = z.object({
  cases: z.array(
    z.object({ code: z.string(), file: z.string(), finding: FindingSchema, isAnchor: z.boolean(), note: z.string() }),
  ),
});

/**
 * Fills an empty database with the demo: an invented department, its people, the drawn cases, six released rounds, one
 * open and one draft. Rounds and readings go through the same services as the browser's, at times of their own.
 * One transaction: all of it or nothing. A database that has the demo already is left alone.
 */
export async function seedDemo(db: Knex, now = new Date()): Promise<void> {
  await db.transaction(async (trx) => {
    if (await trx("departments").where({ is_demo: true }).first("id")) return;
    const people = await insertPeople(trx);
    const lead = actorOf(people);
    const library = await insertLibrary(trx, lead, now);
    const readers = people.filter(({ habit }) => habit !== undefined);
    for (const [index, round] of demoRounds(now).entries()) {
      await playRound({ trx, lead, readers, library }, round, index, now);
    }
  });
}

async function insertPeople(trx: Knex.Transaction): Promise<Seeded[]> {
  const [department] = await trx("departments")
    .insert({ name: DEMO_DEPARTMENT.name, time_zone: DEMO_DEPARTMENT.timeZone, is_demo: true })
    .returning("id");
  const passwordHash = await hashPassword(DEMO_PASSWORD);
  const people: Seeded[] = [];
  for (const person of DEMO_PEOPLE) {
    const { name, email, roles } = person;
    const [row] = await trx("people").insert({ name, email, password_hash: passwordHash }).returning("id");
    await trx("memberships").insert({ person_id: row.id, department_id: department.id, roles });
    people.push({ ...person, id: row.id, departmentId: department.id });
  }
  return people;
}

function actorOf(people: Seeded[]): Actor {
  const lead = people.find(({ roles }) => roles.includes("lead"));
  if (!lead) throw new Error("The demo has no training lead.");
  return {
    id: lead.id,
    name: lead.name,
    email: lead.email,
    theme: "system",
    departmentId: lead.departmentId,
    departmentName: DEMO_DEPARTMENT.name,
    timeZone: DEMO_DEPARTMENT.timeZone,
    role: "lead",
    memberships: [],
  };
}

async function insertLibrary(trx: Knex.Transaction, lead: Actor, now: Date): Promise<DemoCase[]> {
  const library: DemoCase[] = [];
  const drawn = JSON.parse(await readFile(path.join(import.meta.dirname, "demo-cases.json"), "utf8"));
  for (const { code, file, finding, isAnchor, note } of DrawnCases.parse(drawn).cases) {
    const body = await readFile(path.join(import.meta.dirname, "photographs", file));
    const reference = { finding, basis: "construction" as const, uncertaintyDegrees: 0 };
    const input = { code, note, isAnchor, consent: "drawn" as const, reference };
    const id = await createCase(trx, lead, input, { body, name: `drawn-${file}` }, now);
    library.push({ id, isAnchor, finding: reference.finding });
  }
  return library;
}

/** Plays one round to its end, from the draft to the release, or as far as it has come by now. */
async function playRound(context: Context, round: DemoRound, index: number, now: Date): Promise<void> {
  const { trx, lead, readers } = context;
  const random = seededRandom(1000 + index);
  const drafted = new Date(Math.min(round.opensAt.getTime() - 3 * 86_400_000, now.getTime()));
  const roundId = await createDraft(trx, lead, round.title, drafted);
  const draft = {
    title: round.title,
    instructions: round.instructions,
    opensAt: round.opensAt.toISOString(),
    closesAt: round.closesAt.toISOString(),
    items: chooseItems(context.library, index),
    examinerIds: readers.map(({ id }) => id),
  };
  await saveDraft(trx, lead, roundId, draft, drafted);
  if (round.end === "draft") return;
  await advanceRound(trx, lead, roundId, "open", { now: drafted, random });
  for (const [order, reader] of readers.entries()) {
    const share = round.end === "released" ? 1 : (OPEN_SHARES[order] ?? 0);
    await readRound(context, { roundId, reader, round, index, share, random });
  }
  if (round.end === "open") return;
  await advanceRound(trx, lead, roundId, "closed", { now: round.closesAt });
  await computeResults(trx, roundId, "closed", new Date(round.closesAt.getTime() + 60_000));
  await advanceRound(trx, lead, roundId, "released", { now: new Date(round.closesAt.getTime() + 16 * 3_600_000) });
}

/** How much of the open round each examiner has read so far, in the order of the people. */
const OPEN_SHARES = [1, 0.3, 1, 0, 0.6, 0, 1, 0.9, 0, 0.5, 0];

type Sitting = {
  roundId: string;
  reader: Seeded;
  round: DemoRound;
  index: number;
  share: number;
  random: () => number;
};

async function readRound({ trx, library }: Context, sitting: Sitting): Promise<void> {
  const { roundId, reader, round, index, share, random } = sitting;
  if (!reader.habit || share === 0) return;
  const assignment = await trx("assignments").where({ round_id: roundId, person_id: reader.id }).first("id");
  const shown = await trx("assignment_items")
    .join("items", "items.id", "assignment_items.item_id")
    .where("assignment_items.assignment_id", assignment.id)
    .select("assignment_items.id", "items.case_id", "items.kind");
  const truthOf = new Map(shown.map(({ id, case_id, kind }) => [id, truthShown(library, case_id, kind)]));
  const items = await listDeskItems(trx, assignment.id);
  const traits = traitsOf(reader.habit, index);
  let at = round.opensAt.getTime() + (1 + 80 * random()) * 3_600_000;
  await trx("assignments")
    .where({ id: assignment.id })
    .update({ opened_at: new Date(at) });
  for (const item of items.slice(0, Math.round(share * items.length))) {
    const truth = truthOf.get(item.id);
    if (!truth) continue;
    const { finding, confidence, seconds } = readAs(truth, traits, random);
    at += 1000 * seconds;
    const input = { saveId: crypto.randomUUID(), revision: 1, finding, confidence, seconds };
    await saveReading(trx, reader, item.id, input, new Date(at));
  }
  if (share === 1) await submitRound(trx, reader, roundId, new Date(at + 60_000));
}

function truthShown(library: DemoCase[], caseId: string, kind: string): Finding | undefined {
  const finding = library.find(({ id }) => id === caseId)?.finding;
  return finding && kind === "mirrored" ? mirrorFinding(finding) : finding;
}
