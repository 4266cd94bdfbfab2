import type { Knex } from "knex";
import { listDeskItems } from "@/lib/desk/queries";
import { leftExo, type TestPerson } from "./world";

/** The ids of a person's showings in a round, in the order of reading. */
export async function showingIds(db: Knex, person: TestPerson, roundId: string): Promise<string[]> {
  const assignment = await db("assignments").where({ round_id: roundId, person_id: person.id }).first("id");
  return (await listDeskItems(db, assignment.id)).map(({ id }) => id);
}

/** A save as the desk sends it; each has a name of its own unless it is given one. */
export function readingInput(changes: Record<string, unknown> = {}) {
  return { saveId: crypto.randomUUID(), revision: 1, finding: leftExo(20), confidence: null, seconds: 4.5, ...changes };
}
