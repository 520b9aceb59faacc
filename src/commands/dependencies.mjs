import { existsSync } from "node:fs";
import { join } from "node:path";
import { withLock } from "./lock.mjs";
import { PlainMessage, ROOT, say } from "./place.mjs";
import { readJson } from "./private-file.mjs";
import { runOrStop } from "./processes.mjs";

/** @throws {PlainMessage} on a Node too old for the packages */
export function assertNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 9)) return;
  throw new PlainMessage(`Notchbook needs Node 20.9 or newer; this is ${process.versions.node}.`);
}

/** npm writes down what it put into node_modules as its last act; that has to match the lock file, package by package. */
function areInstalled({ withDev }) {
  const wanted = readJson(join(ROOT, "package-lock.json"))?.packages;
  const present = readJson(join(ROOT, "node_modules/.package-lock.json"))?.packages;
  if (!wanted || !present) return false;
  return Object.entries(wanted).every(([path, { version, optional, dev, devOptional }]) => {
    const mayBeAbsent = path === "" || optional || devOptional || (dev && !withDev);
    return mayBeAbsent || present[path]?.version === version;
  });
}

/** Install the packages of the lock file unless they are there. */
export async function ensureDependencies() {
  await withLock(join(ROOT, "node_modules"), async () => {
    if (areInstalled({ withDev: true })) return;
    say("Installing packages with npm.");
    const verb = existsSync(join(ROOT, "package-lock.json")) ? "ci" : "install";
    const script = process.env.npm_execpath;
    const [command, first] = script?.endsWith(".js") ? [process.execPath, [script]] : ["npm", []];
    await runOrStop("npm", command, [...first, verb, "--include=dev", "--no-audit", "--no-fund"]);
  });
}

/** @throws {PlainMessage} when something has to be installed first: for a server that only starts what is there */
export function assertDependencies() {
  if (!areInstalled({ withDev: false })) throw new PlainMessage("The packages are not installed. First type:\n  npm ci");
}
