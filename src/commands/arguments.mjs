import { PlainMessage } from "./place.mjs";

const USAGE = `What can follow "node src/start.mjs":
  (nothing)                    install, build and start what is needed
  --dev                        the same with hot reload
  --build                      build for production, unless the last build is of the same files
  --serve                      start only what is built
  --run FILE [arguments]       run one file with the database
  --backup [FILE]              save the database to a file
  --restore FILE [--replace]   bring a saved file back`;

/**
 * @param {string[]} args
 * @returns {{ mode: "start" | "dev" | "build" | "serve" } | { mode: "run", file: string, rest: string[] }
 *   | { mode: "backup", file?: string } | { mode: "restore", file: string, isReplacing: boolean }}
 * @throws {PlainMessage} with the list above
 */
export function parseStartArguments([first, ...rest]) {
  if (first === undefined) return { mode: "start" };
  if (["--dev", "--build", "--serve"].includes(first) && rest.length === 0) return { mode: first.slice(2) };
  if (first === "--run" && rest[0]) return { mode: "run", file: rest[0], rest: rest.slice(1) };
  if (first === "--backup" && rest.length <= 1 && !rest[0]?.startsWith("-")) return { mode: "backup", file: rest[0] };
  if (first === "--restore") {
    const files = rest.filter((word) => word !== "--replace");
    if (files.length === 1 && !files[0].startsWith("-")) {
      return { mode: "restore", file: files[0], isReplacing: rest.length > files.length };
    }
  }
  throw new PlainMessage(USAGE);
}
