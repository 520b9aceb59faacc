import { describe, expect, it } from "vitest";
import { estimateDailyDose } from "./daily-dose";
import { fractionOf, toNumber } from "./fraction";

describe("the total daily dose of the new setup", () => {
  it.each([
    ["80 kg and 40 U (settings.md 3.2, computed there)", 80, 40, 30, 40, 30, 35],
    ["71 kg and 40 U (content.md 13)", 71, 40, 30, 35.5, 30, 32.75],
    ["weight gives the smaller one", 50, 40, 30, 25, 25, 27.5],
  ])("%s", (_who, weightKg, dailyDoseUnits, fromPresent, fromWeight, cautious, standard) => {
    const dose = estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits });
    expect(dose).toMatchObject({
      fromPresent: fractionOf(fromPresent),
      fromWeight: fractionOf(fromWeight),
      cautious: fractionOf(cautious),
      standard: fractionOf(standard),
    });
  });

  it("carries a pump's dose over unchanged", () => {
    const dose = estimateDailyDose(80, { route: "pump", dailyDoseUnits: 38.4 });
    expect(dose).toMatchObject({ cautious: fractionOf(38.4), standard: fractionOf(38.4), present: fractionOf(38.4) });
    expect(dose.inputs.injectionsDailyDose).toBeUndefined();
  });

  it("knows body weight in pounds too: 80 kg are 176.37 lb", () => {
    const { inputs } = estimateDailyDose(80, { route: "injections", dailyDoseUnits: 40 });
    expect(toNumber(inputs.weightPounds ?? fractionOf(0))).toBeCloseTo(176.37, 2);
  });
});
