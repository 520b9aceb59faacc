import { existsSync, readFileSync } from "node:fs";
import { join } from "node:path";
import { ROOT } from "./place.mjs";

/** Lines of KEY=VALUE. Blank lines and # lines are skipped, one pair of quotes around a value is taken off. */
export function parseDotenv(text) {
  const values = {};
  for (const line of text.split(/\r?\n/)) {
    const match = /^\s*(?:export\s+)?([A-Za-z_][A-Za-z0-9_]*)\s*=\s*(.*?)\s*$/.exec(line);
    if (!match) continue;
    const [, key, raw] = match;
    const quoted = /^(["'])(.*)\1$/.exec(raw);
    values[key] = quoted ? quoted[2] : raw.replace(/\s+#.*$/, "");
  }
  return values;
}

/**
 * What the person has set: the environment, and under it the file .env. Empty means not set.
 *
 * @returns {Record<string, string>}
 */
export function readSettings(folder = ROOT) {
  const file = join(folder, ".env");
  const fromFile = existsSync(file) ? parseDotenv(readFileSync(file, "utf8")) : {};
  const merged = { ...fromFile };
  for (const [key, value] of Object.entries(process.env)) if (value !== "" || !(key in merged)) merged[key] = value;
  return Object.fromEntries(Object.entries(merged).filter(([, value]) => value !== ""));
}
