import { rmSync } from "node:fs";
import { join } from "node:path";
import { countOne } from "./ledger.mjs";
import { DATA, ROOT } from "./place.mjs";
import { readJson } from "./private-file.mjs";
import { run } from "./processes.mjs";

const tool = (path) => join(ROOT, "node_modules", path);
const OURS = /^(DATABASE_URL|APP_DATABASE_URL|PORT|PUBLIC_ORIGIN|DEMO|RESEND_.*|MAIL_.*|COOKIE_SECURE|LOG_LEVEL|NODE_ENV)$/;

/** The environment of a test: the person's own settings of the application stay outside. */
export function testEnvironment() {
  const env = Object.fromEntries(Object.entries(process.env).filter(([key]) => !OURS.test(key)));
  return { ...env, NEXT_TELEMETRY_DISABLED: "1" };
}

export async function lint() {
  const { code } = await run(process.execPath, [tool("eslint/bin/eslint.js"), ".", "--max-warnings", "0"]);
  return countOne(code === 0);
}

export async function checkTypes() {
  const env = testEnvironment();
  const generated = await run(process.execPath, [tool("next/dist/bin/next"), "typegen"], { env });
  const checked = await run(process.execPath, [tool("typescript/bin/tsc"), "--noEmit"], { env });
  return countOne(generated.code === 0 && checked.code === 0);
}

/**
 * Run vitest and count what it ran.
 *
 * @param {string[]} args
 * @param {NodeJS.ProcessEnv} extra the test databases, the time zone
 */
export async function runVitest(args, extra) {
  const report = join(DATA, `vitest-${process.pid}.json`);
  const reporters = ["--reporter=default", "--reporter=json", `--outputFile.json=${report}`];
  const { code } = await run(process.execPath, [tool("vitest/vitest.mjs"), "run", ...reporters, ...args], {
    env: { ...testEnvironment(), ...extra },
  });
  const found = readJson(report);
  rmSync(report, { force: true });
  return found ? countVitest(found, code) : countOne(false);
}

/** A file that could not be loaded holds no failed test, and an error outside any test belongs to no file: each counts as one. */
function countVitest({ numPassedTests, numFailedTests, numPendingTests, numTodoTests, testResults }, code) {
  const unloaded = testResults.filter(
    ({ status, assertionResults }) => status === "failed" && !assertionResults.some((test) => test.status === "failed"),
  ).length;
  const failed = numFailedTests + unloaded;
  return {
    passed: numPassedTests,
    failed: failed === 0 && code !== 0 ? 1 : failed,
    skipped: numPendingTests + numTodoTests,
  };
}

/** Run Playwright and count what it ran; a story that passed only at the second go counts as failed. */
export async function runPlaywright(args, extra) {
  const report = join(DATA, `e2e-${process.pid}.json`);
  const { code } = await run(process.execPath, [tool("@playwright/test/cli.js"), "test", ...args], {
    env: { ...testEnvironment(), ...extra, E2E_REPORT: report },
  });
  const stats = readJson(report)?.stats;
  rmSync(report, { force: true });
  if (!stats) return countOne(false);
  const failed = stats.unexpected + stats.flaky;
  return { passed: stats.expected, failed: failed === 0 && code !== 0 ? 1 : failed, skipped: stats.skipped };
}
