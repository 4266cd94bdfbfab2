import type { z } from "zod";
import { AppError, type FieldError, invalid, notFound } from "@/lib/errors";

const JSON_BYTES_MAX = 1_000_000;

/** The body as JSON of the given shape. Not JSON: 400; too long: 413; wrong shape: 422 with a pointer to each field. */
export async function parseJson<Schema extends z.ZodType>(request: Request, schema: Schema): Promise<z.infer<Schema>> {
  if (Number(request.headers.get("content-length") ?? 0) > JSON_BYTES_MAX) {
    throw new AppError("too-large", "body-too-large", "The request is longer than 1 MB.");
  }
  let body: unknown;
  try {
    body = await request.json();
  } catch {
    throw new AppError("malformed", "not-json", "The request is not JSON.");
  }
  return parseShape(body, schema);
}

export function parseShape<Schema extends z.ZodType>(value: unknown, schema: Schema): z.infer<Schema> {
  const parsed = schema.safeParse(value);
  const faults = parsed.success ? unstorableTexts(parsed.data) : parsed.error.issues;
  if (parsed.success && faults.length === 0) return parsed.data;
  throw invalid("Some fields need to be changed.", faults.map(toFieldError));
}

/** Path parameters. An id of the wrong shape names nothing, so it answers like a missing row. */
export function parsePath<Schema extends z.ZodType>(params: unknown, schema: Schema, what = "page"): z.infer<Schema> {
  const parsed = schema.safeParse(params);
  if (parsed.success) return parsed.data;
  throw notFound(what);
}

/** The query string. Parameters the schema does not name are refused, so that a misspelt filter is heard. */
export function parseQuery<Schema extends z.ZodType>(request: Request, schema: Schema): z.infer<Schema> {
  return parseShape(Object.fromEntries(new URL(request.url).searchParams), schema);
}

type Fault = { path: readonly PropertyKey[]; message: string };

function toFieldError({ path, message }: Fault): FieldError {
  const steps = path.map((step) => `/${String(step).replaceAll("~", "~0").replaceAll("/", "~1")}`);
  return { pointer: `#${steps.join("")}`, detail: message };
}

/** JSON can carry the character U+0000 and PostgreSQL cannot store it: without this it would end in a 500. */
function unstorableTexts(value: unknown, path: readonly string[] = []): Fault[] {
  if (typeof value === "string") {
    return value.includes("\0") ? [{ path, message: "This text holds a character that cannot be stored." }] : [];
  }
  if (typeof value !== "object" || value === null) return [];
  return Object.entries(value).flatMap(([name, part]) => unstorableTexts(part, [...path, name]));
}
