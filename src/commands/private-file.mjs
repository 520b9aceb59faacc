import { readFileSync, renameSync, writeFileSync } from "node:fs";

/** Read a JSON file of ours. @returns null when it is not there or was cut short */
export function readJson(file) {
  try {
    return JSON.parse(readFileSync(file, "utf8"));
  } catch (error) {
    if (error.code === "ENOENT" || error instanceof SyntaxError) return null;
    throw error;
  }
}

/** Write a JSON file that only this account can read, whole or not at all. */
export function writePrivateJson(file, value) {
  const draft = `${file}.${process.pid}`;
  writeFileSync(draft, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  renameSync(draft, file);
}
