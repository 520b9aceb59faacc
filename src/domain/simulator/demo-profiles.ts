import type { SettingsProfile } from "@/domain/settings/profile";

/** Millionths of a mg/dL per unit, from mg/dL per unit. */
const perUnit = (mgDl: number) => mgDl * 1_000_000;

/**
 * Version 1: the cautious starting profile for 40 U a day by injection and 71 kg, as
 * the published arithmetic gives it (a dose of 30 U: 0.50 U/h, 17 g/U, 60 mg/dL per U).
 */
const START: SettingsProfile = {
  basal: [{ startMinute: 0, milliUnitsPerHour: 500 }],
  carbRatio: [{ startMinute: 0, milligramsPerUnit: 17_000 }],
  sensitivity: [{ startMinute: 0, microMgDlPerUnit: perUnit(60) }],
  target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
  durationOfActionMinutes: 240,
  limits: { maxBasalMilliUnitsPerHour: 1_500, maxBolusMilliUnits: 10_000, maxInsulinOnBoardMilliUnits: null },
  features: [],
};

/** The ratio from 05:00 to 10:00 alone, g/U; the rest of the day stays at 17. */
function breakfastRatio(gramsPerUnit: number): SettingsProfile["carbRatio"] {
  return [
    { startMinute: 0, milligramsPerUnit: 17_000 },
    { startMinute: 300, milligramsPerUnit: gramsPerUnit * 1000 },
    { startMinute: 600, milligramsPerUnit: 17_000 },
  ];
}

const BREAKFAST_15: SettingsProfile = { ...START, carbRatio: breakfastRatio(15) };

const NIGHT_055: SettingsProfile = {
  ...BREAKFAST_15,
  basal: [{ startMinute: 0, milliUnitsPerHour: 550 }, { startMinute: 240, milliUnitsPerHour: 500 }],
};

const AFTERNOON_50: SettingsProfile = {
  ...NIGHT_055,
  sensitivity: [
    { startMinute: 0, microMgDlPerUnit: perUnit(60) },
    { startMinute: 720, microMgDlPerUnit: perUnit(50) },
    { startMinute: 1080, microMgDlPerUnit: perUnit(60) },
  ],
};

/** The settings of the demo's versions, and of the proposal that came back. */
export const DEMO_PROFILES = {
  start: START,
  breakfast15: BREAKFAST_15,
  nightAndBreakfast: { ...NIGHT_055, carbRatio: breakfastRatio(14) },
  night055: NIGHT_055,
  afternoon50: AFTERNOON_50,
  breakfast14: { ...NIGHT_055, carbRatio: breakfastRatio(14) },
} as const satisfies Record<string, SettingsProfile>;
