import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { arrangePanel, type LongReading } from "@/lib/agree/long-table";
import { TableError } from "@/lib/agree/table-error";

function readings(
  ...lines: [name: string, examiner: string, value: number | null, round?: string][]
): LongReading<number>[] {
  return lines.map(([name, examiner, value, round], index) => ({
    line: index + 2,
    case: name,
    examiner,
    round: round ?? null,
    value,
  }));
}

describe("arrangePanel", () => {
  it("makes rows of cases and columns of examiners, with gaps where nobody read", () => {
    const panel = arrangePanel(
      readings(["x", "B", 1], ["y", "A", 2], ["x", "A", null], ["y", "reference", 3], ["z", "reference", 4]),
    );
    expect(panel).toEqual({
      examiners: ["B", "A"],
      rounds: [],
      rows: [
        { case: "x", round: null },
        { case: "y", round: null },
      ],
      readings: [
        [1, null],
        [null, 2],
      ],
      repeats: [
        [[1], []],
        [[], [2]],
      ],
      references: [null, 3],
    });
  });

  it("keeps a second reading as a repeat", () => {
    const panel = arrangePanel(readings(["x", "A", 1], ["x", "A", 2], ["x", "A", null], ["x", "A", 3]));
    expect(panel.readings).toEqual([[1]]);
    expect(panel.repeats).toEqual([[[1, 2, 3]]]);
    expect(panel.references).toBeNull();
  });

  it("reads a case of each round apart, against the reference of that round or of all", () => {
    const panel = arrangePanel(
      readings(
        ["x", "A", 1, "2"],
        ["x", "A", 5, "1"],
        ["y", "A", 6, "1"],
        ["x", "reference", 7],
        ["x", "Reference", 8, "1"],
        ["y", "reference", 9, "2"],
      ),
    );
    expect(panel.rounds).toEqual(["1", "2"]);
    expect(panel.rows.map((row) => [row.case, row.round])).toEqual([
      ["x", "2"],
      ["x", "1"],
      ["y", "1"],
    ]);
    expect(panel.references).toEqual([7, 8, null]);
  });

  it("leaves rounds that are not numbers in the order of the table", () => {
    expect(arrangePanel(readings(["x", "A", 1, "spring"], ["x", "A", 1, "autumn"])).rounds).toEqual([
      "spring",
      "autumn",
    ]);
  });

  it("loses no reading, whatever the order of the lines", () => {
    const line = fc.tuple(fc.constantFrom("x", "y", "z"), fc.constantFrom("A", "B"), fc.option(fc.integer()));
    fc.assert(
      fc.property(fc.array(line, { minLength: 1 }), (lines) => {
        const panel = arrangePanel(readings(...lines));
        const given = lines.flatMap(([, , value]) => (value === null ? [] : [value]));
        expect(panel.repeats.flat(2).toSorted()).toEqual(given.toSorted());
        for (const [name, examiner, value] of lines) {
          const row = panel.rows.findIndex((candidate) => candidate.case === name);
          const own = panel.repeats[row]?.[panel.examiners.indexOf(examiner)] ?? [];
          if (value !== null) expect(own).toContain(value);
        }
      }),
    );
  });

  it("refuses two references of one case, and readings of nobody", () => {
    const twice = () => arrangePanel(readings(["x", "reference", 1], ["x", "A", 1], ["x", "reference", 1]));
    expect(twice).toThrow(TableError);
    expect(() => arrangePanel(readings(["x", "reference", 1]))).toThrow(TableError);
  });
});
