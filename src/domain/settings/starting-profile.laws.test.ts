import fc from "fast-check";
import { describe, expect, it, vi } from "vitest";
import { MGDL_PER_MMOL } from "@/domain/units";
import { exactDailyBasalMilliUnits } from "./basal-total";
import { estimateDailyDose } from "./daily-dose";
import { directionOf } from "./family";
import { compare, fractionOf, times, toNumber } from "./fraction";
import { presetProfile } from "./preset-profile";
import { settingsProfileSchema } from "./profile";
import { startingProfile } from "./starting-profile";
import { startingProfileRequestSchema } from "./starting-profile-request";
import { OPEN_GATE } from "./starting-profile.fixture";
import { valueOfMethod } from "./methods";

vi.setConfig({ testTimeout: 120_000 });
const RUNS = { numRuns: 10_000 };

const tenths = (min: number, max: number) => fc.integer({ min: min * 10, max: max * 10 }).map((n) => n / 10);
const options = fc.record({
  hypoProne: fc.boolean(),
  isOlderOrRenal: fc.boolean(),
  insulinStepMilliUnits: fc.constantFrom(1, 5, 10, 25, 50, 100),
  glucoseUnit: fc.constantFrom("mg/dL" as const, "mmol/L" as const),
  largestRecentBolusUnits: fc.option(tenths(1, 30), { nil: null }),
  largestRecentBasalUnitsPerHour: fc.option(tenths(1, 5), { nil: null }),
});
/** Anybody the request takes, far outside the gate as well. */
const body = fc.record({ weightKg: tenths(2, 400), dailyDoseUnits: tenths(1, 500) });

describe("laws of the starting profile", () => {
  it("cautious is never stronger than standard, in any field", () => {
    fc.assert(
      fc.property(body, options, ({ weightKg, dailyDoseUnits }, given) => {
        const dose = estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits });
        const [cautious, standard] = [presetProfile(dose.cautious, given), presetProfile(dose.standard, given)];
        const pairs = [
          directionOf("basal", standard.basal[0]!.milliUnitsPerHour, cautious.basal[0]!.milliUnitsPerHour),
          directionOf("carbRatio", standard.carbRatio[0]!.milligramsPerUnit, cautious.carbRatio[0]!.milligramsPerUnit),
          directionOf(
            "sensitivity",
            standard.sensitivity[0]!.microMgDlPerUnit,
            cautious.sensitivity[0]!.microMgDlPerUnit,
          ),
          directionOf("target", standard.target[0]!.lowMgDl, cautious.target[0]!.lowMgDl),
          directionOf("target", standard.target[0]!.highMgDl, cautious.target[0]!.highMgDl),
          directionOf("durationOfAction", standard.durationOfActionMinutes, cautious.durationOfActionMinutes),
          directionOf("limits", standard.limits.maxBolusMilliUnits, cautious.limits.maxBolusMilliUnits),
          directionOf("limits", standard.limits.maxBasalMilliUnitsPerHour, cautious.limits.maxBasalMilliUnitsPerHour),
        ];
        expect(pairs).not.toContain("stronger");
      }),
      RUNS,
    );
  });

  it("rounding never makes a setting stronger than the exact rule, in either unit", () => {
    fc.assert(
      fc.property(body, options, ({ weightKg, dailyDoseUnits }, given) => {
        const { cautious: dose } = estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits });
        const profile = presetProfile(dose, given);
        const rule = given.hypoProne ? "sensitivity-1960" : "sensitivity-1800";
        const exact = (id: string) => valueOfMethod(id, { totalDailyDose: dose });
        const daily = exactDailyBasalMilliUnits(profile.basal);
        expect(compare(daily, times(exact("basal-0.40"), fractionOf(1000)))).toBeLessThanOrEqual(0);
        const grams = fractionOf(profile.carbRatio[0]!.milligramsPerUnit);
        expect(compare(grams, times(exact("ratio-500"), fractionOf(1000)))).toBeGreaterThanOrEqual(0);
        const micro = fractionOf(profile.sensitivity[0]!.microMgDlPerUnit);
        expect(compare(micro, times(exact(rule), fractionOf(1_000_000)))).toBeGreaterThanOrEqual(0);
        expect(profile.target[0]!.lowMgDl).toBeGreaterThanOrEqual(120);
        expect(profile.target[0]!.highMgDl).toBeGreaterThanOrEqual(130);
      }),
      RUNS,
    );
  });

  it("is never more than one step away from the exact rule either: too weak is a risk too", () => {
    fc.assert(
      fc.property(body, options, ({ weightKg, dailyDoseUnits }, given) => {
        const { standard: dose } = estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits });
        const profile = presetProfile(dose, given);
        const total = toNumber(dose);
        const rate = profile.basal[0]!.milliUnitsPerHour;
        expect((total * 400) / 24 - rate).toBeLessThan(given.insulinStepMilliUnits + 1e-6);
        expect(profile.carbRatio[0]!.milligramsPerUnit / 1000 - 500 / total).toBeLessThan(1 + 1e-9);
        const rule = given.hypoProne ? 1960 : 1800;
        const typed = profile.sensitivity[0]!.microMgDlPerUnit / 1_000_000;
        const beyond = given.glucoseUnit === "mg/dL" ? typed - rule / total : typed / MGDL_PER_MMOL - rule / 18 / total;
        expect(beyond).toBeLessThan((given.glucoseUnit === "mg/dL" ? 1 : 0.1) + 1e-9);
      }),
      RUNS,
    );
  });

  it("always fits the stored shape, on whole steps, whoever asks", () => {
    fc.assert(
      fc.property(body, options, ({ weightKg, dailyDoseUnits }, given) => {
        const { cautious, standard } = estimateDailyDose(weightKg, { route: "injections", dailyDoseUnits });
        for (const dose of [cautious, standard]) {
          const profile = presetProfile(dose, given);
          expect(settingsProfileSchema.parse(profile)).toEqual(profile);
          expect(profile.basal[0]!.milliUnitsPerHour % given.insulinStepMilliUnits).toBe(0);
        }
      }),
      RUNS,
    );
  });

  it("shows numbers if and only if the gate is open or an educator asks", () => {
    const request = fc.record({
      weightKg: tenths(40, 140),
      ageYears: fc.integer({ min: 10, max: 90 }),
      injectionsTotalDailyDoseUnits: tenths(10, 130),
      hypoProne: fc.boolean(),
      forReview: fc.boolean(),
      steroids: fc.constantFrom<unknown>(false, false, false, true, "not-sure", undefined),
    });
    fc.assert(
      fc.property(request, ({ steroids, ...typed }) => {
        const parsed = startingProfileRequestSchema.parse({ ...typed, gate: { ...OPEN_GATE, steroids } });
        const { gate, profile, totalDailyDose } = startingProfile(parsed);
        const isShown = gate.open || typed.forReview;
        expect(profile !== null).toBe(isShown);
        expect(totalDailyDose.cautious !== null).toBe(isShown);
        expect(totalDailyDose.methods.length > 0).toBe(isShown);
      }),
      { numRuns: 2_000 },
    );
  });
});
