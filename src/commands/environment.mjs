import { randomBytes } from "node:crypto";
import { join } from "node:path";
import { DATA, PlainMessage } from "./place.mjs";
import { readJson, writePrivateJson } from "./private-file.mjs";

/** Made once for the local run. With a database of one's own they come from the environment. */
const SECRETS = ["UNSUBSCRIBE_SECRET", "NEXT_SERVER_ACTIONS_ENCRYPTION_KEY"];

/** The local run's own secrets, kept in .data so that links in letters and open pages outlive a restart. */
export function localSecrets() {
  const file = join(DATA, "secrets.json");
  const kept = readJson(file) ?? {};
  const missing = SECRETS.filter((name) => !kept[name]);
  if (missing.length === 0) return kept;
  for (const name of missing) kept[name] = randomBytes(32).toString("base64");
  writePrivateJson(file, kept);
  return kept;
}

/**
 * The environment of every process we start.
 *
 * @param {Record<string, string>} settings what the person has set
 * @param {{ ownerUrl: string, appUrl: string, isPrivate: boolean }} database
 * @param {{ nodeEnv: string, port: number, mailUrl?: string }} run
 * @throws {PlainMessage} when a secret is missing that only the person can choose
 */
export function commonEnvironment(settings, database, { nodeEnv, port, mailUrl }) {
  if (!database.isPrivate && !settings.UNSUBSCRIBE_SECRET) {
    throw new PlainMessage(
      "DATABASE_URL is set, so the secrets have to be yours as well, and UNSUBSCRIBE_SECRET is not set. One way to make one:\n" +
        "  openssl rand -base64 32\nSee .env.example for every variable.",
    );
  }
  return {
    ...process.env,
    ...(database.isPrivate ? { DEMO: "on", ...localSecrets() } : { DEMO: "off" }),
    PUBLIC_ORIGIN: `http://127.0.0.1:${port}`,
    ...(mailUrl ? { RESEND_BASE_URL: mailUrl } : {}),
    ...settings,
    NODE_ENV: nodeEnv,
    PORT: String(port),
    NEXT_TELEMETRY_DISABLED: "1",
    DATABASE_URL: database.ownerUrl,
    APP_DATABASE_URL: database.appUrl,
  };
}

/** The environment of a build, which needs no database; the local run, the tests and `npm run build` share one. */
export function buildEnvironment(settings) {
  const secrets = settings.DATABASE_URL ? {} : localSecrets();
  return { ...process.env, ...secrets, ...settings, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1" };
}

/** The common environment for web and worker, without the owner's way into the database. Empty, so that no .env brings it back. */
export function servingEnvironment(common) {
  return { ...common, DATABASE_URL: "" };
}
