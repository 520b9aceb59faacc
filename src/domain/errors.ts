/**
 * The one grammar of failure. A code is what a caller may act on; the message
 * is for logs and developers and is never shown to a person as it stands.
 */
export type ErrorCode =
  | "INVALID_INPUT"
  | "INVALID_RANGE"
  | "INVALID_READING"
  | "UNAUTHENTICATED"
  | "FORBIDDEN"
  | "NOT_FOUND"
  | "CONFLICT"
  | "STALE"
  | "GATE_CLOSED"
  | "TOO_LARGE"
  | "TOO_MANY"
  | "UNAVAILABLE";

/** A refusal with a code, and where a form caused it, the fields that must change. */
export class AppError extends Error {
  override readonly name = "AppError";

  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly fields?: Readonly<Record<string, string[]>>,
  ) {
    super(message);
  }
}
