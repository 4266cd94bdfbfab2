import { describe, expect, it } from "vitest";
import { AppError, conflict, type ErrorKind, invalidField, notFound } from "@/lib/errors";
import { problemResponse } from "@/lib/http/problem";

const answer = async (error: unknown) => {
  const response = problemResponse(error, "/api/rounds/1", "request-1");
  return { response, body: await response.json() };
};

describe("problemResponse", () => {
  it.each<[ErrorKind, number]>([
    ["malformed", 400],
    ["unauthenticated", 401],
    ["forbidden", 403],
    ["not-found", 404],
    ["conflict", 409],
    ["too-large", 413],
    ["unsupported-media", 415],
    ["invalid", 422],
    ["unavailable", 503],
  ])("answers %s with %d, in the body and on the line", async (kind, status) => {
    const { response, body } = await answer(new AppError(kind, "some-code", "What to do."));
    expect(response.status).toBe(status);
    expect(body).toEqual({
      type: "/problems/some-code",
      title: expect.stringMatching(/\w/),
      status,
      detail: "What to do.",
      instance: "/api/rounds/1",
      requestId: "request-1",
    });
    expect(Object.fromEntries(response.headers)).toEqual({
      "content-type": "application/problem+json",
      "cache-control": "no-store",
      "x-request-id": "request-1",
    });
  });
  it("has one title for each kind, whatever happened", async () => {
    const titles = await Promise.all(
      [conflict("a", "One."), conflict("b", "Two."), notFound("case")].map(
        async (error) => (await answer(error)).body.title,
      ),
    );
    expect(titles[0]).toBe(titles[1]);
    expect(titles[2]).not.toBe(titles[0]);
  });
  it("lists the fields that need to be changed, when there are any", async () => {
    const { body } = await answer(invalidField("closesAt", "Later."));
    expect(body.errors).toEqual([{ pointer: "#/closesAt", detail: "Later." }]);
    expect(Object.keys((await answer(notFound("case"))).body)).not.toContain("errors");
  });
  it.each([
    new Error("password authentication failed for user evenglint"),
    Object.assign(new Error("select * from people"), { code: "42P01", detail: "secret", status: 200 }),
    "a text that was thrown",
    { kind: "not-found", code: "not-found", message: "looks like one of ours", fields: [] },
    null,
    undefined,
  ])("tells nothing of a failure that was not foreseen: %s", async (error) => {
    const { response, body } = await answer(error);
    expect(response.status).toBe(500);
    expect(body).toEqual({
      type: "about:blank",
      title: "Something went wrong here",
      status: 500,
      instance: "/api/rounds/1",
      requestId: "request-1",
    });
  });
});
