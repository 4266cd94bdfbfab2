import { describe, expect, it } from "vitest";
import { currentHref } from "@/components/shell/current-href";

describe("currentHref", () => {
  it("keeps the page above lit on the pages below it", () => {
    expect(currentHref(["/desk", "/rounds"], "/rounds/12/results")).toBe("/rounds");
  });
  it("takes the nearest of two pages above", () => {
    expect(currentHref(["/rounds", "/rounds/archive"], "/rounds/archive/3")).toBe("/rounds/archive");
  });
  it("does not take a page whose name only begins alike", () => {
    expect(currentHref(["/case"], "/cases")).toBeNull();
  });
});
