import { USUAL_SENSITIVITY_SPREAD, type SensitivitySpread } from "./day-sensitivity";
import type { MealHabit } from "./meals";
import { NOMINAL_PARAMETERS, type ModelParameters } from "./parameters";
import { SLOTS_PER_DAY, slotOfMinute } from "./slots";

/** The simulated body and days behind the demo, and the chance that decides them. */
export type DemoTruth = Readonly<{
  seed: number;
  /** On all three sensitivities of the published mean person. */
  sensitivityFactor: number;
  weightKg: number;
  /** On what the liver makes; and how fast injected insulin is absorbed. */
  liverFactor: number;
  insulinPeakMinutes: number;
  countLogSd: number;
  /** On the sensitivity of the day, by part of it: less at night and in the morning, more after noon. */
  nightFactor: number;
  morningFactor: number;
  afternoonFactor: number;
  spread: SensitivitySpread;
  gain: number;
}>;

/**
 * What is true of the invented person, chosen by search so that the comparison gives
 * the answers of the story: nights that need more than is programmed, afternoons that
 * need less, and a loop that is eager enough to matter and no more.
 *
 * In the long run version 2 lowers the hours after breakfast by about 10 mg/dL, version
 * 3 the nights by about 5, and version 4 adds about 0.4 points of lows. What these 32
 * days show of the last two is larger: a difference that gets called after so few days
 * commonly is (comparison.md 3.5), and this chance was picked because it is called.
 */
export const DEMO_TRUTH: DemoTruth = {
  seed: 818,
  sensitivityFactor: 0.76,
  weightKg: 71,
  liverFactor: 1.1,
  insulinPeakMinutes: 45,
  countLogSd: 0.15,
  nightFactor: 0.95,
  morningFactor: 0.7,
  afternoonFactor: 1.4,
  spread: { ...USUAL_SENSITIVITY_SPREAD, dayLogSd: 0.07, slowLogSd: 0.02, nightLogSd: 0.05 },
  gain: 0.08,
};

/** The factor on sensitivity for every slot of a day. */
export function demoDayFactors({ nightFactor, morningFactor, afternoonFactor }: DemoTruth): Float64Array {
  return new Float64Array(SLOTS_PER_DAY)
    .fill(1)
    .fill(nightFactor, 0, slotOfMinute(360))
    .fill(morningFactor, slotOfMinute(360), slotOfMinute(690))
    .fill(afternoonFactor, slotOfMinute(720), slotOfMinute(1140));
}

/** A baker's meals: an early breakfast after the first batch, dinner before an early night. */
export const DEMO_MEALS: ReadonlyArray<MealHabit> = [
  { name: "breakfast", minute: 420, minuteSd: 15, grams: 60, gramsSd: 10, shareOfDays: 1 },
  { name: "lunch", minute: 750, minuteSd: 20, grams: 58, gramsSd: 12, shareOfDays: 1 },
  { name: "snack", minute: 945, minuteSd: 20, grams: 15, gramsSd: 4, shareOfDays: 0.6 },
  { name: "dinner", minute: 1125, minuteSd: 20, grams: 62, gramsSd: 14, shareOfDays: 1 },
];

/** Body of the invented person. */
export function demoParameters(truth: DemoTruth = DEMO_TRUTH): ModelParameters {
  const N = NOMINAL_PARAMETERS;
  return {
    ...N,
    bodyWeightKg: truth.weightKg,
    transportSensitivity: N.transportSensitivity * truth.sensitivityFactor,
    disposalSensitivity: N.disposalSensitivity * truth.sensitivityFactor,
    liverSensitivity: N.liverSensitivity * truth.sensitivityFactor,
    liverMmolPerKgMinute: N.liverMmolPerKgMinute * truth.liverFactor,
    insulinPeakMinutes: truth.insulinPeakMinutes,
  };
}
