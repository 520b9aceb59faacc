import { spawn } from "node:child_process";
import { inForeground } from "./lifecycle.mjs";
import { PlainMessage, ROOT } from "./place.mjs";

/**
 * Run one program to its end, in the project folder.
 *
 * @param {string} command
 * @param {string[]} args
 * @param {{ env?: NodeJS.ProcessEnv, cwd?: string, uid?: number, gid?: number,
 *   detached?: boolean, input?: string, stdio?: "show" | "capture" | "ignore" }} [options]
 * @returns {Promise<{ code: number, stdout: string, stderr: string }>} `code` is 127 when there is no such program
 */
export function run(command, args, { env = process.env, cwd = ROOT, uid, gid, detached, input, stdio = "show" } = {}) {
  const pipes = { show: [input === undefined ? "inherit" : "pipe", "inherit", "inherit"], ignore: "ignore" };
  return new Promise((resolve) => {
    const child = spawn(command, args, { env, cwd, uid, gid, detached, stdio: pipes[stdio] ?? "pipe" });
    const forget = inForeground(child);
    let stdout = "";
    let stderr = "";
    child.stdout?.on("data", (chunk) => (stdout += chunk));
    child.stderr?.on("data", (chunk) => (stderr += chunk));
    child.stdin?.on("error", () => undefined);
    child.stdin?.end(input ?? "");
    const settle = (code) => {
      forget();
      resolve({ code, stdout, stderr });
    };
    child.on("error", (error) => {
      stderr += error.message;
      settle(error.code === "ENOENT" ? 127 : 126);
    });
    child.on("close", (code, signal) => settle(code ?? (signal ? 130 : 1)));
  });
}

/** The same, for a step that everything after it needs. @throws {PlainMessage} naming the step */
export async function runOrStop(what, command, args, options) {
  const { code } = await run(command, args, options);
  if (code !== 0) throw new PlainMessage(`${what} ended with code ${code}. The lines above say why.`);
}
