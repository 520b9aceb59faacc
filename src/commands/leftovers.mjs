import { rmSync } from "node:fs";
import { join } from "node:path";
import { signalGroup } from "./children.mjs";
import { DATA, PlainMessage, say } from "./place.mjs";
import { readJson, writePrivateJson } from "./private-file.mjs";
import { identity } from "./users.mjs";

const noteOf = (port) => join(DATA, `running-${port}.json`);
const isAlive = (mark) => mark !== "" && identity(mark.split(" ")[0]) === mark;

/** Write down which processes serve a port. @returns the function that takes the note away */
export function noteRunning(port, pids) {
  writePrivateJson(noteOf(port), { command: identity(process.pid), children: pids.map(identity) });
  return () => rmSync(noteOf(port), { force: true });
}

/**
 * Stop what a command left behind that was itself killed outright.
 *
 * @throws {PlainMessage} when that command is alive and well
 */
export async function clearLeftovers(port) {
  const note = readJson(noteOf(port));
  if (!note) return;
  if (isAlive(note.command)) {
    const [pid] = note.command.split(" ");
    throw new PlainMessage(`Notchbook already runs from this folder on port ${port}, as process ${pid}. Stop that one first.`);
  }
  const left = note.children.filter(isAlive);
  if (left.length > 0) say("The last run was cut short. Stopping what it left behind.");
  for (const mark of left) signalGroup(mark.split(" ")[0], "SIGTERM");
  for (let waited = 0; left.some(isAlive) && waited < 100; waited += 1) await new Promise((done) => setTimeout(done, 100));
  for (const mark of left.filter(isAlive)) signalGroup(mark.split(" ")[0], "SIGKILL");
  rmSync(noteOf(port), { force: true });
}
