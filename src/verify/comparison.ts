import { daysNeeded } from "@/domain/comparison/days-needed";
import { effectiveDays, type OutcomeKind } from "@/domain/comparison/correlation";
import type { DayValue } from "@/domain/comparison/day-value";
import { estimateEffect } from "@/domain/comparison/effect";
import { studentTQuantile } from "@/domain/comparison/student-t";
import { sortDays } from "@/domain/comparison/windows";
import { numberIn, optionalNumberIn, printRows, readRows } from "./csv-file";

const COLUMNS = [
  "case", "n_before", "n_after", "diff", "q", "sigma", "nu", "se", "t", "lo95", "hi95", "lo90", "hi90", "shrunk", "p_better",
  "eff_before", "eff_after", "more_days_if_diff_stays", "more_days_for_target_80pct", "n_history_days", "call",
] as const;

/** Days after the change before a difference may be called either way. */
const DAYS_TO_CALL = 5;
const WANTED_POINTS = 5;

/** Recompute the plain comparison of every case in a file, by the interval rule alone. */
export function compareCases(cases: Record<string, string>[], days: Record<string, string>[]): Record<string, string | number | null>[] {
  return cases.map((row) => compareCase(row, days.filter((d) => d.case === row.case)));
}

function compareCase(row: Record<string, string>, rows: Record<string, string>[]): Record<string, string | number | null> {
  const kind: OutcomeKind = row.kind === "win" ? "win" : "day";
  const isSettling = numberIn(row, "settling") === 1;
  const series: DayValue[] = rows
    .filter((d) => d.value !== "")
    .map((d) => ({ day: numberIn(d, "day"), value: numberIn(d, "value"), isUsable: numberIn(d, "usable") === 1 }));
  const lastDay = numberIn(row, "last_day");
  const { before, after, history } = sortDays(series, {
    changeDay: numberIn(row, "change_day"),
    previousChangeDay: numberIn(row, "prev_change_day"),
    lastDay,
    historyStart: optionalNumberIn(row, "hist_start"),
  });
  const counts = { case: row.case ?? "", n_before: before.length, n_after: after.length, n_history_days: history.length };
  const effect = estimateEffect({ before, after, history, kind, sigma0: numberIn(row, "sigma0"), isSettling });
  if (!effect) return { ...counts, call: "not_enough" };
  const numbers = { before: before.map((d) => d.day), after: after.map((d) => d.day), lastDay };
  const needed = daysNeeded(effect, numbers, kind, isSettling, WANTED_POINTS);
  const mayCall = effect.nAfter >= DAYS_TO_CALL;
  const isWorse = effect.t < -studentTQuantile(0.95, effect.nu);
  return {
    ...counts, diff: effect.difference, q: effect.q, sigma: effect.sigma, nu: effect.nu, se: effect.standardError, t: effect.t,
    lo95: effect.low95, hi95: effect.high95, lo90: effect.low90, hi90: effect.high90, shrunk: effect.shrunk, p_better: effect.chanceAbove,
    eff_before: effectiveDays(kind, numbers.before), eff_after: effectiveDays(kind, numbers.after),
    more_days_if_diff_stays: needed.ifDifferenceStays, more_days_for_target_80pct: needed.forTarget,
    call: mayCall && effect.low95 > 0 ? "helped" : mayCall && isWorse ? "worse" : "cannot_tell",
  };
}

export function run([casesFile, daysFile]: string[]): Promise<void> {
  if (!casesFile || !daysFile) throw new Error("comparison needs CASES.csv and DAYS.csv");
  printRows(COLUMNS, compareCases(readRows(casesFile), readRows(daysFile)));
  return Promise.resolve();
}
