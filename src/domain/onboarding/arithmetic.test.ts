import { describe, expect, it } from "vitest";
import { arithmeticOf } from "./arithmetic";
import { INJECTIONS, PUMP, PUMP_DRAFT, REFERENCE_DRAFT } from "./draft.fixture";

describe("arithmeticOf", () => {
  // Computed in settings.md 3.2 for 80 kg and injections of 40 U: cautious 0.50 U/h, 17 g/U, 60 mg/dL; standard 0.55, 15, 52.
  it("gives the reference person the figures of the reference", () => {
    expect(arithmeticOf(REFERENCE_DRAFT, INJECTIONS, false)).toMatchObject({
      gate: { open: true }, route: "injections",
      basal: { cautious: 0.5, standard: 0.55 }, carbRatio: { cautious: 17, standard: 15 }, sensitivity: { cautious: 60, standard: 52 },
      profile: { cautious: { limits: { maxBolusUnits: 6 } } },
    });
  });

  it("works from the totals of days as from their mean", () => {
    const answers = { ...REFERENCE_DRAFT, "about-you": { ...REFERENCE_DRAFT["about-you"], totalDailyDoseUnits: "", dailyTotals: "38\n42\n40" } };
    expect(arithmeticOf(answers, INJECTIONS, false)?.totalDailyDose.cautious).toBe(30);
  });

  it.each(["about-you", "gate"])("can't tell while the page %s is missing", (page) => {
    const { [page]: _missing, ...rest } = REFERENCE_DRAFT;
    expect(arithmeticOf(rest, INJECTIONS, false)).toBeNull();
  });

  it("shows not one number while the gate is closed, and all of them to an educator", () => {
    const closed = { ...REFERENCE_DRAFT, gate: { ...REFERENCE_DRAFT.gate, steroids: "not-sure" } };
    const forPerson = arithmeticOf(closed, INJECTIONS, false);
    expect(forPerson).toMatchObject({ gate: { open: false }, profile: null, totalDailyDose: { cautious: null, methods: [] } });
    expect(JSON.stringify({ ...forPerson, gate: null, checks: null })).not.toMatch(/\d/);
    expect(arithmeticOf(closed, INJECTIONS, true)?.profile?.cautious.basal).toEqual([{ startMinute: 0, unitsPerHour: 0.5 }]);
  });

  it("carries a pump's settings over unchanged, with a bolus limit on the device's step", () => {
    const answer = arithmeticOf(PUMP_DRAFT, PUMP, false);
    expect(answer?.route).toBe("pump");
    expect(answer?.profile?.cautious).toMatchObject({
      basal: [{ startMinute: 0, unitsPerHour: 0.6 }, { startMinute: 240, unitsPerHour: 0.85 }, { startMinute: 540, unitsPerHour: 0.525 }],
      carbRatio: [{ startMinute: 0, gramsPerUnit: 12.5 }], sensitivity: [{ startMinute: 0, mgDlPerUnit: 42.5 }],
      limits: { maxBolusUnits: 6 }, durationOfActionMinutes: 240,
    });
  });

  it("uses the longer duration of older adults for a pump, too", () => {
    const older = { ...PUMP_DRAFT, "about-you": { ...PUMP_DRAFT["about-you"], ageYears: "70" } };
    expect(arithmeticOf(older, PUMP, false)?.profile?.cautious.durationOfActionMinutes).toBe(300);
  });

  it("can't tell for a pump whose settings are not written down", () => expect(arithmeticOf(REFERENCE_DRAFT, PUMP, false)).toBeNull());
});
