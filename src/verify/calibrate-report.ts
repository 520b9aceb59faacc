import { CELLS, judge, ratesOf, type BarredCell, type CellRates } from "./calibrate-bars";
import { CHANGES_PER_PERSON, DAYS_BEFORE, LOOKS, type CellCounts } from "./calibrate-person";

/** A finished calibration, as it is written to a file and shown in the product. Shares are 0 to 1. */
export type CalibrationRun = Readonly<{
  seed: number;
  people: number;
  /** The day it was run, ISO 8601. */
  date: string;
  changesPerPerson: number;
  daysBefore: number;
  looks: Readonly<{ first: number; last: number }>;
  areAllBarsMet: boolean;
  cells: ReadonlyArray<BarredCell & Readonly<{ counts: CellCounts; rates: CellRates; judged: ReadonlyArray<{ text: string; isMet: boolean }> }>>;
}>;

/** @param counts one for each cell of CELLS, in their order */
export function calibrationRun(facts: { seed: number; people: number; date: string }, counts: ReadonlyArray<CellCounts>): CalibrationRun {
  const cells = CELLS.flatMap((cell, i) => {
    const of = counts[i];
    if (!of) return [];
    const rates = ratesOf(cell, of);
    return [{ ...cell, counts: of, rates, judged: judge(cell, rates) }];
  });
  return {
    ...facts, changesPerPerson: CHANGES_PER_PERSON, daysBefore: DAYS_BEFORE, looks: LOOKS,
    areAllBarsMet: cells.every(({ judged }) => judged.every(({ isMet }) => isMet)),
    cells,
  };
}

const HEADER = ["what was changed", "looked at", "insulin", "changes", "better", "worse", "more lows", "lower*", "covered**", "bars"];

const shown = (share: number | null) => (share === null ? "-" : `${(100 * share).toFixed(1)}%`);

/** The run as a table for a terminal: one line for each cell, then what every column means. */
export function calibrationText(run: CalibrationRun): string {
  const rows = run.cells.map(({ condition, outcome, isInsulinLogged, counts, rates, judged }) => [
    condition, outcome, isInsulinLogged ? "logged" : "-", String(counts.changes),
    shown(rates.better), shown(rates.worse), shown(rates.moreLows), shown(rates.lowerAtEqualInsulin), shown(rates.covered),
    judged.map(({ text, isMet }) => `${isMet ? "met" : "MISSED"}: ${text}`).join("; ") || "-",
  ]);
  const widths = HEADER.map((title, column) => Math.max(title.length, ...rows.map((row) => row[column]?.length ?? 0)));
  const line = (cells: ReadonlyArray<string>) => cells.map((cell, column) => cell.padEnd(widths[column] ?? 0)).join("  ").trimEnd();
  return [
    `${run.people} simulated people, seed ${run.seed}, ${run.changesPerPerson} changes each, ${run.daysBefore} days before, a look each day from day ${run.looks.first} to ${run.looks.last} after.`,
    "Shares are of changes that were called so on some look, by the shipped rules.",
    "",
    line(HEADER),
    ...rows.map(line),
    "",
    "*  days at equal insulin said lower, before lows are weighed: a change that also brought lows is found, and is worded as more lows.",
    "** 90% intervals of the plain difference on the last look that hold zero, the truth where nothing was changed.",
    "People, days and loop are invented (the published model, our population). Never tried out on real changes.",
    run.areAllBarsMet ? "All bars met." : "A bar was missed.",
    "",
  ].join("\n");
}
