import { callAdjusted } from "@/domain/comparison/adjusted-call";
import type { ComparisonDays } from "@/domain/comparison/windows";
import { changedSettings, type SettingFactors } from "@/domain/simulator/changed-settings";
import { idealSettings } from "@/domain/simulator/ideal-settings";
import { drawLivedDays } from "@/domain/simulator/lived-days";
import { drawLoopSettings, type LoopSettings } from "@/domain/simulator/loop-settings";
import { outcomeSeries, type OutcomeSeries } from "@/domain/simulator/outcome-series";
import { drawPerson } from "@/domain/simulator/person";
import { seededRandom } from "@/domain/simulator/random";
import { simulate } from "@/domain/simulator/run";
import { mmolToMgDl } from "@/domain/units";
import { lookAt, lowsOn, type Look, type LookFacts } from "./calibrate-look";
import { programmedMeans, splice } from "./calibrate-splice";

/** Days before a change, and days after it on which somebody looks. */
export const DAYS_BEFORE = 14;
export const LOOKS = { first: 3, last: 14 } as const;

/** Changes tried out on each person, one after the other's looks; their days before and after overlap. */
export const CHANGES_PER_PERSON = 6;

const WARM_UP_DAYS = 3;
const DAYS_APART = DAYS_BEFORE + 1;
const FIRST_CHANGE = WARM_UP_DAYS + DAYS_BEFORE + 1;
const RUN_DAYS = FIRST_CHANGE + (CHANGES_PER_PERSON - 1) * DAYS_APART + LOOKS.last + 2;
/** Day number of the first simulated day; only its place in the week matters. */
const FIRST_DAY = 20_006;
const isDayOff = (index: number) => [2, 3].includes((FIRST_DAY + index) % 7);

/** What was done on the change day (comparison.md 5.1). */
export const CONDITIONS = {
  nothing: {},
  "night basal 15% stronger": { nightBasal: 1.15 },
  "all settings 10-20% stronger": { nightBasal: 1.1, dayBasal: 1.1, carbRatio: 0.8, sensitivity: 0.8 },
} as const satisfies Record<string, SettingFactors>;

export type Condition = keyof typeof CONDITIONS;

/** One cell of the calibration: what was done, what was looked at, and whether insulin was logged. */
export type Cell = Readonly<{ condition: Condition; outcome: LookFacts["outcome"]; isInsulinLogged: boolean }>;

/** What came of the changes of one cell. Each count is of changes. */
export type CellCounts = Readonly<{
  changes: number;
  /** Called so on some look. */
  better: number;
  worse: number;
  moreLows: number;
  /** Days at equal insulin said "lower" on some look, whatever was said of lows. */
  lowerAtEqualInsulin: number;
  /** With a plain difference on the last look, and with zero inside its 90 % interval. */
  intervals: number;
  covered: number;
}>;

export const NO_COUNTS: CellCounts = { changes: 0, better: 0, worse: 0, moreLows: 0, lowerAtEqualInsulin: 0, intervals: 0, covered: 0 };

export function addCounts(a: CellCounts, b: CellCounts): CellCounts {
  const keys = Object.keys(NO_COUNTS) as (keyof CellCounts)[];
  return Object.fromEntries(keys.map((key) => [key, a[key] + b[key]])) as CellCounts;
}

function countLooks(looks: ReadonlyArray<Look>): CellCounts {
  const ever = (test: (look: Look) => boolean) => (looks.some(test) ? 1 : 0);
  const last = looks.at(-1)?.effect ?? null;
  return {
    changes: 1,
    better: ever(({ verdict }) => verdict === "better"),
    worse: ever(({ verdict }) => verdict === "worse"),
    moreLows: ever(({ verdict }) => verdict === "more-lows"),
    lowerAtEqualInsulin: ever(({ adjusted }) => adjusted !== null && callAdjusted(adjusted) === "lower"),
    intervals: last ? 1 : 0,
    covered: last && last.low90 <= 0 && last.high90 >= 0 ? 1 : 0,
  };
}

/** All looks at one change, for several cells that share its days. */
function looksAt(spliced: OutcomeSeries, changeDay: number, settings: LoopSettings, cells: ReadonlyArray<Cell>): Look[][] {
  const facts = { targetHighMgDl: mmolToMgDl(settings.aimMmol), programmed: programmedMeans(settings) };
  const looks: Look[][] = cells.map(() => []);
  for (let after = LOOKS.first; after <= LOOKS.last; after++) {
    const days: ComparisonDays = { changeDay, previousChangeDay: changeDay - 2 - DAYS_BEFORE, lastDay: changeDay + after, historyStart: null };
    const lows = lowsOn(spliced, days);
    cells.forEach((cell, i) => looks[i]?.push(lookAt(spliced, days, { ...facts, ...cell, lows })));
  }
  return looks;
}

/**
 * Draws one person, lets them live through the same days under each condition, and
 * asks the shipped comparison, day after day, about changes made on several days.
 *
 * @param seed of the calibration; with `index` it decides the person, whoever else is drawn
 * @returns counts for each cell, in the order of the cells
 */
export function calibratePerson(seed: number, index: number, cells: ReadonlyArray<Cell>): CellCounts[] {
  const random = seededRandom(seed, index);
  const parameters = drawPerson(random);
  const settings = drawLoopSettings(random, idealSettings(parameters));
  const life = drawLivedDays(random, RUN_DAYS, isDayOff);
  const livedUnder = (inForce: LoopSettings) =>
    outcomeSeries(simulate(parameters, life, [{ fromSlot: 0, settings: inForce }]), life.meals, FIRST_DAY);
  const base = livedUnder(settings);
  const counts = cells.map(() => NO_COUNTS);
  for (const condition of new Set(cells.map((cell) => cell.condition))) {
    const places = [...cells.keys()].filter((i) => cells[i]?.condition === condition);
    const asked = places.flatMap((i) => cells[i] ?? []);
    const changed = condition === "nothing" ? base : livedUnder(changedSettings(settings, CONDITIONS[condition]));
    for (let change = 0; change < CHANGES_PER_PERSON; change++) {
      const changeDay = FIRST_DAY + FIRST_CHANGE + change * DAYS_APART;
      const looks = looksAt(splice(base, changed, changeDay), changeDay, settings, asked);
      places.forEach((place, i) => (counts[place] = addCounts(counts[place] ?? NO_COUNTS, countLooks(looks[i] ?? []))));
    }
  }
  return counts;
}
