import { compare, type ComparisonInput } from "@/domain/comparison/compare";
import type { DayValue } from "@/domain/comparison/day-value";
import type { OutcomeId } from "@/domain/comparison/outcomes";
import { rollUp } from "@/domain/glucose/daily-rollup";
import { seededRandom } from "@/domain/simulator/random";

const RUNS = 7;

/** The middle of seven runs, in milliseconds, after one to warm up. */
function medianMs(work: () => void): number {
  work();
  const times = Array.from({ length: RUNS }, () => {
    const start = performance.now();
    work();
    return performance.now() - start;
  }).toSorted((a, b) => a - b);
  return times[Math.floor(RUNS / 2)] ?? Number.NaN;
}

const random = seededRandom(7);
const DAYS = 365;
const FIRST_DAY = 20_000;
const series = (middle: number, spread: number): DayValue[] =>
  Array.from({ length: DAYS }, (_, i) => ({ day: FIRST_DAY + i, value: middle + spread * (random() - 0.5), isUsable: random() > 0.1 }));

const OUTCOME_IDS: OutcomeId[] = ["day-time-in-range", "night-mean", "day-lows", "day-mean"];
const empty: DayValue[] = [];
const all: Record<OutcomeId, DayValue[]> = {
  "day-time-in-range": series(70, 40), "day-mean": series(150, 60), "day-lows": series(3, 4), "night-mean": series(140, 60), "night-time-in-range": series(75, 40),
  "breakfast-mean": empty, "lunch-mean": empty, "dinner-mean": empty, "correction-in-range": empty,
};

/** A year with a change a week, four outcomes each. */
function yearOfComparisons(): void {
  for (let week = 1; week < 52; week += 1) {
    const changeDay = FIRST_DAY + week * 7;
    for (const outcome of OUTCOME_IDS) {
      const input: ComparisonInput = {
        version: week + 1, against: week, changeDay, lastDay: changeDay + 6, hasVersionEnded: true, outcome, isBundle: false, isAimFewerHighs: true, targetHighMgDl: 130,
        earlierChanges: [{ day: changeDay - 7, parts: ["night"] }, { day: changeDay - 14, parts: ["night"] }], systemStartDay: null, series: all,
        below54Percent: series(0.5, 1), insulin: { night: [], day: [] }, programmed: { sensitivityMgDlPerUnit: 50, carbRatioGramsPerUnit: 12 },
      };
      compare(input);
    }
  }
}

const readings = Array.from({ length: DAYS * 288 }, (_, i) => ({ atMs: FIRST_DAY * 86_400_000 + i * 300_000, glucoseMgDl: 60 + Math.floor(random() * 200), band: 2 }));
const addUp = (): void => {
  let sum = 0;
  for (const { glucoseMgDl } of readings) sum += glucoseMgDl;
  if (sum < 0) throw new Error("impossible");
};

const floor = medianMs(addUp);
const comparisons = medianMs(yearOfComparisons);
const rollups = medianMs(() => void rollUp(readings, "Europe/Oslo"));
const line = (what: string, ms: number, note: string) => process.stdout.write(`${what.padEnd(52)} ${ms.toFixed(1).padStart(8)} ms  ${note}\n`);
line("adding up a year of readings (floor)", floor, "1.0");
line("rolling up a year of readings, day and night", rollups, `${(rollups / floor).toFixed(0)} times the floor`);
line("51 changes x 4 outcomes, engine alone", comparisons, `${(comparisons / rollups).toFixed(2)} times the roll-up`);
