import { join } from "node:path";
import { servingEnvironment } from "./environment.mjs";
import { startChildren } from "./children.mjs";
import { noteRunning } from "./leftovers.mjs";
import { PlainMessage, ROOT } from "./place.mjs";
import { typescriptArgs } from "./typescript.mjs";

const READY_WITHIN_MS = 120_000;

/**
 * Start web, worker and, when there is no key for the real mail service, the local one.
 *
 * @param {NodeJS.ProcessEnv} common see environment.mjs
 * @param {{ port: number, mailPort?: number, isDev?: boolean, onDeath: (name: string, code: number | null) => void,
 *   write?: (line: string) => void }} options
 */
export function startApplication(common, { port, mailPort, isDev = false, onDeath, write }) {
  const env = servingEnvironment(common);
  const next = join(ROOT, "node_modules/next/dist/bin/next");
  const web = { name: "web", args: [next, isDev ? "dev" : "start", "-H", "127.0.0.1", "-p", String(port)], env };
  const worker = { name: "worker", args: typescriptArgs("src/worker.ts"), env };
  const mail = {
    name: "mail",
    args: typescriptArgs("src/testing/fakes/mail-server.ts"),
    env: { ...env, MAIL_FAKE_PORT: String(mailPort) },
  };
  const children = startChildren(mailPort ? [mail, web, worker] : [web, worker], { onDeath, write });
  const forget = noteRunning(port, children.pids);
  const stop = () => children.stop().then(forget);
  return { stop, kill: children.kill };
}

/** Wait until the application says that it and its database are ready. @throws {PlainMessage} after two minutes */
export async function waitUntilReady(port, isGivenUp = () => false) {
  const until = Date.now() + READY_WITHIN_MS;
  let last = "no answer";
  while (Date.now() < until && !isGivenUp()) {
    try {
      const answer = await fetch(`http://127.0.0.1:${port}/readyz`, { signal: AbortSignal.timeout(5000) });
      const body = await answer.text();
      if (answer.status === 200) return;
      last = `${answer.status} ${body.slice(0, 300)}`;
    } catch (error) {
      last = error.cause?.code ?? error.message;
    }
    await new Promise((resolve) => setTimeout(resolve, 200));
  }
  throw new PlainMessage(`http://127.0.0.1:${port}/readyz has not said 200. Its last word: ${last}`);
}
