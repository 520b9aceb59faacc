import { createHash } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
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

const LOCK = join(ROOT, "package-lock.json");
/** Which lock file we last installed; inside node_modules, so that it goes when they go. */
const STAMP = join(ROOT, "node_modules/.notchbook-installed");

const lockMark = () => createHash("sha256").update(readFileSync(LOCK)).digest("hex");

/**
 * npm writes down what it put into node_modules as its last act. Either we installed this very lock file, or what
 * npm wrote down matches it package by package.
 */
function areInstalled({ withDev }) {
  const wanted = readJson(LOCK)?.packages;
  const present = readJson(join(ROOT, "node_modules/.package-lock.json"))?.packages;
  if (!wanted || !present) return false;
  if (existsSync(STAMP) && readFileSync(STAMP, "utf8") === lockMark()) return true;
  return Object.entries(wanted).every(([path, { version, optional, dev, devOptional, extraneous }]) => {
    const mayBeAbsent = path === "" || optional || devOptional || extraneous || (dev && !withDev);
    return mayBeAbsent || present[path]?.version === version;
  });
}

/** Install the packages of the lock file unless they are there. */
export async function ensureDependencies() {
  await withLock(join(ROOT, "node_modules"), async () => {
    if (areInstalled({ withDev: true })) return;
    say("Installing packages with npm.");
    const verb = existsSync(LOCK) ? "ci" : "install";
    const script = process.env.npm_execpath;
    const [command, first] = script?.endsWith(".js") ? [process.execPath, [script]] : ["npm", []];
    await runOrStop("npm", command, [...first, verb, "--include=dev", "--no-audit", "--no-fund"]);
    writeFileSync(STAMP, lockMark());
  });
}

/** @throws {PlainMessage} when something has to be installed first: for a server that only starts what is there */
export function assertDependencies() {
  if (!areInstalled({ withDev: false })) throw new PlainMessage("The packages are not installed. First type:\n  npm ci");
}
