import { describe, expect, it } from "vitest";
import { dailyDoseOf, readDailyTotals } from "./daily-totals";

describe("readDailyTotals", () => {
  // Worked example W20 of the reference: 210 U in 7 days is 30 U a day (workspace 9.1 of a pump workbook).
  it("averages the days", () => expect(readDailyTotals("30\n28\n32\n30\n31,0 U\n29\n30")).toEqual({ days: 7, meanUnits: 30 }));
  it("has nothing to say of nothing", () => expect(readDailyTotals(" \n ")).toBeNull());
  it.each([["40\nforty", "Line 2"], ["0.5", "Line 1"], ["400", "Line 1"]])("names the line at fault in %j", (typed, line) => expect(readDailyTotals(typed)).toContain(line));
  it("reads a month at most", () => expect(readDailyTotals(Array(32).fill("40").join("\n"))).toContain("31"));
});

describe("dailyDoseOf", () => {
  it("takes the typed dose, else the mean, rounded to the weaker side", () => {
    expect(dailyDoseOf({ totalDailyDoseUnits: 41, dailyTotals: { days: 2, meanUnits: 39 } })).toBe(41);
    expect(dailyDoseOf({ totalDailyDoseUnits: null, dailyTotals: { days: 3, meanUnits: 38.3666666 } })).toBe(38.3);
    expect(dailyDoseOf({ totalDailyDoseUnits: null, dailyTotals: { days: 3, meanUnits: 38.7 } })).toBe(38.7);
    expect(dailyDoseOf({ totalDailyDoseUnits: null })).toBeNull();
  });
});
