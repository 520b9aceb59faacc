import { existsSync, readdirSync, readFileSync, readlinkSync, renameSync, rmSync, statSync } from "node:fs";
import { join } from "node:path";
import { freePort } from "./ports.mjs";
import { PlainMessage } from "./place.mjs";
import { run } from "./processes.mjs";

const LOG_MAX_BYTES = 5_000_000;
const SETTINGS = {
  listen_addresses: "127.0.0.1",
  unix_socket_directories: "",
  max_connections: "100",
  timezone: "UTC",
  log_timezone: "UTC",
};
/** For data that a test run throws away: losing it with the machine is no loss. */
const THROWAWAY = { fsync: "off", synchronous_commit: "off", full_page_writes: "off" };

/**
 * How the server's own programs are run: as its account, from a folder it may enter, out of reach of the terminal's
 * Ctrl-C, and without pipes, which a started server would keep open for ever.
 */
const as = ({ account }) => ({
  ...account,
  cwd: "/",
  env: { PATH: "/usr/bin:/bin", LC_ALL: "C.UTF-8" },
  detached: true,
  stdio: "ignore",
});

/** Make the data folder, whole or not at all. The superuser's password guards every way in. */
export async function initialise(cluster, password) {
  const draft = `${cluster.data}.new`;
  const passwordFile = join(cluster.home, "password");
  rmSync(draft, { recursive: true, force: true });
  // The account reads the password through the file's name, so the file is written as that account.
  await run("/bin/sh", ["-c", 'umask 077; cat > "$1"', "sh", passwordFile], { ...as(cluster), stdio: "capture", input: password });
  const args = ["-D", draft, "-U", "postgres", "-A", "scram-sha-256", `--pwfile=${passwordFile}`, "-E", "UTF8"];
  const made = await run(join(cluster.bin, "initdb"), [...args, "--locale=C.UTF-8", "--data-checksums"], {
    ...as(cluster),
    stdio: "capture",
  });
  rmSync(passwordFile, { force: true });
  if (made.code !== 0) throw new PlainMessage(`PostgreSQL could not make its data folder in ${cluster.home}:\n${made.stderr}`);
  renameSync(draft, cluster.data);
}

/** The running server by its own note: process and port. @returns null when there is none, or it died */
export function runningServer(cluster) {
  const note = join(cluster.data, "postmaster.pid");
  if (!existsSync(note)) return null;
  const [pid, , , port, , , , status] = readFileSync(note, "utf8").split("\n");
  if (!isPostgres(Number(pid), cluster.data)) return null;
  return { pid: Number(pid), port: Number(port), isReady: status?.trim() === "ready" };
}

/** A server's own command line names its data folder; anyone may read it. */
function isPostgres(pid, data) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8").split("\0").includes(data);
  } catch {
    return false;
  }
}

/** Is any process at work inside the data folder? Backends outlive a killed server by a moment. */
function isInhabited(data) {
  return readdirSync("/proc").some((pid) => {
    try {
      return /^\d+$/.test(pid) && readlinkSync(`/proc/${pid}/cwd`) === data;
    } catch {
      return false;
    }
  });
}

/**
 * PostgreSQL clears up after a dead server itself, unless the dead server's number now belongs to some other program:
 * then it takes that program for the server. Only in that case the note goes, and only from an empty house.
 */
async function clearStaleNote(cluster) {
  const note = join(cluster.data, "postmaster.pid");
  for (let waited = 0; existsSync(note) && isInhabited(cluster.data) && waited < 20; waited += 1) {
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  if (existsSync(note) && !isInhabited(cluster.data)) rmSync(note);
}

/** Start on a free port of 127.0.0.1 and wait until it answers. @returns {Promise<{ pid: number, port: number }>} */
export async function startServer(cluster, { preferredPort, isThrowaway }) {
  await clearStaleNote(cluster);
  const log = join(cluster.home, "server.log");
  if ((statSync(log, { throwIfNoEntry: false })?.size ?? 0) > LOG_MAX_BYTES) renameSync(log, `${log}.old`);
  for (let attempt = 1; attempt <= 3; attempt += 1) {
    const port = await freePort(attempt === 1 ? preferredPort : undefined);
    const settings = { ...SETTINGS, port: String(port), ...(isThrowaway ? THROWAWAY : {}) };
    const options = Object.entries(settings).map(([key, value]) => `-c ${key}='${value}'`);
    const args = ["start", "-D", cluster.data, "-l", log, "-w", "-t", "120", "-s", "-o", options.join(" ")];
    await run(join(cluster.bin, "pg_ctl"), args, as(cluster));
    const running = await waitUntilReady(cluster);
    if (running) return running;
  }
  throw new PlainMessage(`PostgreSQL did not start. The end of ${log}:\n${lastLines(log)}`);
}

/** Wait for a server that another command is just starting, or that is recovering from a power cut. */
export async function waitUntilReady(cluster) {
  for (let waited = 0; waited < 240; waited += 1) {
    const running = runningServer(cluster);
    if (!running) return null;
    if (running.isReady) return running;
    await new Promise((resolve) => setTimeout(resolve, 250));
  }
  throw new PlainMessage(`PostgreSQL in ${cluster.data} has not become ready within a minute.`);
}

export async function stopServer(cluster) {
  await run(join(cluster.bin, "pg_ctl"), ["stop", "-D", cluster.data, "-m", "fast", "-w", "-t", "60", "-s"], as(cluster));
}

/** Give the superuser a new password while the server is down, for when our note of the old one is gone. */
export async function resetPassword(cluster, password) {
  const reset = await run(join(cluster.bin, "postgres"), ["--single", "-D", cluster.data, "postgres"], {
    ...as(cluster),
    stdio: "capture",
    input: `alter role postgres password '${password}'\n`,
  });
  if (reset.code !== 0) throw new PlainMessage(`PostgreSQL in ${cluster.data} could not be opened:\n${reset.stderr}`);
}

function lastLines(file) {
  return existsSync(file) ? readFileSync(file, "utf8").trimEnd().split("\n").slice(-15).join("\n") : "(no log)";
}
