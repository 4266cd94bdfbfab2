import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { crossTable } from "@/lib/statistics/cross-table";
import { InputError } from "@/lib/statistics/result";

const reading = fc.option(fc.constantFrom("aligned", "R eso", "L exo"), { freq: 3 });
const pairs = fc.array(fc.tuple(reading, reading), { minLength: 1, maxLength: 30 });

describe("crossTable", () => {
  it("puts the first readings in the rows and the second in the columns", () => {
    const first = ["eso", "eso", "exo", "exo", "exo"];
    const second = ["eso", "exo", "exo", "exo", "eso"];
    expect(crossTable(first, second)).toEqual({
      ok: true,
      n: 5,
      counts: [
        [1, 1],
        [1, 2],
      ],
    });
  });

  it("keeps the order and the unused ones of the categories offered", () => {
    const table = crossTable(["exo"], ["eso"], ["exo", "aligned", "eso"]);
    expect(table).toEqual({
      ok: true,
      n: 1,
      counts: [
        [0, 0, 1],
        [0, 0, 0],
        [0, 0, 0],
      ],
    });
  });

  it("orders numbers by size, not as text, when no categories are offered", () => {
    expect(crossTable([9, 10, 10], [9, 9, 10])).toMatchObject({
      counts: [
        [1, 0],
        [1, 1],
      ],
    });
  });

  it("keeps a number and the text of it apart", () => {
    expect(crossTable([1], ["1"])).toMatchObject({
      counts: [
        [0, 1],
        [0, 0],
      ],
    });
  });

  it("does not make a category of a label that only a dropped pair has", () => {
    expect(crossTable(["a", "b", null], ["a", null, "c"])).toEqual({ ok: true, n: 1, counts: [[1]] });
  });

  it("says that there is nothing to count", () => {
    const refusal = { ok: false, n: 0, reason: "no case was read both times" };
    expect(crossTable([], [])).toEqual(refusal);
    expect(crossTable([null, "a"], ["a", null])).toEqual(refusal);
    expect(crossTable([], [], ["a", "b"])).toEqual(refusal);
  });

  it("counts every pair in exactly its own cell", () => {
    fc.assert(
      fc.property(pairs, (cases) => {
        const categories = ["L exo", "aligned", "R eso"];
        const kept = cases.filter(([a, b]) => a !== null && b !== null);
        const counts = categories.map((row) =>
          categories.map((column) => kept.filter(([a, b]) => a === row && b === column).length),
        );
        const table = crossTable(
          Object.freeze(cases.map(([a]) => a)),
          Object.freeze(cases.map(([, b]) => b)),
          Object.freeze(categories),
        );
        expect(table).toMatchObject(kept.length > 0 ? { ok: true, n: kept.length, counts } : { ok: false, n: 0 });
      }),
    );
  });

  it("gives the same table with and without the pairs that miss a reading", () => {
    fc.assert(
      fc.property(pairs, (cases) => {
        const kept = cases.filter(([a, b]) => a !== null && b !== null);
        const whole = crossTable(
          cases.map(([a]) => a),
          cases.map(([, b]) => b),
        );
        expect(whole).toEqual(
          crossTable(
            kept.map(([a]) => a),
            kept.map(([, b]) => b),
          ),
        );
      }),
    );
  });

  it.each([
    ["unequal lengths", () => crossTable(["a"], ["a", "b"])],
    ["a label that was not offered", () => crossTable(["a"], ["b"], ["a"])],
    ["a label that was not offered, in a dropped pair", () => crossTable(["a", "b"], ["a", null], ["a"])],
    ["a category offered twice", () => crossTable(["a"], ["a"], ["a", "a"])],
    ["a label that is no number", () => crossTable([Number.NaN], [1])],
    ["a category that is no number", () => crossTable([1], [1], [1, Number.NaN])],
    ["an endless label", () => crossTable([1], [Number.POSITIVE_INFINITY])],
  ])("refuses %s as the caller's mistake", (_, call) => {
    expect(call).toThrow(InputError);
  });
});
