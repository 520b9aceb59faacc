import { existsSync, readdirSync } from "node:fs";
import { delimiter, join } from "node:path";
import { installPackages } from "./apt.mjs";
import { PlainMessage } from "./place.mjs";

const DEBIAN = "/usr/lib/postgresql";
const NEEDED = ["initdb", "pg_ctl", "postgres", "psql", "pg_dump", "pg_restore"];

const isComplete = (folder) => NEEDED.every((name) => existsSync(join(folder, name)));

/** Debian keeps a folder per major version; the newest complete one comes first, then PATH. */
function candidates(major) {
  const versions = existsSync(DEBIAN) ? readdirSync(DEBIAN).sort((a, b) => Number(b) - Number(a)) : [];
  const debian = versions.filter((version) => !major || version === major).map((version) => join(DEBIAN, version, "bin"));
  return major ? debian : [...debian, ...(process.env.PATH ?? "").split(delimiter).filter(Boolean)];
}

/** Debian's package would otherwise start a cluster of its own on port 5432. A setting already there is left alone. */
const NO_MAIN_CLUSTER =
  "mkdir -p /etc/postgresql-common && [ -e /etc/postgresql-common/createcluster.conf ] || " +
  "echo 'create_main_cluster = false' > /etc/postgresql-common/createcluster.conf";

/**
 * The folder with PostgreSQL's programs, installing them when they are missing.
 *
 * @param {string} [major] the version an existing cluster was made by
 * @throws {PlainMessage} when they are missing and cannot be installed
 */
export async function findPostgres(major) {
  const found = candidates(major).find(isComplete);
  if (found) return found;
  if (major && candidates().some(isComplete)) {
    throw new PlainMessage(`The database here was made by PostgreSQL ${major}. Install postgresql-${major}, then start again.`);
  }
  await installPackages(["postgresql"], { purpose: "PostgreSQL", before: NO_MAIN_CLUSTER });
  const installed = candidates(major).find(isComplete);
  if (!installed) throw new PlainMessage("PostgreSQL was installed, but its programs are not under /usr/lib/postgresql.");
  return installed;
}
