import { end, isEnding } from "./lifecycle.mjs";
import { PlainMessage } from "./place.mjs";

/** Words for an error: ours as they are, a closed door by its path, anything unforeseen with its stack. */
function describe(error) {
  if (error instanceof PlainMessage) return error.message;
  if (error.code === "EACCES" || error.code === "EPERM") {
    return `This account may not use ${error.path ?? "a file here"}. It probably belongs to the account that started Notchbook before: start as that account, or move the folder away.`;
  }
  return error.stack ?? String(error);
}

/**
 * Run a command to its end: close what it opened, and leave with its code. A task that gives no code goes on in the
 * background, until a signal or the death of a child ends it.
 */
export async function atEdge(task) {
  try {
    const code = await task();
    if (code !== undefined) await end(code);
  } catch (error) {
    if (!isEnding()) process.stderr.write(`\n${describe(error)}\n`);
    await end(1);
  }
}
