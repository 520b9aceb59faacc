import { z } from "zod";
import { readDecimal } from "@/domain/form-text";

const MOST_DAYS = 31;

/** The insulin of single days, and their plain mean: the dose before a pump is an average (settings.md 1.2). */
export type DailyTotals = Readonly<{ days: number; meanUnits: number }>;

/**
 * Totals of days, one a line, basal and meals together; "38,5 U" is borne with.
 *
 * @returns null for nothing typed, or a sentence that names the line at fault
 */
export function readDailyTotals(typed: string): DailyTotals | null | string {
  const lines = typed.split(/[\n;]+/).map((line) => line.trim()).filter(Boolean);
  if (lines.length === 0) return null;
  if (lines.length > MOST_DAYS) return `At most ${MOST_DAYS} days.`;
  const units: number[] = [];
  for (const [i, line] of lines.entries()) {
    const value = readDecimal(line);
    if (typeof value === "string" || value < 1 || value > 300) return `Line ${i + 1} is not the insulin of one day, between 1 and 300 U.`;
    units.push(value);
  }
  return { days: units.length, meanUnits: units.reduce((sum, value) => sum + value, 0) / units.length };
}

export const dailyTotals = z.string().max(1000, "At most 1000 characters.").transform((typed, ctx) => {
  const read = readDailyTotals(typed);
  if (typeof read !== "string") return read;
  ctx.addIssue({ code: "custom", message: read });
  return z.NEVER;
});

/**
 * The daily dose a page stands for: what was typed, or the mean of the days, to
 * a tenth of a unit downwards, the weaker side.
 */
export function dailyDoseOf(page: Readonly<{ totalDailyDoseUnits: number | null; dailyTotals?: DailyTotals | null }>): number | null {
  if (page.totalDailyDoseUnits !== null) return page.totalDailyDoseUnits;
  return page.dailyTotals ? Math.floor(Math.round(page.dailyTotals.meanUnits * 1e6) / 1e5) / 10 : null;
}
