import { z } from "zod";

/** Values that ship with the example file; production refuses to start with any of them. */
const DEFAULT_SECRETS = new Set(["change-me", "change-me-too", ""]);

const schema = z.object({
  NODE_ENV: z.enum(["development", "production", "test"]).default("development"),
  /** The database as the application's role sees it: owns nothing, cannot rewrite history. */
  APP_DATABASE_URL: z.string().optional(),
  /** The database as its owner sees it: migrations, demo, backup. */
  DATABASE_URL: z.string().optional(),
  PORT: z.coerce.number().int().min(1).max(65535).default(3000),
  PUBLIC_ORIGIN: z.url().optional(),
  DEMO: z.enum(["on", "off"]).default("off"),
  RESEND_API_KEY: z.string().default("local-fake"),
  RESEND_BASE_URL: z.url().optional(),
  MAIL_FROM: z.string().default("Notchbook <journal@notchbook.example>"),
  UNSUBSCRIBE_SECRET: z.string().default("change-me"),
  COOKIE_SECURE: z.enum(["auto", "on", "off"]).default("auto"),
  LOG_LEVEL: z.enum(["debug", "info", "warn", "error"]).default("info"),
});

function readEnvironment() {
  const values = schema.parse(process.env);
  const publicOrigin = values.PUBLIC_ORIGIN ?? `http://127.0.0.1:${values.PORT}`;
  const isLoopback = /^http:\/\/(127\.0\.0\.1|localhost)(:|$)/.test(publicOrigin);
  return {
    nodeEnv: values.NODE_ENV,
    databaseUrl: values.APP_DATABASE_URL ?? values.DATABASE_URL ?? "",
    ownerDatabaseUrl: values.DATABASE_URL ?? "",
    port: values.PORT,
    publicOrigin: new URL(publicOrigin).origin,
    isDemo: values.DEMO === "on",
    resendApiKey: values.RESEND_API_KEY,
    resendBaseUrl: values.RESEND_BASE_URL,
    mailFrom: values.MAIL_FROM,
    unsubscribeSecret: values.UNSUBSCRIBE_SECRET,
    isCookieSecure: values.COOKIE_SECURE === "auto" ? !isLoopback : values.COOKIE_SECURE === "on",
    isLoopback,
    logLevel: values.LOG_LEVEL,
  };
}

export type Environment = ReturnType<typeof readEnvironment>;

/** The only reader of `process.env`. */
export const env: Environment = readEnvironment();

/**
 * Refuse to serve the public with secrets that everyone knows. Called once by
 * each server process; a local run on loopback gets generated secrets.
 *
 * @throws {Error} naming each variable that must be set
 */
export function assertServable(values: Environment = env): void {
  if (values.nodeEnv !== "production") return;
  const missing: string[] = [];
  if (!values.databaseUrl) missing.push("APP_DATABASE_URL or DATABASE_URL");
  if (DEFAULT_SECRETS.has(values.unsubscribeSecret)) missing.push("UNSUBSCRIBE_SECRET");
  if (!values.isLoopback && values.resendApiKey === "local-fake") missing.push("RESEND_API_KEY");
  if (!values.isLoopback && values.isDemo) missing.push("DEMO=off (one-press sign-in is for a local demo only)");
  if (missing.length > 0) throw new Error(`Not starting in production before these are set: ${missing.join(", ")}`);
}
