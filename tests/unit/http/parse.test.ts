import { describe, expect, it } from "vitest";
import { z } from "zod";
import { parseJson, parsePath, parseQuery, parseShape } from "@/lib/http/parse";

const Body = z.strictObject({
  title: z.string().min(1),
  items: z.array(z.strictObject({ "a/b~c": z.number() })).default([]),
});
const post = (body: string, headers: Record<string, string> = {}) =>
  new Request("http://localhost/", { method: "POST", body, headers });
const pointersOf = (value: unknown) => {
  try {
    parseShape(value, Body);
  } catch (error) {
    return error instanceof Error && "fields" in error ? error.fields : error;
  }
  return [];
};

describe("parseJson", () => {
  it("gives the body in its shape, with what the shape fills in", async () => {
    expect(await parseJson(post('{"title":"t"}'), Body)).toEqual({ title: "t", items: [] });
  });
  it.each(["", "{", "title=1", "\u0000", '{"title":"t"} {}'])("is malformed for what is not JSON: %j", async (body) => {
    await expect(parseJson(post(body), Body)).rejects.toMatchObject({ kind: "malformed", code: "not-json" });
  });
  it("is too large beyond 1 MB by its announced length, before it is read", async () => {
    const announced = (length: string) => post('{"title":"t"}', { "content-length": length });
    await expect(parseJson(announced("1000001"), Body)).rejects.toMatchObject({ kind: "too-large" });
    expect(await parseJson(announced("1000000"), Body)).toMatchObject({ title: "t" });
  });
});

describe("parseShape", () => {
  it("points at every field that is wrong, in the notation of RFC 6901", () => {
    expect(pointersOf({ title: "", items: [{ "a/b~c": 1 }, { "a/b~c": "2" }] })).toMatchObject([
      { pointer: "#/title" },
      { pointer: "#/items/1/a~1b~0c" },
    ]);
  });
  it("points at the whole for a field that does not exist, and names it", () => {
    expect(pointersOf({ title: "t", titel: "t" })).toMatchObject([
      { pointer: "#", detail: expect.stringContaining("titel") },
    ]);
    expect(pointersOf([])).toMatchObject([{ pointer: "#" }]);
    expect(pointersOf(undefined)).toMatchObject([{ pointer: "#" }]);
  });
  it("refuses U+0000 wherever it stands, and no other character", () => {
    expect(pointersOf({ title: "a\u0000" })).toMatchObject([{ pointer: "#/title" }]);
    const Deep = z.object({ list: z.array(z.object({ text: z.string().nullable() })) });
    const deep = (text: string | null) => ({ list: [{ text: null }, { text }] });
    expect(() => parseShape(deep("\u0000"), Deep)).toThrow(
      expect.objectContaining({ fields: [expect.objectContaining({ pointer: "#/list/1/text" })] }),
    );
    expect(parseShape(deep("\u0001 \uFFFF é 👁"), Deep)).toEqual(deep("\u0001 \uFFFF é 👁"));
  });
});

describe("parsePath", () => {
  const Params = z.object({ caseId: z.uuid() });
  it("answers an id of the wrong shape like a missing row", () => {
    for (const params of [{ caseId: "1" }, { caseId: ["a"] }, {}, undefined]) {
      expect(() => parsePath(params, Params, "case")).toThrow(expect.objectContaining({ kind: "not-found" }));
    }
    const caseId = crypto.randomUUID();
    expect(parsePath({ caseId }, Params)).toEqual({ caseId });
  });
});

describe("parseQuery", () => {
  const Query = z.strictObject({ q: z.string().default("") });
  const get = (query: string) => new Request(`http://localhost/?${query}`);
  it("decodes what the address says, and refuses what the shape does not name", () => {
    expect(parseQuery(get("q=a%20%26+b"), Query)).toEqual({ q: "a & b" });
    expect(parseQuery(get(""), Query)).toEqual({ q: "" });
    expect(() => parseQuery(get("query=a"), Query)).toThrow(expect.objectContaining({ kind: "invalid" }));
    expect(() => parseQuery(get("q=%00"), Query)).toThrow(expect.objectContaining({ kind: "invalid" }));
  });
});
