import { describe, expect, it } from "vitest";
import { profileToApi } from "./profile-api";
import { EXAMPLE_PROFILE } from "./profile.fixture";
import { startingProfile } from "./starting-profile";
import { OPEN_GATE, REFERENCE_REQUEST } from "./starting-profile.fixture";
import { startingProfileRequestSchema } from "./starting-profile-request";

const answer = (parts: object = {}) =>
  startingProfile(startingProfileRequestSchema.parse({ ...REFERENCE_REQUEST, ...parts }));

/** Every number in a value, however deep. */
function numbersIn(value: unknown): number[] {
  if (typeof value === "number") return [value];
  if (value === null || typeof value !== "object") return [];
  return Object.values(value).flatMap(numbersIn);
}

const flat = (unitsPerHour: number, gramsPerUnit: number, mgDlPerUnit: number) => ({
  basal: [{ startMinute: 0, unitsPerHour }],
  carbRatio: [{ startMinute: 0, gramsPerUnit }],
  sensitivity: [{ startMinute: 0, mgDlPerUnit }],
});

describe("the reference person: 80 kg, 40 U (settings.md 3.2, computed there)", () => {
  it("starts cautiously from 30 U: 0.50 U/h, 17 g, 60 mg/dL; 0.55 U/h, 15 g, 52 from 35 U as standard", () => {
    const { gate, totalDailyDose, profile } = answer();
    expect(gate).toEqual({ open: true, reasons: [] });
    expect(totalDailyDose).toMatchObject({ cautious: 30, standard: 35 });
    expect(profile?.cautious).toMatchObject(flat(0.5, 17, 60));
    expect(profile?.standard).toMatchObject(flat(0.55, 15, 52));
  });

  it("shows the exact figures beside the rounded ones", () => {
    const { basal, carbRatio, sensitivity } = answer();
    expect(basal).toMatchObject({ cautious: 0.5, standard: 0.55, exact: { cautious: 0.5 } });
    expect(basal.exact?.standard).toBeCloseTo(0.5833, 4);
    expect(carbRatio).toMatchObject({ cautious: 17, standard: 15 });
    expect(carbRatio.exact?.cautious).toBeCloseTo(16.667, 3);
    expect(sensitivity).toMatchObject({ cautious: 60, standard: 52, mmol: { cautious: 3.4, standard: 2.9 } });
  });

  it("uses 1960 where lows are frequent: 66 mg/dL", () => {
    const { sensitivity, profile } = answer({ hypoProne: true });
    expect(sensitivity).toMatchObject({ cautious: 66, standard: 56 });
    expect(profile?.cautious).toMatchObject(flat(0.5, 17, 66));
  });

  it("shows half the dose as the other published basal: 0.60 U/h on this step, 0.625 exact", () => {
    const { basal } = answer();
    expect(basal.otherShare).toMatchObject({ id: "basal-0.50", cautious: 0.6, standard: 0.7 });
    expect(basal.methods.find(({ id }) => id === "basal-0.50")?.unitsPerHour.cautious).toBe(0.625);
  });

  it("shows how far the methods lie apart, from the smallest to the largest", () => {
    const { carbRatio, sensitivity, basal } = answer();
    const ratios = carbRatio.methods.map(({ gramsPerUnit }) => gramsPerUnit.cautious);
    const factors = sensitivity.methods.map(({ mgDlPerUnit }) => mgDlPerUnit.standard);
    const rates = basal.methods.map(({ unitsPerHour }) => unitsPerHour.cautious);
    expect(carbRatio.spread?.cautious).toEqual({ low: Math.min(...ratios), high: Math.max(...ratios) });
    expect(sensitivity.spread?.standard).toEqual({ low: Math.min(...factors), high: Math.max(...factors) });
    expect(basal.spread?.cautious).toEqual({ low: Math.min(...rates), high: Math.max(...rates) });
    // 106 / (0.40 x 30) to 500 / 30.
    expect(carbRatio.spread?.cautious.low).toBeCloseTo(8.833, 3);
    expect(carbRatio.spread?.cautious.high).toBeCloseTo(16.667, 3);
  });

  it("lists every method with its source and provenance", () => {
    const { totalDailyDose, basal, carbRatio, sensitivity, target, durationOfAction } = answer();
    for (const { methods } of [totalDailyDose, basal, carbRatio, sensitivity, target, durationOfAction]) {
      expect(methods.length).toBeGreaterThan(0);
      for (const { source, label, provenance } of methods) {
        expect([source, label]).not.toContain("");
        expect(["R", "A", "S", "M", "C", "CP"]).toContain(provenance);
      }
    }
    expect(totalDailyDose.methods).toContainEqual(expect.objectContaining({ id: "injections-0.75", units: 30 }));
    expect(totalDailyDose.methods).toContainEqual(expect.objectContaining({ id: "weight-0.5", units: 40 }));
  });
});

describe("the demo person: 71 kg, 40 U (content.md 13)", () => {
  it("has 30 and 35.5 U, cautious 30 and standard 32.75; 0.50 U/h, 17 g, 60 mg/dL, target 120 to 130", () => {
    const { totalDailyDose, profile } = answer({ weightKg: 71, ageYears: 38 });
    expect(totalDailyDose).toMatchObject({ cautious: 30, standard: 32.75 });
    expect(totalDailyDose.methods).toContainEqual(expect.objectContaining({ id: "weight-0.5", units: 35.5 }));
    expect(profile?.cautious).toMatchObject({
      ...flat(0.5, 17, 60),
      target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
      durationOfActionMinutes: 240,
    });
  });
});

describe("steps, units, age and limits", () => {
  it("rounds basal down to the pump's own step", () => {
    expect(answer({ insulinStepUnits: 0.025 }).profile?.standard.basal).toEqual([{ startMinute: 0, unitsPerHour: 0.575 }]);
    expect(answer({ insulinStepUnits: 0.1 }).profile?.standard.basal).toEqual([{ startMinute: 0, unitsPerHour: 0.5 }]);
    expect(answer({ insulinStepUnits: undefined }).profile?.standard.basal[0]?.unitsPerHour).toBe(0.55);
  });

  it("keeps what a device in mmol/L can hold: 3.4 and 2.9, and a target of 6.7 to 7.3", () => {
    const { profile, sensitivity } = answer({ glucoseUnit: "mmol/L" });
    expect(profile?.cautious.sensitivity[0]?.mgDlPerUnit).toBe(61.25304);
    expect(profile?.standard.sensitivity[0]?.mgDlPerUnit).toBe(52.24524);
    expect(sensitivity).toMatchObject({ cautious: 60, standard: 52 });
    const { lowMgDl = 0, highMgDl = 0 } = profile?.cautious.target[0] ?? {};
    expect([lowMgDl / 18.0156, highMgDl / 18.0156].map((mmol) => mmol.toFixed(1))).toEqual(["6.7", "7.3"]);
    expect([lowMgDl, highMgDl]).toEqual([121, 132]);
  });

  it("has 5 h of insulin action from 65 years on, and with kidney disease under review", () => {
    expect(answer({ ageYears: 64 }).profile?.cautious.durationOfActionMinutes).toBe(240);
    expect(answer({ ageYears: 65 }).profile?.cautious.durationOfActionMinutes).toBe(300);
    for (const kidneyLiverAdrenal of ["yes", "not-sure"]) {
      const { profile, durationOfAction } = answer({ forReview: true, gate: { ...OPEN_GATE, kidneyLiverAdrenal } });
      expect(profile?.standard.durationOfActionMinutes).toBe(300);
      expect(durationOfAction).toMatchObject({ cautious: 300, standard: 300 });
    }
  });

  it("caps doses at the largest recent ones, down to the step, and says so where they are not known", () => {
    const { profile, checks } = answer({ largestRecentBolusUnits: 7.98, largestRecentBasalUnitsPerHour: 1.21 });
    expect(profile?.cautious.limits).toEqual({
      maxBasalUnitsPerHour: 1.2,
      maxBolusUnits: 7.95,
      maxInsulinOnBoardUnits: null,
    });
    expect(checks.map(({ code }) => code)).toEqual(["ketones-and-site"]);
    expect(answer().checks.map(({ code }) => code)).toEqual(["limit-open", "ketones-and-site"]);
  });

  it("always carries the text on ketones and sites", () => {
    for (const parts of [{}, { hypoProne: true }, { forReview: true }, { gate: { ...OPEN_GATE, steroids: true } }]) {
      expect(answer(parts).checks).toContainEqual(
        expect.objectContaining({ code: "ketones-and-site", severity: "informs" }),
      );
    }
  });
});

describe("a closed gate", () => {
  const closed = [
    { gate: { ...OPEN_GATE, pregnant: true } },
    { gate: { ...OPEN_GATE, firstEverPump: "not-sure" } },
    { gate: {} },
    { ageYears: 17 },
    { injectionsTotalDailyDoseUnits: 15 },
    { injectionsTotalDailyDoseUnits: 110, weightKg: 170 },
    { weightKg: 150 },
    { weightKg: 55 },
  ];

  it.each(closed)("shows not one number to the person: %j", (parts) => {
    const { gate, checks, ...rest } = answer(parts);
    expect(gate.open).toBe(false);
    expect(gate.reasons.length).toBeGreaterThan(0);
    expect(numbersIn(rest)).toEqual([]);
    expect(rest.profile).toBeNull();
    for (const { text } of [...checks, ...gate.reasons]) expect(text).not.toMatch(/\d/);
    for (const section of [rest.totalDailyDose, rest.basal, rest.carbRatio, rest.sensitivity, rest.target]) {
      expect(section).toMatchObject({ methods: [], cautious: null, standard: null });
    }
  });

  it.each(closed)("shows the arithmetic all the same for an educator's review: %j", (parts) => {
    const { gate, profile, totalDailyDose, basal } = answer({ ...parts, forReview: true });
    expect(gate.open).toBe(false);
    expect(gate).toEqual(answer(parts).gate);
    expect(profile).not.toBeNull();
    expect(totalDailyDose.cautious).toBeGreaterThan(0);
    expect(basal.methods.length).toBeGreaterThan(0);
  });

  it("shows a reviewer of a child or a pregnancy the rules written for them as well", () => {
    const ids = (parts: object) => answer({ ...parts, forReview: true }).totalDailyDose.methods.map(({ id }) => id);
    expect(ids({ ageYears: 12 })).toContain("weight-0.7-before-puberty");
    expect(ids({ gate: { ...OPEN_GATE, pregnant: true } })).toContain("weight-0.7-first-trimester");
    expect(ids({})).not.toContain("weight-0.7-before-puberty");
    expect(ids({})).not.toContain("weight-0.7-first-trimester");
  });
});

describe("from a pump", () => {
  const pump = { ...profileToApi(EXAMPLE_PROFILE), totalDailyDoseUnits: 36 };
  const fromPump = (parts: object = {}) => answer({ injectionsTotalDailyDoseUnits: undefined, pump, ...parts });

  it("carries working settings over unchanged, in both presets, with the arithmetic beside", () => {
    const { profile, totalDailyDose, carbRatio, route, checks } = fromPump();
    expect(route).toBe("pump");
    expect(profile).toEqual({ cautious: profileToApi(EXAMPLE_PROFILE), standard: profileToApi(EXAMPLE_PROFILE) });
    expect(totalDailyDose).toMatchObject({ cautious: 36, standard: 36 });
    expect(totalDailyDose.methods).toContainEqual(expect.objectContaining({ id: "pump-unchanged", units: 36 }));
    expect(totalDailyDose.methods.map(({ id }) => id)).not.toContain("injections-0.75");
    expect(carbRatio).toMatchObject({ cautious: 14, standard: 14 });
    expect(checks.map(({ code }) => code)).toContain("carried-over");
  });

  it("shows the published cuts and asks for a look where lows are frequent", () => {
    const { totalDailyDose, checks } = fromPump({ hypoProne: true });
    expect(totalDailyDose.methods).toContainEqual(expect.objectContaining({ id: "pump-0.90", units: 32.4 }));
    expect(fromPump().totalDailyDose.methods.map(({ id }) => id)).not.toContain("pump-0.90");
    expect(checks[0]).toMatchObject({ code: "lows-before-carry-over", severity: "asks" });
  });

  it("blocks a rate that the new pump cannot hold", () => {
    const { checks } = fromPump({ insulinStepUnits: 0.1 });
    expect(checks.filter(({ code }) => code === "basal-off-step").map(({ severity }) => severity)).toEqual([
      "blocks",
      "blocks",
    ]);
  });

  it("keeps the gate: 19 U a day shows no number", () => {
    const { gate, profile } = fromPump({ pump: { ...pump, totalDailyDoseUnits: 19 } });
    expect(gate.open).toBe(false);
    expect(profile).toBeNull();
  });
});
