import { adjustedEffect, type InsulinDay } from "@/domain/comparison/adjusted";
import { callAdjusted } from "@/domain/comparison/adjusted-call";
import { sidesOf } from "@/domain/comparison/windows";
import { numberIn, printRows, readRows } from "./csv-file";

const COLUMNS = ["case", "n_before", "n_after", "gamma", "diff", "q", "sigma", "nu", "se", "t", "raw_diff", "call"] as const;

/** Recompute the insulin-adjusted comparison of every case in a file. */
export function adjustCases(cases: Record<string, string>[], rows: Record<string, string>[]): Record<string, string | number | null>[] {
  return cases.map((row) => {
    const changeDay = numberIn(row, "change_day");
    const days: (InsulinDay & { isUsable: boolean })[] = rows
      .filter((d) => d.case === row.case && d.usable === "1")
      .map((d) => ({
        day: numberIn(d, "day"), glucoseMgDl: numberIn(d, "glucose_mgdl"), insulinUnits: numberIn(d, "insulin_u"),
        carbohydrateGrams: numberIn(d, "carbs_g"), isUsable: true,
      }));
    const sides = sidesOf({ changeDay, previousChangeDay: -Infinity, lastDay: Infinity, historyStart: null });
    const on = ({ first, last }: { first: number; last: number }) => days.filter(({ day }) => first <= day && day <= last);
    const before = on(sides.before);
    const after = on(sides.after);
    const effect = adjustedEffect(before, after, row.window === "night" ? "night" : "day", {
      sensitivityMgDlPerUnit: numberIn(row, "sensitivity_mgdl_per_u"),
      carbRatioGramsPerUnit: numberIn(row, "carb_ratio_g_per_u"),
    });
    const counts = { case: row.case ?? "", n_before: before.length, n_after: after.length };
    if (!effect) return { ...counts, call: "not_enough" };
    return {
      ...counts, gamma: effect.gamma, diff: effect.difference, q: effect.q, sigma: effect.sigma, nu: effect.nu,
      se: effect.standardError, t: effect.t, raw_diff: effect.rawDifference, call: callAdjusted(effect) ?? "cannot_tell",
    };
  });
}

export function run([casesFile, daysFile]: string[]): Promise<void> {
  if (!casesFile || !daysFile) throw new Error("adjusted needs CASES.csv and DAYS.csv");
  printRows(COLUMNS, adjustCases(readRows(casesFile), readRows(daysFile)));
  return Promise.resolve();
}
