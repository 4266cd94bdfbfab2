import { notFound } from "next/navigation";
import type { z } from "zod";
import { AppError } from "@/lib/errors";

/** Path parameters of a page; of the wrong shape they name nothing. */
export function pageParams<Schema extends z.ZodType>(params: unknown, schema: Schema): z.infer<Schema> {
  const parsed = schema.safeParse(params);
  return parsed.success ? parsed.data : notFound();
}

/** What a service found for a page; a row that is missing or not the caller's shows the page for it. */
export async function pageResult<Value>(loading: Promise<Value>): Promise<NonNullable<Value>> {
  const value = await loading.catch((error: unknown) => {
    if (error instanceof AppError && error.kind === "not-found") return null;
    throw error;
  });
  return value ?? notFound();
}
