import { env } from "@/env";

type Level = "debug" | "info" | "warn" | "error";
const ORDER: Record<Level, number> = { debug: 0, info: 1, warn: 2, error: 3 };

/**
 * One line of JSON on standard output. Fields are ids, codes, counts and
 * durations; never a secret, an e-mail address, a note or a glucose value.
 */
export function logEvent(level: Level, event: string, fields: Record<string, string | number | boolean | null> = {}): void {
  if (ORDER[level] < ORDER[env.logLevel]) return;
  process.stdout.write(`${JSON.stringify({ at: new Date().toISOString(), level, event, ...fields })}\n`);
}

/** The shape of an unexpected error without its message, which may quote a person's data. */
export function errorFields(error: unknown): Record<string, string> {
  if (!(error instanceof Error)) return { error: typeof error };
  const cause = error.cause as { code?: unknown } | undefined;
  const frame = error.stack?.split("\n").find((line) => line.includes("/src/")) ?? "";
  return { error: error.name, code: typeof cause?.code === "string" ? cause.code : "", frame: frame.trim().replace(/.*\/src\//, "src/") };
}
