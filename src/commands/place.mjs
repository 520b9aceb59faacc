import { chmodSync, mkdirSync } from "node:fs";
import { dirname, join } from "node:path";
import { fileURLToPath } from "node:url";

/** The folder of the project, wherever the command was typed. */
export const ROOT = dirname(dirname(dirname(fileURLToPath(import.meta.url))));

/** Everything a run leaves behind; ignored by git. Others may walk through it (PostgreSQL's account must), not list it. */
export const DATA = join(ROOT, ".data");

export function makeDataFolder() {
  mkdirSync(DATA, { recursive: true });
  try {
    chmodSync(DATA, 0o711);
  } catch {
    // The folder belongs to another account: whoever needs to write there says so.
  }
}

/** A refusal with words meant for the person at the keyboard: printed without a stack. */
export class PlainMessage extends Error {}

export function say(line = "") {
  process.stdout.write(`${line}\n`);
}
