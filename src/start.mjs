import { join } from "node:path";
import { startApplication, waitUntilReady } from "./commands/application.mjs";
import { parseStartArguments } from "./commands/arguments.mjs";
import { ensureBuild, isBuilt } from "./commands/build.mjs";
import { backup, restore } from "./commands/copies.mjs";
import { migrate, openDatabase, seed } from "./commands/database.mjs";
import { assertDependencies, assertNode, ensureDependencies } from "./commands/dependencies.mjs";
import { buildEnvironment, commonEnvironment } from "./commands/environment.mjs";
import { clearLeftovers } from "./commands/leftovers.mjs";
import { end, endOnSignals, isEnding, onEnd } from "./commands/lifecycle.mjs";
import { DATA, makeDataFolder, PlainMessage, say } from "./commands/place.mjs";
import { assertPortFree, freePort } from "./commands/ports.mjs";
import { readJson } from "./commands/private-file.mjs";
import { run } from "./commands/processes.mjs";
import { atEdge } from "./commands/edge.mjs";
import { readSettings } from "./commands/settings.mjs";
import { typescriptArgs } from "./commands/typescript.mjs";

let killChildren = () => undefined;

/** Start the application: built (default), with hot reload (--dev), or only what is there (--serve). */
async function serve({ mode }, settings) {
  const port = Number(settings.PORT ?? 3000);
  await clearLeftovers(port);
  await assertPortFree(port, `PORT=${port + 1} npm ${mode === "start" ? "start" : `run ${mode}`}`);
  if (mode === "serve") assertDependencies();
  else await ensureDependencies();
  if (mode === "serve" && !isBuilt()) throw new PlainMessage("There is no build to serve. First type:\n  npm run build");

  const database = await openDatabase(settings);
  const mailPort = settings.RESEND_API_KEY ? undefined : await freePort(settings.MAIL_FAKE_PORT);
  const mailUrl = mailPort && `http://127.0.0.1:${mailPort}`;
  const nodeEnv = mode === "dev" ? "development" : "production";
  const env = commonEnvironment(settings, database, { nodeEnv, port, mailUrl });
  await migrate(env);
  if (mode !== "serve" && database.isPrivate && env.DEMO === "on") await seed(env);
  if (mode === "start") await ensureBuild(buildEnvironment(settings));

  const onDeath = (name, code) => {
    if (isEnding()) return;
    say(`${name} ended by itself (code ${code}). Stopping the rest.`);
    void end(1);
  };
  const application = startApplication(env, { port, mailPort, isDev: mode === "dev", onDeath });
  killChildren = application.kill;
  onEnd(application.stop);
  await waitUntilReady(port, isEnding);
  announce(env, mailUrl);
}

function announce(env, mailUrl) {
  const demo = env.DEMO === "on" ? readJson(join(DATA, "demo.json")) : null;
  const people = Array.isArray(demo) ? demo : (demo?.accounts ?? []);
  say(`\nNotchbook is ready at ${env.PUBLIC_ORIGIN}`);
  if (people.length > 0) say("Demo sign-ins, one press on the front page:");
  for (const { name, role } of people) say(`  ${name}, ${role}`);
  if (mailUrl) say(`Letters it writes are kept at ${mailUrl}`);
  say("Ctrl-C stops everything that was started here.\n");
}

async function build(settings) {
  await ensureDependencies();
  if (!(await ensureBuild(buildEnvironment(settings)))) say("The build is up to date.");
  return 0;
}

/** Run one of our TypeScript files beside the database: benchmarks, faults, tokens. */
async function runFile({ file, rest }, settings) {
  await ensureDependencies();
  const database = await openDatabase(settings);
  const port = Number(settings.PORT ?? 3000);
  const env = commonEnvironment(settings, database, { nodeEnv: settings.NODE_ENV ?? "production", port });
  await migrate(env);
  const { code } = await run(process.execPath, typescriptArgs(file, rest), { env });
  return code;
}

async function restoreFile({ file, isReplacing }, settings) {
  await ensureDependencies();
  const database = await openDatabase(settings);
  const env = commonEnvironment(settings, database, { nodeEnv: "production", port: Number(settings.PORT ?? 3000) });
  await restore(database, file, { isReplacing });
  await migrate(env);
  return 0;
}

await atEdge(async () => {
  endOnSignals({ atOnce: () => killChildren() });
  const task = parseStartArguments(process.argv.slice(2));
  assertNode();
  makeDataFolder();
  const settings = readSettings();
  if (task.mode === "build") return build(settings);
  if (task.mode === "run") return runFile(task, settings);
  if (task.mode === "backup") return backup(await openDatabase(settings), task.file).then(() => 0);
  if (task.mode === "restore") return restoreFile(task, settings);
  await serve(task, settings);
  return undefined;
});
