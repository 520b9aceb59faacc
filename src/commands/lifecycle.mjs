import { say } from "./place.mjs";

/** What has to be undone before the command ends, last first. */
const closers = [];
/** Processes running in the foreground (a build, a migration). */
const foreground = new Set();
/** Acts that an ending waits for, since what they opened could not be closed half-way. */
const unbreakable = new Set();
let ending = null;
let firstSignalAt = 0;

/** Register something to close when the command ends, however it ends. Closed in reverse order. */
export function onEnd(close) {
  closers.push(close);
}

export function isEnding() {
  return ending !== null;
}

/** Let an interruption end this child too. Returns the function that forgets it again. */
export function inForeground(child) {
  foreground.add(child);
  return () => foreground.delete(child);
}

/** Do something that the end of the command waits for: opening what then has to be closed. */
export async function withoutBreak(act) {
  const promise = act();
  unbreakable.add(promise);
  try {
    return await promise;
  } finally {
    unbreakable.delete(promise);
  }
}

/** Close everything, then leave with this code. Called twice, the first call's code stands. */
export function end(code) {
  ending ??= closeAll().then(() => process.exit(code));
  return ending;
}

async function closeAll() {
  if (unbreakable.size === 0) for (const child of foreground) child.kill("SIGTERM");
  await Promise.allSettled(unbreakable);
  await new Promise(setImmediate);
  while (closers.length > 0) {
    try {
      await closers.pop()();
    } catch (error) {
      say(`While stopping: ${error.message}`);
    }
  }
}

/**
 * Ctrl-C, SIGTERM and a closed terminal end the command in order; a second one ends it at once.
 * npm passes on the Ctrl-C that the terminal has already sent us, so two within a second count as one.
 */
export function endOnSignals({ code = 0, atOnce = () => undefined } = {}) {
  for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) {
    process.on(signal, () => {
      const now = Date.now();
      if (firstSignalAt === 0) {
        firstSignalAt = now;
        if (signal !== "SIGHUP") say("\nStopping. Press Ctrl-C once more to stop at once.");
        void end(code);
      } else if (now - firstSignalAt > 1000) {
        for (const child of foreground) child.kill("SIGKILL");
        atOnce();
        process.exit(130);
      }
    });
  }
}
