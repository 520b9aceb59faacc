import { join } from "node:path";
import { pathToFileURL } from "node:url";
import { ROOT } from "./place.mjs";

/** Node's own arguments for running one of our TypeScript files outside Next. */
export function typescriptArgs(file, args = []) {
  const marker = pathToFileURL(join(ROOT, "src/commands/server-only.mjs")).href;
  return ["--import", "tsx", "--import", marker, file, ...args];
}
