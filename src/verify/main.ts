/** Hold an engine against an outside implementation: `npm run --silent verify -- NAME FILES`. */
const COMMANDS: Record<string, () => Promise<{ run: (args: string[]) => Promise<void> }>> = {
  comparison: () => import("./comparison"),
  adjusted: () => import("./adjusted"),
  profile: () => import("./profile"),
  simulator: () => import("./simulator"),
};

const [name = "", ...args] = process.argv.slice(2);
const load = COMMANDS[name];
if (!load) {
  process.stderr.write(`verify: say one of ${Object.keys(COMMANDS).join(", ")}\n`);
  process.exitCode = 1;
} else {
  try {
    await (await load()).run(args);
  } catch (error) {
    process.stderr.write(`verify ${name}: ${error instanceof Error ? error.message : String(error)}\n`);
    process.exitCode = 1;
  }
}

export {};
