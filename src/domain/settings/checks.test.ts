import { describe, expect, it } from "vitest";
import { checkProfile, type CheckFacts } from "./checks";
import { fillText } from "./check-texts";
import { clockText } from "./clock-text";
import type { SettingsProfile } from "./profile";
import { exampleProfile } from "./profile.fixture";

/** Basal of the example: 4 x 0.5 + 18 x 0.65 + 2 x 0.55 = 14.8 U, 41 % of 36 U. */
const FACTS: CheckFacts = {
  totalDailyDoseUnits: 36,
  weightKg: 70,
  basalStepMilliUnits: 50,
  bolusStepMilliUnits: 50,
  largestRecentBolusMilliUnits: 8000,
};

const checks = (profile: Partial<SettingsProfile> = {}, facts: Partial<CheckFacts> = {}) =>
  checkProfile(exampleProfile(profile), { ...FACTS, ...facts });
const codes = (...args: Parameters<typeof checks>) => checks(...args).map(({ code, severity }) => `${severity} ${code}`);
const STANDING = "informs ketones-and-site";
const limits = (maxBasal: number | null, maxBolus: number | null) => ({
  limits: {
    maxBasalMilliUnitsPerHour: maxBasal,
    maxBolusMilliUnits: maxBolus,
    maxInsulinOnBoardMilliUnits: null,
  },
});

describe("the checks of a review", () => {
  it("have nothing but the standing text for the example", () => {
    expect(codes()).toEqual([STANDING]);
  });

  it("block a day that is not covered, and say no more than that", () => {
    const found = checks({ basal: [{ startMinute: 60, milliUnitsPerHour: 500 }], carbRatio: [] });
    expect(found.map(({ code, severity }) => `${severity} ${code}`)).toEqual([
      "blocks day-not-covered",
      "blocks day-not-covered",
      STANDING,
    ]);
    expect(found[0]?.text).toBe("basal: the first block starts at minute 0.");
  });

  it.each([
    [24.5, "asks basal-share"],
    [24.7, STANDING],
    [49.3, STANDING],
    [49.4, "asks basal-share"],
  ])("basal share, 14.8 U of %s U: 30 to 60 %% is inside", (totalDailyDoseUnits, first) => {
    expect(codes({}, { totalDailyDoseUnits })[0]).toBe(first);
  });

  it("counts exactly 30 and 60 % as inside", () => {
    const flat = { basal: [{ startMinute: 0, milliUnitsPerHour: 500 }] };
    expect(codes(flat, { totalDailyDoseUnits: 40 })).toEqual([STANDING]);
    expect(codes(flat, { totalDailyDoseUnits: 20, weightKg: 40 })).toEqual([STANDING]);
  });

  it("say the share in words", () => {
    expect(checks({}, { totalDailyDoseUnits: 60 })[0]?.text).toBe(
      "Basal is 24.7% of the day's insulin here. Published shares run from 30 to 60%.",
    );
  });

  it.each([
    [{ totalDailyDoseUnits: 19.9, weightKg: 40 }, "asks dose-outside-span"],
    [{ totalDailyDoseUnits: 36, weightKg: 121 }, "asks dose-for-weight"],
    [{ totalDailyDoseUnits: 36, weightKg: 35 }, "asks dose-for-weight"],
  ])("ask about %j", (facts, expected) => {
    expect(codes({}, facts)).toContain(expected);
  });

  it("keep silent on what is not known", () => {
    expect(codes({}, { totalDailyDoseUnits: null, weightKg: null, largestRecentBolusMilliUnits: null })).toEqual([
      STANDING,
    ]);
    expect(codes({}, { weightKg: null })).toEqual([STANDING]);
  });

  it("ask where sensitivity and ratio do not go together, at the first place", () => {
    const sensitivity = [
      { startMinute: 0, microMgDlPerUnit: 60_000_000 },
      { startMinute: 720, microMgDlPerUnit: 30_000_000 },
      { startMinute: 900, microMgDlPerUnit: 200_000_000 },
    ];
    const found = checks({ sensitivity }).filter(({ code }) => code === "ratio-sensitivity");
    expect(found).toHaveLength(1);
    expect(found[0]?.text).toMatch(/^From 12:00 the sensitivity factor is 1\.9 times the carb ratio/);
  });

  it("find a ratio block that starts on its own", () => {
    const carbRatio = [
      { startMinute: 0, milligramsPerUnit: 17_000 },
      { startMinute: 300, milligramsPerUnit: 5_000 },
    ];
    expect(checks({ carbRatio })[0]?.text).toMatch(/^From 05:00/);
  });

  it("block a basal limit under a rate, and ask about a bolus limit that is open or above the recent doses", () => {
    expect(codes(limits(600, 8000))).toEqual(["blocks limit-below-basal", STANDING]);
    expect(codes(limits(650, 8000))).toEqual([STANDING]);
    expect(codes(limits(null, null))).toEqual(["asks limit-open", STANDING]);
    expect(codes(limits(null, 8050))).toEqual(["asks limit-above-recent", STANDING]);
    expect(codes(limits(null, 8050), { largestRecentBolusMilliUnits: null })).toEqual([STANDING]);
  });

  it("block what is not on the device's step", () => {
    const basal = [
      { startMinute: 0, milliUnitsPerHour: 500 },
      { startMinute: 270, milliUnitsPerHour: 675 },
    ];
    const found = checks({ basal });
    expect(found[0]).toEqual({
      code: "basal-off-step",
      severity: "blocks",
      text: "The rate from 04:30, 0.675 U/h, is not on the pump's step of 0.05 U/h.",
    });
    expect(codes({ basal }, { basalStepMilliUnits: 25 })).toEqual([STANDING]);
    expect(codes(limits(null, 7990))).toContain("blocks limit-off-step");
  });

  it("ask about a rate of zero", () => {
    const basal = [
      { startMinute: 0, milliUnitsPerHour: 0 },
      { startMinute: 60, milliUnitsPerHour: 600 },
    ];
    expect(codes({ basal })).toContain("asks basal-zero");
  });
});

describe("texts", () => {
  it("leave a place standing for which there is no value", () => {
    expect(fillText("{a} of {b}", { a: 1 })).toBe("1 of {b}");
    expect(fillText("{a}", { a: "{b}", b: 2 })).toBe("{b}");
  });

  it.each([
    [0, "00:00"],
    [61, "01:01"],
    [1439, "23:59"],
    [1440, "24:00"],
  ])("minute %s is %s on the clock", (minute, text) => {
    expect(clockText(minute)).toBe(text);
  });
});
