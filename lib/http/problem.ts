import { AppError, type ErrorKind } from "@/lib/errors";

const KINDS: Record<ErrorKind, { status: number; title: string }> = {
  malformed: { status: 400, title: "The request could not be read" },
  unauthenticated: { status: 401, title: "Sign in first" },
  forbidden: { status: 403, title: "Not for this role" },
  "not-found": { status: 404, title: "Not found" },
  conflict: { status: 409, title: "Not possible now" },
  "too-large": { status: 413, title: "Too large" },
  "unsupported-media": { status: 415, title: "Not a kind of file that can be used" },
  invalid: { status: 422, title: "Something needs to be changed" },
  unavailable: { status: 503, title: "Not available at the moment" },
};

/**
 * Answers an error as application/problem+json (RFC 9457). A foreseen error names its type, which clients switch on;
 * anything else is an about:blank 500 that tells nothing of the inside. The request id ties it to the log.
 */
export function problemResponse(error: unknown, instance: string, requestId: string): Response {
  const body =
    error instanceof AppError
      ? {
          type: `/problems/${error.code}`,
          title: KINDS[error.kind].title,
          status: KINDS[error.kind].status,
          detail: error.message,
          instance,
          requestId,
          ...(error.fields.length > 0 && { errors: error.fields }),
        }
      : { type: "about:blank", title: "Something went wrong here", status: 500, instance, requestId };
  return Response.json(body, {
    status: body.status,
    headers: { "Content-Type": "application/problem+json", "Cache-Control": "no-store", "X-Request-Id": requestId },
  });
}
