import fc from "fast-check";
import type { Knex } from "knex";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type FindingColumns, fromFindingColumns, toFindingColumns } from "@/lib/findings/columns";
import { BEYOND_LIMBUS, type Finding, findingFaults, UNREADABLE_REASONS } from "@/lib/reflex/finding";
import { useDatabase } from "../../support/database";
import { showingIds } from "../../support/desk";
import {
  leftExo,
  makeCase,
  makeDepartment,
  makeDraft,
  makeOpenRound,
  makePerson,
  type TestPerson,
} from "../../support/world";
import { arbitraryFinding } from "../../unit/reflex/arbitrary-finding";

/** Columns with anything in them that their types allow. */
const eyes = ["none", "right", "left", "both", ""];
const directions = ["none", "eso", "exo", "hyper", "hypo", "up", ""];
const degrees = fc.oneof(fc.constantFrom(0, 1, 45, 46, -1, 32767), fc.integer({ min: -5, max: 60 }));
const nullable = <Value>(value: fc.Arbitrary<Value>) => fc.option(value, { nil: null, freq: 4 });
const anyColumns = {
  readable: fc.boolean(),
  unreadable_reason: nullable(fc.constantFrom(...UNREADABLE_REASONS, "tired", "")),
  eye: nullable(fc.constantFrom(...eyes)),
  horizontal: nullable(fc.constantFrom(...directions)),
  horizontal_degrees: nullable(degrees),
  horizontal_beyond: nullable(fc.boolean()),
  vertical: nullable(fc.constantFrom(...directions)),
  vertical_degrees: nullable(degrees),
  vertical_beyond: nullable(fc.boolean()),
};

/** Half of the rows near a finding, with up to three columns changed, and half anywhere: so that both answers come up. */
const arbitraryColumns: fc.Arbitrary<FindingColumns> = fc.oneof(
  fc.record(anyColumns),
  fc
    .tuple(arbitraryFinding, fc.record(anyColumns), fc.subarray(Object.keys(anyColumns), { maxLength: 3 }))
    .map(([finding, other, changed]) => {
      const row: Record<string, unknown> = { ...toFindingColumns(finding) };
      for (const column of changed) row[column] = other[column as keyof FindingColumns];
      return row as FindingColumns;
    }),
);

/** The rule of a row as the application has it: it stands for a finding, and that one breaks no rule. */
function isSound(row: FindingColumns): boolean {
  const rest = [row.eye, row.horizontal, row.horizontal_degrees, row.horizontal_beyond]
    .concat(row.vertical, row.vertical_degrees, row.vertical_beyond)
    .every((column) => column === null);
  const reason = UNREADABLE_REASONS.find((each) => each === row.unreadable_reason);
  if (!row.readable) return rest && reason !== undefined && findingFaults({ readable: false, reason }).length === 0;
  const eye = (["none", "right", "left"] as const).find((each) => each === row.eye);
  const horizontal = (["none", "eso", "exo"] as const).find((each) => each === row.horizontal);
  const vertical = (["none", "hyper", "hypo"] as const).find((each) => each === row.vertical);
  const { horizontal_beyond, vertical_beyond } = row;
  if (row.unreadable_reason !== null || !eye || !horizontal || !vertical) return false;
  if (horizontal_beyond === null || vertical_beyond === null) return false;
  // Beyond the limbus stands in place of a number, never beside one.
  if ((horizontal_beyond && row.horizontal_degrees !== null) || (vertical_beyond && row.vertical_degrees !== null)) {
    return false;
  }
  const finding: Finding = {
    readable: true,
    eye,
    horizontal,
    horizontalDegrees: horizontal_beyond ? BEYOND_LIMBUS : row.horizontal_degrees,
    vertical,
    verticalDegrees: vertical_beyond ? BEYOND_LIMBUS : row.vertical_degrees,
  };
  return findingFaults(finding).length === 0;
}

describe("the database's own constraints", () => {
  const db = useDatabase();
  let lead: TestPerson;
  let examiner: TestPerson;
  let caseId: string;
  let roundId: string;
  let itemId: string;
  let foreignLead: TestPerson;
  beforeAll(async () => {
    const departmentId = await makeDepartment(db());
    lead = await makePerson(db(), departmentId, ["lead"]);
    examiner = await makePerson(db(), departmentId, ["examiner"]);
    caseId = await makeCase(db(), lead, leftExo(20));
    roundId = await makeOpenRound(db(), lead, { examiners: [examiner], items: [{ caseId, kind: "first" }] });
    [itemId = ""] = await showingIds(db(), examiner, roundId);
    foreignLead = await makePerson(db(), await makeDepartment(db()), ["lead"]);
  });

  describe("of a finding", () => {
    const tables = {
      case_references: () => ({ case_id: caseId, revision: 2, basis: "panel" }),
      readings: () => {
        const now = new Date();
        const save = { save_id: crypto.randomUUID(), revision: 1, first_saved_at: now, saved_at: now };
        return { assignment_item_id: itemId, convention: "landmarks", ...save };
      },
    };
    let trx: Knex.Transaction;
    beforeAll(async () => {
      trx = await db().transaction();
    });
    afterAll(() => trx.rollback());
    /** Whether the table takes the row; by which constraint it does not. Nothing stays. */
    const attempt = async (table: keyof typeof tables, row: object): Promise<"taken" | string> => {
      await trx.raw("SAVEPOINT attempt");
      const outcome = await trx(table)
        .insert({ ...tables[table](), ...row })
        .returning("*")
        .then(
          ([stored]) => {
            // What is taken comes back as the finding it stands for; this throws for any other row.
            expect(toFindingColumns(fromFindingColumns(stored))).toEqual(row);
            return "taken";
          },
          (error: { constraint?: string; column?: string }) => String(error.constraint ?? error.column),
        );
      await trx.raw("ROLLBACK TO SAVEPOINT attempt");
      return outcome;
    };

    it.each(["case_references", "readings"] as const)(
      "lets %s hold a finding exactly when it breaks no rule",
      { timeout: 120_000 },
      async (table) => {
        const seen = { taken: 0, refused: 0 };
        await fc.assert(
          fc.asyncProperty(arbitraryColumns, async (row) => {
            const expected = isSound(row) ? "taken" : `${table}_finding`;
            seen[expected === "taken" ? "taken" : "refused"] += 1;
            expect(await attempt(table, row)).toBe(expected);
          }),
          { numRuns: 600 },
        );
        expect(Math.min(seen.taken, seen.refused)).toBeGreaterThan(50); // else the rows drawn would prove little
      },
    );
    it.each(["case_references", "readings"] as const)("lets %s hold every finding there is", async (table) => {
      await fc.assert(
        fc.asyncProperty(arbitraryFinding, async (finding) => {
          expect(await attempt(table, toFindingColumns(finding))).toBe("taken");
        }),
      );
    });
    it("refuses a row that does not say whether it is readable", async () => {
      for (const table of ["case_references", "readings"] as const) {
        expect(await attempt(table, { ...toFindingColumns(leftExo(20)), readable: null })).toBe("readable");
      }
    });
  });

  const refused = (constraint: string) => expect.objectContaining({ constraint });

  describe("of a round's state", () => {
    const steps = ["draft", "open", "closed", "released"];
    const stamps = (state: string) => ({
      state,
      opens_at: new Date(0),
      closes_at: new Date(1),
      published_at: state === "draft" ? null : new Date(),
      closed_at: ["closed", "released"].includes(state) ? new Date() : null,
      released_at: state === "released" ? new Date() : null,
    });
    const round = (state: string, number: number) =>
      db()("rounds")
        .insert({ department_id: lead.departmentId, number, title: "t", convention: "landmarks", ...stamps(state) })
        .returning("id");

    it.each(steps.flatMap((from, i) => steps.map((to, j) => [from, to, j - i === 0 || j - i === 1] as const)))(
      "from %s to %s: allowed is %s",
      async (from, to, isAllowed) => {
        const [row] = await round(from, 1000 + 10 * steps.indexOf(from) + steps.indexOf(to));
        const moving = db()("rounds").where({ id: row.id }).update(stamps(to));
        if (isAllowed) await moving;
        else await expect(moving).rejects.toThrow(`a round that is ${from} cannot become ${to}`);
        expect(await db()("rounds").where({ id: row.id }).first("state")).toEqual({ state: isAllowed ? to : from });
      },
    );
    it("needs the times that go with it", async () => {
      const [row] = await round("open", 2000);
      const set = (changes: object) => db()("rounds").where({ id: row.id }).update(changes);
      await expect(set({ state: "closed" })).rejects.toEqual(refused("rounds_closed"));
      await expect(set({ released_at: new Date() })).rejects.toEqual(refused("rounds_released"));
      await expect(set({ published_at: null })).rejects.toEqual(refused("rounds_published"));
      await expect(set({ closes_at: null })).rejects.toEqual(refused("rounds_published"));
      await expect(set({ closes_at: new Date(0) })).rejects.toEqual(refused("rounds_window"));
      await expect(set({ state: "paused" })).rejects.toEqual(refused("rounds_state"));
    });
  });

  describe("between departments", () => {
    it("refuses another department's case in a round", async () => {
      const foreignCase = await makeCase(db(), foreignLead, leftExo(20));
      const draft = await makeDraft(db(), lead, { examiners: [], items: [] });
      const item = { round_id: draft, case_id: foreignCase, position: 1 };
      for (const { departmentId } of [lead, foreignLead]) {
        const inserting = db()("items").insert({ ...item, department_id: departmentId });
        await expect(inserting).rejects.toMatchObject({ code: "23503" }); // foreign key, whichever side is lied about
      }
    });
    it("refuses another department's examiner in a round", async () => {
      const foreign = await makePerson(db(), foreignLead.departmentId, ["examiner"]);
      const assignment = { round_id: roundId, person_id: foreign.id, assigned_as: "examiner" };
      for (const { departmentId } of [lead, foreignLead]) {
        const inserting = db()("assignments").insert({ ...assignment, department_id: departmentId });
        await expect(inserting).rejects.toMatchObject({ code: "23503" });
      }
    });
    it("refuses a case with another department's photograph", async () => {
      const photograph = await db()("photographs").where({ department_id: lead.departmentId }).first("id");
      const borrowed = { department_id: foreignLead.departmentId, code: "X", photograph_id: photograph.id };
      await expect(db()("cases").insert(borrowed)).rejects.toMatchObject({ code: "23503" });
    });
  });

  describe("of what may be there once", () => {
    const duplicate = (constraint: string) => expect.objectContaining({ code: "23505", constraint });
    it("keeps one reading for a showing, one place for an item, one first showing of a case, one result a revision", async () => {
      const [showing] = await db()("assignment_items").where({ id: itemId });
      const { id: _, ...again } = showing;
      await expect(db()("assignment_items").insert({ ...again, place: 2 })).rejects.toEqual(
        duplicate("assignment_items_assignment_id_item_id_unique"),
      );
      const { id: __, picture_key: ___, ...item } = await db()("items").where({ round_id: roundId }).first();
      await expect(db()("items").insert({ ...item, position: 2 })).rejects.toEqual(duplicate("items_first_once"));
      const [person] = await db()("assignments").where({ round_id: roundId });
      const { id: ____, ...assigned } = person;
      await expect(db()("assignments").insert(assigned)).rejects.toEqual(
        duplicate("assignments_round_id_person_id_unique"),
      );
      const result = {
        round_id: roundId,
        revision: 1,
        method_version: "1",
        reason: "t",
        panel: "{}",
        computed_at: new Date(),
      };
      await db()("results").insert(result);
      await expect(db()("results").insert(result)).rejects.toEqual(duplicate("results_round_id_revision_unique"));
    });
    it("keeps an e-mail address for one person, in capitals too", async () => {
      const row = { name: "Twin", email: lead.email.toUpperCase(), password_hash: "none" };
      await expect(db()("people").insert(row)).rejects.toEqual(duplicate("people_email_unique"));
    });
    it("keeps a reference's revision and a round's number", async () => {
      const row = { case_id: caseId, revision: 1, basis: "panel", ...toFindingColumns(leftExo(20)) };
      await expect(db()("case_references").insert(row)).rejects.toEqual(
        duplicate("case_references_case_id_revision_unique"),
      );
      const { number } = await db()("rounds").where({ id: roundId }).first();
      const round = { department_id: lead.departmentId, number, title: "t", convention: "landmarks" };
      await expect(db()("rounds").insert(round)).rejects.toEqual(duplicate("rounds_department_id_number_unique"));
    });
  });

  it.each<[string, object, string]>([
    ["departments", { name: "d", time_zone: "UTC", convention: "guess" }, "departments_convention"],
    ["departments", { name: "d", time_zone: "UTC", convention: "own" }, "departments_own_figure"],
    ["departments", { name: "d", time_zone: "UTC", own_degrees_per_mm: 7 }, "departments_own_figure"],
    [
      "departments",
      { name: "d", time_zone: "UTC", convention: "own", own_degrees_per_mm: 0 },
      "departments_own_figure",
    ],
    ["departments", { name: "d", time_zone: "UTC", kappa_floor: 1.01 }, "departments_kappa_floor"],
    ["people", { name: "  ", email: "blank@test.example", password_hash: "none" }, "people_name"],
    ["people", { name: "p", email: "sepia@test.example", password_hash: "none", theme: "sepia" }, "people_theme"],
  ])("refuses in %s: %o", async (table, row, constraint) => {
    await expect(db()(table).insert(row)).rejects.toEqual(refused(constraint));
  });
  it.each([[[]], [["owner"]], [["lead", "owner"]]])("refuses a membership with the roles %o", async (roles) => {
    const row = { person_id: foreignLead.id, department_id: lead.departmentId, roles };
    await expect(db()("memberships").insert(row)).rejects.toEqual(refused("memberships_roles"));
  });
});
