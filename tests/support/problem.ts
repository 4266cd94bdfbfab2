import { expect } from "vitest";
import { z } from "zod";
import type { Called } from "./call-route";

const Problem = z.strictObject({
  type: z.string(),
  title: z.string().min(1),
  status: z.number(),
  detail: z.string().min(1),
  instance: z.string().startsWith("/"),
  requestId: z.uuid(),
  errors: z.array(z.strictObject({ pointer: z.string(), detail: z.string().min(1) })).optional(),
});

/** Holds an answer to the problem of this status and code, in the one form of RFC 9457, and gives it. */
export function expectProblem(called: Called, status: number, code: string): z.infer<typeof Problem> {
  expect({ status: called.status, body: called.body }).toMatchObject({ status, body: { type: `/problems/${code}` } });
  expect(called.headers.get("content-type")).toBe("application/problem+json");
  expect(called.headers.get("cache-control")).toBe("no-store");
  const problem = Problem.parse(called.body);
  expect(problem.status).toBe(status);
  expect(called.headers.get("x-request-id")).toBe(problem.requestId);
  return problem;
}

/** Holds an answer to a 422 that names exactly these fields. */
export function expectFieldErrors(called: Called, pointers: string[], code = "invalid-input"): void {
  const { errors = [] } = expectProblem(called, 422, code);
  expect(errors.map(({ pointer }) => pointer).sort()).toEqual([...pointers].sort());
}

/** A failure that was not foreseen: no word of what happened inside, only the id to find it in the log by. */
export function expectUnforeseen(called: Called): void {
  expect(called.status).toBe(500);
  expect(called.headers.get("content-type")).toBe("application/problem+json");
  const title = "Something went wrong here";
  expect(called.body).toEqual({
    type: "about:blank",
    title,
    status: 500,
    instance: expect.any(String),
    requestId: expect.any(String),
  });
}
