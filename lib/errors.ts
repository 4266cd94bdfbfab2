export type ErrorKind =
  | "malformed"
  | "unauthenticated"
  | "forbidden"
  | "not-found"
  | "conflict"
  | "invalid"
  | "too-large"
  | "unsupported-media"
  | "unavailable";

/** What is wrong with one field: an RFC 6901 pointer into what was sent, and a sentence that says what to change. */
export type FieldError = { pointer: string; detail: string };

/** A failure that was foreseen. The message is safe to show and says what the person can do. */
export class AppError extends Error {
  override readonly name = "AppError";
  constructor(
    readonly kind: ErrorKind,
    /** Kebab-case; clients switch on it, so it never changes once used. */
    readonly code: string,
    message: string,
    readonly fields: FieldError[] = [],
  ) {
    super(message);
  }
}

/** A row that is missing and a row the caller may not see answer alike. */
export function notFound(what: string): AppError {
  return new AppError("not-found", "not-found", `There is no such ${what} here.`);
}

export function conflict(code: string, message: string): AppError {
  return new AppError("conflict", code, message);
}

export function invalid(message: string, fields: FieldError[] = [], code = "invalid-input"): AppError {
  return new AppError("invalid", code, message, fields);
}

export function invalidField(field: string, detail: string, code = "invalid-input"): AppError {
  return invalid(detail, [{ pointer: `#/${field}`, detail }], code);
}
