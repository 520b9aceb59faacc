import { describe, expect, it } from "vitest";
import { estimateDailyDose } from "./daily-dose";
import { gateDoseReasons } from "./gate-dose";

const fromInjections = (weightKg: number, dailyDoseUnits: number) =>
  gateDoseReasons(estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits })).map(({ code }) => code);
const fromPump = (weightKg: number, dailyDoseUnits: number) =>
  gateDoseReasons(estimateDailyDose(weightKg, { route: "pump", dailyDoseUnits })).map(({ code }) => code);

describe("reasons in the typed numbers", () => {
  it.each([
    [80, 40],
    [71, 40],
    [60, 40],
    [100, 70],
  ])("has none for %s kg and %s U", (weightKg, units) => {
    expect(fromInjections(weightKg, units)).toEqual([]);
  });

  it("looks at the dose as typed and at both presets: under 20 U and over 100 U", () => {
    expect(fromInjections(40, 19)).toContain("totalDailyDoseOutOfRange");
    // 26 U typed, but 26 x 0.75 = 19.5 for the preset.
    expect(fromInjections(50, 26)).toEqual(["totalDailyDoseOutOfRange"]);
    // 26.67 x 0.75 = 20.0025: inside.
    expect(fromInjections(50, 26.67)).toEqual([]);
    expect(fromInjections(180, 101)).toEqual(["totalDailyDoseOutOfRange"]);
  });

  it("counts the border as inside: 20 and 100 U on a pump", () => {
    expect(fromPump(50, 20)).toEqual([]);
    expect(fromPump(50, 19.999)).toEqual(["totalDailyDoseOutOfRange"]);
    expect(fromPump(120, 100)).toEqual([]);
    expect(fromPump(120, 100.001)).toEqual(["totalDailyDoseOutOfRange"]);
  });

  it("looks at the dose for each kg: 0.3 to 1.0, border inside", () => {
    expect(fromPump(100, 30)).toEqual([]);
    expect(fromPump(100, 29.999)).toEqual(["dosePerKgOutOfRange"]);
    expect(fromPump(60, 60)).toEqual([]);
    expect(fromPump(60, 60.001)).toEqual(["dosePerKgOutOfRange"]);
  });

  it("finds estimates more than 30 % of their mean apart, border inside", () => {
    // a = 34, b = 46: 12 / 40 = 0.30 exactly.
    expect(fromInjections(92, 34 / 0.75)).not.toContain("estimatesFarApart");
    expect(fromInjections(80, 29.5)).toContain("estimatesFarApart");
    // a = 25.5, b = 34.5: 9 / 30 = 0.30 exactly, in typed decimals.
    expect(fromInjections(69, 34)).toEqual([]);
    expect(fromInjections(69.01, 34)).toEqual(["estimatesFarApart"]);
  });

  it("finds a weight estimate under 0.70 of the injections, border inside", () => {
    expect(fromInjections(56, 40)).toEqual([]);
    expect(fromInjections(55.99, 40)).toEqual(["weightEstimateTooLow"]);
  });

  it("does not compare estimates where a pump's dose is carried over", () => {
    expect(fromPump(120, 40)).toEqual([]);
  });

  it("may have several reasons", () => {
    expect(fromInjections(40, 120)).toEqual([
      "totalDailyDoseOutOfRange",
      "dosePerKgOutOfRange",
      "estimatesFarApart",
      "weightEstimateTooLow",
    ]);
  });
});
