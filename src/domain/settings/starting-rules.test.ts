import { describe, expect, it } from "vitest";
import { estimateDailyDose } from "./daily-dose";
import { fractionOf, toNumber } from "./fraction";
import { methodById } from "./methods";
import { inputsAt, microMgDl, STARTING_RULES, startingCarbRatio, startingSensitivity } from "./starting-rules";

const sensitivityAt = (units: number, glucoseUnit: "mg/dL" | "mmol/L", hypoProne = false) =>
  toNumber(startingSensitivity(fractionOf(units), { hypoProne, glucoseUnit }).rounded);

describe("the rules of the starting profile", () => {
  it("are all in the table of published rules", () => {
    const ids = Object.values(STARTING_RULES).flat();
    expect(ids.map((id) => methodById(id).id)).toEqual(ids);
  });

  it.each([
    [30, 17],
    [35, 15],
    [50, 10],
    [49.9, 11],
    [100, 5],
  ])("500 / %s U is %s g/U, up to a whole gram", (units, grams) => {
    expect(toNumber(startingCarbRatio(fractionOf(units)).rounded)).toBe(grams);
  });

  it.each([
    [30, 60, 66, 3.4, 3.7],
    [35, 52, 56, 2.9, 3.2],
    [50, 36, 40, 2, 2.2],
    [100, 18, 20, 1, 1.1],
  ])("%s U: 1800 gives %s and 1960 gives %s mg/dL; %s and %s mmol/L", (units, mgDl, mgDlProne, mmol, mmolProne) => {
    expect(sensitivityAt(units, "mg/dL")).toBe(mgDl);
    expect(sensitivityAt(units, "mg/dL", true)).toBe(mgDlProne);
    expect(sensitivityAt(units, "mmol/L")).toBe(mmol);
    expect(sensitivityAt(units, "mmol/L", true)).toBe(mmolProne);
  });

  it("turns a rule into mmol/L with 18, the weaker side: 100 / 39.984 is 2.501, up to 2.6", () => {
    // With 18.0156 it would be 2.4989 and stay at 2.5.
    expect(sensitivityAt(39.984, "mmol/L")).toBe(2.6);
  });

  it("stores 3.4 mmol/L as 61.25304 mg/dL, with 18.0156 as everywhere", () => {
    expect(toNumber(microMgDl(fractionOf(3.4), "mmol/L"))).toBe(61_253_040);
    expect(toNumber(microMgDl(fractionOf(60), "mg/dL"))).toBe(60_000_000);
  });

  it("know basal and ratio of a dose for the rules that need them", () => {
    const inputs = inputsAt(fractionOf(30), estimateDailyDose(80, { route: "injections", dailyDoseUnits: 40 }));
    expect(inputs).toMatchObject({
      totalDailyDose: fractionOf(30),
      basalDailyDose: fractionOf(12),
      weightKg: fractionOf(80),
    });
    expect(toNumber(inputs.carbRatio ?? fractionOf(0))).toBeCloseTo(16.667, 3);
  });
});
