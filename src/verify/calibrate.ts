import { writeFile } from "node:fs/promises";
import { parseArgs } from "node:util";
import { CELLS } from "./calibrate-bars";
import { addCounts, calibratePerson, NO_COUNTS } from "./calibrate-person";
import { calibrationRun, calibrationText } from "./calibrate-report";

const USAGE = "usage: calibrate -- --seed N --people N [--json FILE]";
const DEFAULTS = { seed: "1", people: "300" } as const;
const SPEAKS_EVERY = 25;

/** A whole number from 0 up, or null. */
function wholeNumber(text: string): number | null {
  return /^\d{1,9}$/.test(text) ? Number(text) : null;
}

/**
 * `calibrate -- --seed N --people N [--json FILE]`: draws people whom nobody has tuned
 * anything on, lets the shipped rules judge changes made to them, and prints false and
 * true calls against their bars. Exit code 1 where a bar was missed, 2 for arguments
 * that make no sense. The same seed and people give the same figures.
 */
async function main(args: string[]): Promise<number> {
  let values: { seed?: string; people?: string; json?: string };
  try {
    ({ values } = parseArgs({ args, options: { seed: { type: "string" }, people: { type: "string" }, json: { type: "string" } } }));
  } catch (error) {
    process.stderr.write(`${error instanceof Error ? error.message : String(error)}\n${USAGE}\n`);
    return 2;
  }
  const seed = wholeNumber(values.seed ?? DEFAULTS.seed);
  const people = wholeNumber(values.people ?? DEFAULTS.people);
  if (seed === null || people === null || people < 1) {
    process.stderr.write(`seed and people are whole numbers, and at least one person\n${USAGE}\n`);
    return 2;
  }

  let counts = CELLS.map(() => NO_COUNTS);
  for (let index = 0; index < people; index++) {
    const one = calibratePerson(seed, index, CELLS);
    counts = counts.map((sum, i) => addCounts(sum, one[i] ?? NO_COUNTS));
    if ((index + 1) % SPEAKS_EVERY === 0) process.stderr.write(`${index + 1} of ${people} people\n`);
  }
  const run = calibrationRun({ seed, people, date: new Date().toISOString().slice(0, 10) }, counts);
  process.stdout.write(calibrationText(run));
  if (values.json !== undefined) await writeFile(values.json, `${JSON.stringify(run, null, 2)}\n`);
  return run.areAllBarsMet ? 0 : 1;
}

process.exitCode = await main(process.argv.slice(2));
