import { createWriteStream, rmSync } from "node:fs";
import { join } from "node:path";
import { createDatabase, dropDatabase } from "../db/postgres.mjs";
import { startApplication, waitUntilReady } from "./application.mjs";
import { runPlaywright } from "./checks.mjs";
import { canSandbox, findChromium } from "./chromium.mjs";
import { migrate, seed } from "./database.mjs";
import { commonEnvironment } from "./environment.mjs";
import { clearLeftovers } from "./leftovers.mjs";
import { isEnding, onEnd } from "./lifecycle.mjs";
import { DATA, PlainMessage, say } from "./place.mjs";
import { assertPortFree, freePort } from "./ports.mjs";

/** Set here one by one, so that neither the shell nor a file .env decides what the stories meet. */
const SETTINGS = {
  RESEND_API_KEY: "local-fake",
  MAIL_FROM: "Notchbook <journal@notchbook.example>",
  COOKIE_SECURE: "auto",
  LOG_LEVEL: "info",
};

/**
 * Tell every story to the production build in a real browser: a database of its own with the demo, the local mail
 * service and the worker beside it. What those say goes to .data/e2e-<port>.log.
 *
 * @param {{ ownerUrl: string, appUrl: string, bin: string }} postgres the test server
 * @param {string[]} args for Playwright
 * @param {NodeJS.ProcessEnv} [extra]
 */
export async function tellStories(postgres, args, extra = {}) {
  const port = Number(process.env.E2E_PORT ?? 3100);
  await clearLeftovers(port);
  await assertPortFree(port, `E2E_PORT=${port + 1} npm test`);
  const chromium = await findChromium();
  const name = port === 3100 ? "notchbook_e2e" : `notchbook_e2e_${port}`;
  await dropDatabase(postgres, name);
  const database = { ...(await createDatabase(postgres, name)), isPrivate: true };

  const mailPort = await freePort();
  const mailUrl = `http://127.0.0.1:${mailPort}`;
  const mailbox = join(DATA, `e2e-${port}-mailbox.jsonl`);
  rmSync(mailbox, { force: true });
  const settings = { ...SETTINGS, RESEND_BASE_URL: mailUrl, MAIL_FAKE_FILE: mailbox };
  const env = commonEnvironment(settings, database, { nodeEnv: "production", port });
  await migrate(env);
  await seed(env);

  const log = createWriteStream(join(DATA, `e2e-${port}.log`));
  let dead = null;
  const application = startApplication(env, {
    port,
    mailPort,
    onDeath: (child, code) => (dead ??= `${child} ended by itself (code ${code})`),
    write: (line) => log.write(`${line}\n`),
  });
  onEnd(application.stop);
  try {
    await waitUntilReady(port, () => dead !== null || isEnding());
    const sandbox = (await canSandbox(chromium)) ? "on" : "off";
    const stories = { E2E_PORT: String(port), E2E_SANDBOX: sandbox, CHROMIUM: chromium, RESEND_BASE_URL: mailUrl };
    const counts = await runPlaywright(args, { ...stories, ...extra });
    if (dead) throw new PlainMessage(`${dead} while the stories ran.`);
    return counts;
  } finally {
    await application.stop();
    log.end();
    say(`The log of web, worker and mail: ${log.path}`);
  }
}
