import { spawn } from "node:child_process";
import { createInterface } from "node:readline";
import { ROOT, say } from "./place.mjs";

const PATIENCE_MS = 15_000;

/**
 * Start processes that live as long as the command does, each with its lines marked by its name.
 *
 * Each gets a process group of its own: a Ctrl-C in the terminal reaches only us, and we stop them in order.
 *
 * @param {{ name: string, args: string[], env: NodeJS.ProcessEnv }[]} programs arguments for Node itself
 * @param {{ onDeath: (name: string, code: number | null) => void, write?: (line: string) => void }} options
 *   `onDeath` is told of one that ends unasked
 * @returns {{ pids: number[], stop: () => Promise<void>, kill: () => void }}
 */
export function startChildren(programs, { onDeath, write = say }) {
  let isStopping = false;
  const width = Math.max(...programs.map(({ name }) => name.length));
  const children = programs.map(({ name, args, env }) => {
    const child = spawn(process.execPath, args, { cwd: ROOT, env, detached: true, stdio: ["ignore", "pipe", "pipe"] });
    for (const stream of [child.stdout, child.stderr]) {
      createInterface({ input: stream }).on("line", (line) => write(`${name.padEnd(width)} | ${line}`));
    }
    const ended = new Promise((resolve) => child.once("exit", resolve));
    child.once("exit", (code) => {
      if (!isStopping) onDeath(name, code);
    });
    return { child, ended };
  });

  const signal = (name) => {
    for (const { child } of children) signalGroup(child.pid, name);
  };
  const stop = async () => {
    isStopping = true;
    signal("SIGTERM");
    const all = Promise.all(children.map(({ ended }) => ended));
    const timer = setTimeout(() => signal("SIGKILL"), PATIENCE_MS);
    await all;
    clearTimeout(timer);
    signal("SIGKILL");
  };
  return { pids: children.map(({ child }) => child.pid), stop, kill: () => signal("SIGKILL") };
}

/** A process and whatever it started. The last call, after its end, sweeps up what it may have left. */
export function signalGroup(pid, name) {
  try {
    process.kill(-Number(pid), name);
  } catch (error) {
    if (error.code !== "ESRCH") throw error;
  }
}
