import { z } from "zod";

const ProblemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number(),
  detail: z.string().optional(),
  requestId: z.string().optional(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
});
export type Problem = z.infer<typeof ProblemSchema>;

/** Every failed request in the browser, a lost connection included, in the one shape that screens show. */
export class ProblemError extends Error {
  override readonly name = "ProblemError";
  constructor(readonly problem: Problem) {
    super(problem.detail ?? problem.title);
  }
  /** What is wrong with one field, or undefined. */
  fieldError(field: string): string | undefined {
    return this.problem.errors?.find(({ pointer }) => pointer === `#/${field}`)?.detail;
  }
}

const OFFLINE: Problem = {
  type: "/problems/no-connection",
  title: "No connection",
  status: 0,
  detail: "The server cannot be reached. Nothing you entered is lost; try again when the line is back.",
};

async function request(url: string, init?: RequestInit): Promise<unknown> {
  let response: Response;
  try {
    response = await fetch(url, { ...init, headers: { Accept: "application/json", ...init?.headers } });
  } catch {
    throw new ProblemError(OFFLINE);
  }
  const body: unknown = await response.json().catch(() => null);
  if (response.ok) return body;
  const problem = ProblemSchema.safeParse(body);
  throw new ProblemError(
    problem.success ? problem.data : { type: "about:blank", title: "Something went wrong", status: response.status },
  );
}

/** Fetches JSON and holds it to a schema, so that a screen never draws something it does not understand. */
export async function fetchJson<Schema extends z.ZodType>(url: string, schema: Schema): Promise<z.infer<Schema>> {
  return schema.parse(await request(url));
}

/** Sends JSON and reads the answer as the schema says. Throws ProblemError. */
export async function sendJson<Schema extends z.ZodType>(
  method: "POST" | "PUT" | "PATCH" | "DELETE",
  url: string,
  body: unknown,
  schema: Schema,
): Promise<z.infer<Schema>> {
  const init = { method, body: JSON.stringify(body), headers: { "Content-Type": "application/json" } };
  return schema.parse(await request(url, init));
}

/** Sends a form with a file. Throws ProblemError. */
export async function sendForm<Schema extends z.ZodType>(
  method: "POST" | "PUT",
  url: string,
  form: FormData,
  schema: Schema,
): Promise<z.infer<Schema>> {
  return schema.parse(await request(url, { method, body: form }));
}

export function asProblemError(error: unknown): ProblemError {
  if (error instanceof ProblemError) return error;
  return new ProblemError({ type: "about:blank", title: "Something went wrong", status: 0 });
}
