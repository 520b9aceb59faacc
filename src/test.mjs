import { join } from "node:path";
import { ensureBuild } from "./commands/build.mjs";
import { checkTypes, lint, runVitest, testEnvironment } from "./commands/checks.mjs";
import { findChromium } from "./commands/chromium.mjs";
import { assertNode, ensureDependencies } from "./commands/dependencies.mjs";
import { atEdge } from "./commands/edge.mjs";
import { buildEnvironment } from "./commands/environment.mjs";
import { countOne, openLedger } from "./commands/ledger.mjs";
import { endOnSignals, onEnd, withoutBreak } from "./commands/lifecycle.mjs";
import { DATA, makeDataFolder, PlainMessage, say } from "./commands/place.mjs";
import { findPostgres } from "./commands/postgres-binaries.mjs";
import { tellStories } from "./commands/stories.mjs";
import { ensurePostgres } from "./db/postgres.mjs";

/** Zones whose clocks move by an odd hour: half an hour off the hour, and by half an hour. */
const ODD_ZONES = ["America/St_Johns", "Australia/Lord_Howe"];

const ledger = openLedger();
let postgres = null;

/** The server of the tests, started by the first step that needs it. */
async function testServer() {
  if (!postgres) {
    postgres = await withoutBreak(() => ensurePostgres({ dir: join(DATA, "pg-test"), isThrowaway: true }));
    onEnd(postgres.stop);
  }
  return postgres;
}

async function vitest(args) {
  const { ownerUrl, appUrl } = await testServer();
  return runVitest(args, { TZ: "UTC", TEST_DATABASE_URL: ownerUrl, TEST_APP_DATABASE_URL: appUrl });
}

/** The same build as `npm start` makes, so that one serves both. */
async function build() {
  await ensureBuild(buildEnvironment(testEnvironment()));
  return countOne(true);
}

async function stories(name, args, extra) {
  const isBuilt = await ledger.step("build", build);
  await ledger.step(name, async () => {
    if (!isBuilt) throw new PlainMessage("Not run, since there is no build.");
    return tellStories(await testServer(), args, extra);
  });
}

/** What the machine lacks is installed, or named, before minutes have gone into the first steps. */
async function prepareMachine() {
  for (const find of [findPostgres, findChromium]) {
    try {
      await find();
    } catch (error) {
      if (!(error instanceof PlainMessage)) throw error;
      say(`${error.message}\nThe steps that need it will count as failed.\n`);
    }
  }
}

async function everything() {
  await prepareMachine();
  await ledger.step("lint", lint);
  await ledger.step("types", checkTypes);
  await ledger.step("unit, interface and database tests", () => vitest([]));
  for (const zone of ODD_ZONES) {
    await ledger.step(`engines in ${zone}`, () => runVitest(["--project", "unit", "src/domain"], { TZ: zone }));
  }
  await stories("stories in Chromium", []);
}

const SUBSETS = {
  unit: (args) => ledger.step("unit", () => vitest(args)),
  e2e: (args) => stories("stories", args),
  gallery: (args) => stories("gallery", args, { GALLERY: "1" }),
};

await atEdge(async () => {
  endOnSignals({ code: 130 });
  const [subset, ...args] = process.argv.slice(2);
  if (subset !== undefined && !Object.hasOwn(SUBSETS, subset)) {
    throw new PlainMessage(`Not a part of the tests: ${subset}. There are: ${Object.keys(SUBSETS).join(", ")}.`);
  }
  assertNode();
  makeDataFolder();
  await ensureDependencies();
  await (subset ? SUBSETS[subset](args) : everything());
  return ledger.close();
});
