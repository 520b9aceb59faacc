import { createHash } from "node:crypto";
import { existsSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { join } from "node:path";
import { withLock } from "./lock.mjs";
import { PlainMessage, ROOT, say } from "./place.mjs";
import { run } from "./processes.mjs";

const STAMP = join(ROOT, ".next/notchbook-build");
const FOLDERS = ["src", "public"];
const FILES = ["next.config.ts", "postcss.config.mjs", "tailwind.config.ts", "tsconfig.json", "package-lock.json"];

/** Neither tests nor the plain-Node commands end up in the build. */
const isOutside = (path) => /\.test\.tsx?$/.test(path) || /^src\/.*\.(mjs|mts)$/.test(path);

function filesUnder(folder) {
  if (!existsSync(join(ROOT, folder))) return [];
  const entries = readdirSync(join(ROOT, folder), { withFileTypes: true });
  return entries.flatMap((entry) => {
    const path = `${folder}/${entry.name}`;
    return entry.isDirectory() ? filesUnder(path) : [path];
  });
}

/** One number for everything that goes into a build: files, Node, and what Next reads from the environment. */
function fingerprint(env) {
  const hash = createHash("sha256");
  const paths = [...FOLDERS.flatMap(filesUnder), ...FILES].filter((path) => !isOutside(path)).sort();
  for (const path of paths) {
    if (!existsSync(join(ROOT, path))) continue;
    hash.update(`${path}\0`).update(readFileSync(join(ROOT, path))).update("\0");
  }
  const baked = Object.keys(env).filter((key) => key.startsWith("NEXT_PUBLIC_") || key === "NEXT_SERVER_ACTIONS_ENCRYPTION_KEY");
  for (const key of baked.sort()) hash.update(`${key}=${env[key]}\0`);
  return hash.update(process.version).digest("hex");
}

export function isBuilt() {
  return existsSync(join(ROOT, ".next/BUILD_ID"));
}

function isFresh(mark) {
  return isBuilt() && existsSync(STAMP) && readFileSync(STAMP, "utf8") === mark;
}

/**
 * Build for production unless the last build was of the same files.
 *
 * @returns {Promise<boolean>} whether a build was needed
 * @throws {PlainMessage} when the build does not finish
 */
export function ensureBuild(env) {
  return withLock(join(ROOT, ".next"), async () => {
    const mark = fingerprint(env);
    if (isFresh(mark)) return false;
    say("Building for production.");
    rmSync(STAMP, { force: true });
    const { code } = await run(process.execPath, [join(ROOT, "node_modules/next/dist/bin/next"), "build"], { env });
    if (code !== 0) throw new PlainMessage(`The build ended with code ${code}. The lines above say why.`);
    writeFileSync(STAMP, mark);
    return true;
  });
}
