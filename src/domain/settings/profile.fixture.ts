import type { SettingsProfile } from "./profile";

/** An invented profile for tests: three rates, two ratios, flat elsewhere. */
export const EXAMPLE_PROFILE: SettingsProfile = {
  basal: [
    { startMinute: 0, milliUnitsPerHour: 500 },
    { startMinute: 240, milliUnitsPerHour: 650 },
    { startMinute: 1320, milliUnitsPerHour: 550 },
  ],
  carbRatio: [
    { startMinute: 0, milligramsPerUnit: 17_000 },
    { startMinute: 300, milligramsPerUnit: 15_500 },
  ],
  sensitivity: [{ startMinute: 0, microMgDlPerUnit: 60_000_000 }],
  target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
  durationOfActionMinutes: 240,
  limits: { maxBasalMilliUnitsPerHour: 1200, maxBolusMilliUnits: 8000, maxInsulinOnBoardMilliUnits: null },
  features: [
    { label: "quiet at night", kind: "switch", value: true },
    { label: "strength", kind: "number", value: 0.8 },
    { label: "mode", kind: "text", value: "plain" },
  ],
};

/** The same with some parts replaced. */
export function exampleProfile(parts: Partial<SettingsProfile> = {}): SettingsProfile {
  return { ...EXAMPLE_PROFILE, ...parts };
}
