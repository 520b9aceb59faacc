import { join } from "node:path";
import { PlainMessage } from "./place.mjs";
import { run } from "./processes.mjs";

/** A connection string as the variables that PostgreSQL's own programs read: nothing secret on a command line. */
export function connectionEnv(url) {
  const { hostname, port, username, password, pathname, searchParams } = new URL(url);
  const clean = Object.fromEntries(Object.entries(process.env).filter(([key]) => !key.startsWith("PG")));
  return {
    ...clean,
    PGHOST: decodeURIComponent(hostname) || searchParams.get("host") || "127.0.0.1",
    PGPORT: port || "5432",
    PGUSER: decodeURIComponent(username),
    PGPASSWORD: decodeURIComponent(password),
    PGDATABASE: decodeURIComponent(pathname.slice(1)),
    PGCONNECT_TIMEOUT: "10",
    ...(searchParams.has("sslmode") ? { PGSSLMODE: searchParams.get("sslmode") } : {}),
  };
}

/**
 * Send SQL through psql, which stops at the first refusal.
 *
 * @returns {Promise<string>} bare rows, columns parted by |
 * @throws {PlainMessage} with PostgreSQL's own words
 */
export async function sql(bin, url, text) {
  const args = ["-X", "-q", "-A", "-t", "-v", "ON_ERROR_STOP=1", "-f", "-"];
  const { code, stdout, stderr } = await run(join(bin, "psql"), args, { env: connectionEnv(url), input: text, stdio: "capture" });
  if (code !== 0) throw new PlainMessage(`PostgreSQL refused a statement:\n${stderr.trim()}`);
  return stdout.trim();
}

/** The same connection string, for another database of the same server. */
export function withDatabase(url, name) {
  const changed = new URL(url);
  changed.pathname = `/${name}`;
  return changed.toString();
}
