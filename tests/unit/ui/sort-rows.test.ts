import { describe, expect, it } from "vitest";
import { nextSort, type SortValue, sortRows } from "@/components/ui/sort-rows";

const rows = (...values: SortValue[]) => values.map((value, index) => ({ id: index, sortValues: { value } }));
const order = (direction: "ascending" | "descending", ...values: SortValue[]) =>
  sortRows(rows(...values), { key: "value", direction }).map((row) => row.sortValues.value);

describe("sortRows", () => {
  it("keeps rows without a value last in both directions", () => {
    // Too few to say is not a low kappa, and must not head the list of either the worst or the best.
    expect(order("ascending", null, 0.9, 0.2)).toEqual([0.2, 0.9, null]);
    expect(order("descending", null, 0.2, 0.9)).toEqual([0.9, 0.2, null]);
  });
  it("orders numbers inside text as people count", () => {
    expect(order("ascending", "Case 10", "case 9")).toEqual(["case 9", "Case 10"]);
  });
  it("orders negative numbers by value", () => {
    expect(order("ascending", 3, -10, -2)).toEqual([-10, -2, 3]);
  });
  it("keeps equal rows in the order they came in, in both directions", () => {
    for (const direction of ["ascending", "descending"] as const) {
      expect(sortRows(rows(1, 1, 1), { key: "value", direction }).map((row) => row.id)).toEqual([0, 1, 2]);
    }
  });
  it("leaves the given array alone", () => {
    const given = rows(2, 1);
    sortRows(given, { key: "value", direction: "ascending" });
    expect(given.map((row) => row.id)).toEqual([0, 1]);
  });
});

describe("nextSort", () => {
  it("starts rising on a new column and turns round on the same one", () => {
    const first = nextSort({ key: "other", direction: "ascending" }, "kappa");
    expect(first).toEqual({ key: "kappa", direction: "ascending" });
    expect(nextSort(first, "kappa").direction).toBe("descending");
    expect(nextSort(nextSort(first, "kappa"), "kappa").direction).toBe("ascending");
  });
});
