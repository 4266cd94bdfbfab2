import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { ROLES } from "@/lib/auth/roles";
import { readView, writeView } from "@/lib/auth/view";

describe("the cookie of a view", () => {
  it("reads back what was written", () => {
    fc.assert(
      fc.property(fc.uuid(), fc.constantFrom(...ROLES), (departmentId, role) => {
        expect(readView(writeView({ departmentId, role }))).toEqual({ departmentId, role });
      }),
    );
  });
  it("is no view at all for anything that was not written so", () => {
    const department = "00000000-0000-4000-8000-000000000001";
    for (const text of [undefined, "", ".", department, `${department}.`, `${department}.owner`, `.lead`, `1.lead`]) {
      expect(readView(text)).toBeNull();
    }
    fc.assert(
      fc.property(fc.string(), (text) => {
        expect(readView(text)).toBeNull();
      }),
    );
  });
});
