import { AppError } from "@/domain/errors";
import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";
import type { SettingsProfile } from "./profile";
import { normaliseSchedule } from "./schedule";
import { changeSpan } from "./schedule-edit";
import { microMgDlPerUnitFrom } from "./sensitivity-unit";

/** One setting, one part of the day, one new value as people write it. */
export type SettingEdit =
  | Readonly<{ family: "basal" | "carbRatio" | "sensitivity"; fromMinute: number; toMinute: number; value: number }>
  | Readonly<{ family: "target"; fromMinute: number; toMinute: number; low: number; high: number }>;

/**
 * A profile with one setting changed for part of the day.
 *
 * @param edit basal in U/h, carb ratio in g/U, sensitivity and target in `unit`; toMinute up to 1440
 * @throws {AppError} INVALID_RANGE for an empty part of the day; CONFLICT when nothing would differ
 */
export function applyEdit(profile: SettingsProfile, edit: SettingEdit, unit: GlucoseUnit): SettingsProfile {
  const { fromMinute, toMinute } = edit;
  const glucose = (value: number) => Math.round(unit === "mg/dL" ? value : value * MGDL_PER_MMOL);
  const changed: SettingsProfile = { ...profile };
  if (edit.family === "target") {
    const ends = { lowMgDl: glucose(edit.low), highMgDl: glucose(edit.high) };
    changed.target = normaliseSchedule(changeSpan(profile.target, fromMinute, toMinute, (b) => ({ ...b, ...ends })));
  } else if (edit.family === "basal") {
    const milliUnitsPerHour = Math.round(edit.value * 1000);
    changed.basal = normaliseSchedule(changeSpan(profile.basal, fromMinute, toMinute, (b) => ({ ...b, milliUnitsPerHour })));
  } else if (edit.family === "carbRatio") {
    const milligramsPerUnit = Math.round(edit.value * 1000);
    changed.carbRatio = normaliseSchedule(changeSpan(profile.carbRatio, fromMinute, toMinute, (b) => ({ ...b, milligramsPerUnit })));
  } else {
    const microMgDlPerUnit = microMgDlPerUnitFrom(edit.value, unit);
    changed.sensitivity = normaliseSchedule(changeSpan(profile.sensitivity, fromMinute, toMinute, (b) => ({ ...b, microMgDlPerUnit })));
  }
  if (JSON.stringify(changed) === JSON.stringify(profile)) throw new AppError("CONFLICT", "nothing would differ");
  return changed;
}
