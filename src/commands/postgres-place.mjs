import { spawnSync } from "node:child_process";
import { createHash } from "node:crypto";
import { chownSync, existsSync, mkdirSync, readFileSync, statSync } from "node:fs";
import { dirname, join } from "node:path";
import { PlainMessage } from "./place.mjs";

/**
 * The account PostgreSQL runs as: ourselves, or, since it refuses root, the account "postgres".
 *
 * @returns {{ uid?: number, gid?: number }} options for spawn; empty when we are an ordinary user
 */
export function serverAccount() {
  if (process.getuid?.() !== 0) return {};
  const line = readFileSync("/etc/passwd", "utf8").split("\n").find((entry) => entry.startsWith("postgres:"));
  if (!line) {
    throw new PlainMessage(
      "PostgreSQL refuses to run as root, and there is no account 'postgres' here. As root, type:\n  adduser --system --group postgres",
    );
  }
  const [, , uid, gid] = line.split(":").map(Number);
  return { uid, gid };
}

/** Can the account enter this folder? Asked of the kernel, so that every way of granting it counts. */
function canEnter(account, folder) {
  if (account.uid === undefined) return true;
  return spawnSync("/bin/sh", ["-c", 'cd "$1"', "sh", folder], { ...account, cwd: "/", env: {}, stdio: "ignore" }).status === 0;
}

/** Make a home of mode 700 that belongs to the account. @throws when the file system does not let us */
function makeHome(folder, account) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  if (account.uid !== undefined) chownSync(folder, account.uid, account.gid);
}

/**
 * The home of a cluster: the folder asked for, or, when a folder above it is closed to the server's account
 * (a checkout under /root), one in /var/tmp named after it. The data lie in `data` within.
 */
export function clusterHome(dir, account) {
  const hash = createHash("sha256").update(dir).digest("hex").slice(0, 12);
  const fallback = `/var/tmp/notchbook-pg-${hash}`;
  mkdirSync(dirname(dir), { recursive: true });
  let home = canEnter(account, dirname(dir)) ? dir : fallback;
  try {
    if (!existsSync(home)) makeHome(home, account);
  } catch (error) {
    if (home === fallback || account.uid === undefined) throw error;
    home = fallback;
    if (!existsSync(home)) makeHome(home, account);
  }
  const owner = statSync(home);
  if (owner.uid !== (account.uid ?? process.getuid())) {
    throw new PlainMessage(`${home} belongs to another account. Start as that account, or move the folder away.`);
  }
  return { home, data: join(home, "data") };
}
