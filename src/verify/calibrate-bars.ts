import type { Cell, CellCounts } from "./calibrate-person";

/** What a cell is held to, as shares of its changes; a cell without a bar is shown for comparison. */
export type Bars = Readonly<{
  /** False calls of "better", where nothing was changed. */
  betterAtMost?: number;
  /** "Lower" at equal insulin, where nothing was changed. */
  falselyLowerAtMost?: number;
  /** Share of 90 % intervals of the plain difference that hold the truth. */
  coverage?: Readonly<{ atLeast: number; atMost: number }>;
  /** True changes told apart at equal insulin. */
  foundAtLeast?: number;
}>;

export type BarredCell = Cell & Readonly<{ bars: Bars }>;

const COVERAGE = { atLeast: 0.87, atMost: 0.97 } as const;
const PLAIN: Bars = { betterAtMost: 0.05, coverage: COVERAGE };
const AT_EQUAL_INSULIN: Bars = { betterAtMost: 0.05, falselyLowerAtMost: 0.05 };

const nothing = (outcome: Cell["outcome"], isInsulinLogged: boolean): BarredCell => ({
  condition: "nothing", outcome, isInsulinLogged, bars: isInsulinLogged ? AT_EQUAL_INSULIN : PLAIN,
});

/** Each primary outcome with nothing changed; then two true changes, without and with an insulin log. */
export const CELLS: ReadonlyArray<BarredCell> = [
  nothing("night-mean", false),
  nothing("breakfast-mean", false),
  nothing("day-time-in-range", false),
  nothing("correction-in-range", false),
  nothing("night-mean", true),
  nothing("day-time-in-range", true),
  nothing("correction-in-range", true),
  { condition: "night basal 15% stronger", outcome: "night-mean", isInsulinLogged: false, bars: {} },
  { condition: "night basal 15% stronger", outcome: "night-mean", isInsulinLogged: true, bars: { foundAtLeast: 0.45 } },
  { condition: "all settings 10-20% stronger", outcome: "day-time-in-range", isInsulinLogged: false, bars: {} },
  { condition: "all settings 10-20% stronger", outcome: "day-time-in-range", isInsulinLogged: true, bars: { foundAtLeast: 0.8 } },
];

/** The shares of a cell, 0 to 1. `covered` only where nothing was changed: elsewhere the truth is not zero. */
export type CellRates = Readonly<{
  better: number; worse: number; moreLows: number; lowerAtEqualInsulin: number | null; covered: number | null;
}>;

export function ratesOf({ condition, isInsulinLogged }: Cell, counts: CellCounts): CellRates {
  return {
    better: counts.better / counts.changes,
    worse: counts.worse / counts.changes,
    moreLows: counts.moreLows / counts.changes,
    lowerAtEqualInsulin: isInsulinLogged ? counts.lowerAtEqualInsulin / counts.changes : null,
    covered: condition === "nothing" && counts.intervals > 0 ? counts.covered / counts.intervals : null,
  };
}

const percent = (share: number) => `${(100 * share).toFixed(1)}%`;

/** Each bar of a cell in words, with whether it was met. */
export function judge({ bars }: BarredCell, rates: CellRates): { text: string; isMet: boolean }[] {
  const judged: { text: string; isMet: boolean }[] = [];
  const add = (isMet: boolean, text: string) => judged.push({ isMet, text });
  const { betterAtMost, falselyLowerAtMost, coverage, foundAtLeast } = bars;
  const lower = rates.lowerAtEqualInsulin ?? 0;
  if (betterAtMost !== undefined) add(rates.better <= betterAtMost, `"better" ${percent(rates.better)}, at most ${percent(betterAtMost)}`);
  if (falselyLowerAtMost !== undefined) add(lower <= falselyLowerAtMost, `"lower" ${percent(lower)}, at most ${percent(falselyLowerAtMost)}`);
  if (coverage !== undefined) {
    const covered = rates.covered ?? 0;
    add(covered >= coverage.atLeast && covered <= coverage.atMost, `covered ${percent(covered)}, ${percent(coverage.atLeast)} to ${percent(coverage.atMost)}`);
  }
  if (foundAtLeast !== undefined) add(lower >= foundAtLeast, `found ${percent(lower)}, at least ${percent(foundAtLeast)}`);
  return judged;
}
