import { isEnding } from "./lifecycle.mjs";
import { PlainMessage, say } from "./place.mjs";

/** @typedef {{ passed: number, failed: number, skipped: number }} Counts */

const words = ({ passed, failed, skipped }) => `${passed} passed, ${failed} failed${skipped > 0 ? `, ${skipped} skipped` : ""}`;

/** What a step that is no test runner counts for. @returns {Counts} */
export const countOne = (isPassed) => ({ passed: isPassed ? 1 : 0, failed: isPassed ? 0 : 1, skipped: 0 });

/** Keeps count of the steps of a test run, and prints each with its time. */
export function openLedger() {
  const entries = [];

  /**
   * Run a step. A step that throws counts as one failed, and the next goes on.
   *
   * @param {string} name
   * @param {() => Promise<Counts>} act
   * @returns {Promise<boolean>} whether nothing failed
   */
  async function step(name, act) {
    if (isEnding()) return false;
    say(`\n== ${name}`);
    const startedAt = performance.now();
    let counts;
    try {
      counts = await act();
    } catch (error) {
      if (!isEnding()) say(error instanceof PlainMessage ? error.message : (error.stack ?? String(error)));
      counts = countOne(false);
    }
    if (isEnding()) return false;
    const seconds = ((performance.now() - startedAt) / 1000).toFixed(1);
    entries.push({ name, counts, seconds });
    say(`== ${name}: ${words(counts)} (${seconds} s)`);
    return counts.failed === 0;
  }

  /** Print every step again and the closing line, which an interrupted run does not get. @returns the command's exit code */
  function close() {
    if (isEnding()) return 130;
    const total = { passed: 0, failed: 0, skipped: 0 };
    say("");
    for (const { name, counts, seconds } of entries) {
      say(`${name.padEnd(34)} ${seconds.padStart(7)} s  ${words(counts)}`);
      for (const key of Object.keys(total)) total[key] += counts[key];
    }
    say(`\n${words(total)}`);
    return total.failed === 0 && total.passed > 0 ? 0 : 1;
  }

  return { step, close };
}
