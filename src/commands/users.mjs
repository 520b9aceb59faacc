import { mkdirSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";

/** A process's number with the moment it started, so that a number given out again is not mistaken for it. */
export function identity(pid) {
  try {
    const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
    return `${pid} ${stat.slice(stat.lastIndexOf(")") + 2).split(" ")[19]}`;
  } catch {
    return "";
  }
}

/** Note in a folder that this process uses something shared. */
export function enter(folder) {
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, String(process.pid)), identity(process.pid), { mode: 0o600 });
}

/** Take the note away, and the notes of processes that are no more. @returns how many others still use it */
export function leave(folder) {
  rmSync(join(folder, String(process.pid)), { force: true });
  let others = 0;
  for (const pid of readdirSync(folder)) {
    const file = join(folder, pid);
    if (readFileSync(file, "utf8") === identity(pid)) others += 1;
    else rmSync(file, { force: true });
  }
  return others;
}
