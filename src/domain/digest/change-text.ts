import { clockText } from "@/domain/settings/clock-text";
import type { SettingChange, SettingField, SettingValue } from "@/domain/settings/difference";
import { FAMILY_FACTS } from "@/domain/settings/family";
import { MINUTES_PER_DAY } from "@/domain/settings/schedule";
import { mgDlToMmol, unitsFromMilliUnits } from "@/domain/units";

const MICRO = 1_000_000;

/** A number as it stands on a device: no more decimals than it needs, a basal rate always with two. */
function plain(value: number, decimalsAtLeast = 0): string {
  const decimals = Math.max(decimalsAtLeast, Math.min(3, (String(Number(value.toFixed(3))).split(".")[1] ?? "").length));
  return value.toFixed(decimals);
}

const withMmol = (mgDl: number, behind: string) => `${plain(mgDl)} mg/dL${behind} (${mgDlToMmol(mgDl).toFixed(1)} mmol/L${behind})`;

const SHOWN: Record<Exclude<SettingField, "feature">, (value: number) => string> = {
  milliUnitsPerHour: (value) => `${plain(unitsFromMilliUnits(value), 2)} U/h`,
  milligramsPerUnit: (value) => `${plain(value / 1000)} g/U`,
  microMgDlPerUnit: (value) => withMmol(value / MICRO, " per U"),
  lowMgDl: (value) => withMmol(value, ""),
  highMgDl: (value) => withMmol(value, ""),
  durationOfActionMinutes: (value) => `${value} minutes`,
  maxBasalMilliUnitsPerHour: (value) => `${plain(unitsFromMilliUnits(value), 2)} U/h`,
  maxBolusMilliUnits: (value) => `${plain(unitsFromMilliUnits(value))} U`,
  maxInsulinOnBoardMilliUnits: (value) => `${plain(unitsFromMilliUnits(value))} U`,
};

const FIELD_LABELS: Partial<Record<SettingField, string>> = {
  lowMgDl: "glucose target, lower end",
  highMgDl: "glucose target, upper end",
  maxBasalMilliUnitsPerHour: "basal limit",
  maxBolusMilliUnits: "bolus limit",
  maxInsulinOnBoardMilliUnits: "limit of insulin on board",
};

function valueText(field: SettingField, value: SettingValue): string {
  if (value === null) return "none";
  if (field !== "feature" && typeof value === "number") return SHOWN[field](value);
  return typeof value === "boolean" ? (value ? "on" : "off") : String(value);
}

/** One setting that changed, old and new: "basal rate 00:00 to 04:00, 0.50 U/h → 0.55 U/h". */
export function changeText(change: SettingChange): string {
  const name = change.label ?? FIELD_LABELS[change.field] ?? FAMILY_FACTS[change.family].label;
  const isWholeDay = change.fromMinute === 0 && change.toMinute === MINUTES_PER_DAY;
  const part = isWholeDay ? "" : ` ${clockText(change.fromMinute)} to ${clockText(change.toMinute)}`;
  return `${name}${part}, ${valueText(change.field, change.oldValue)} → ${valueText(change.field, change.newValue)}`;
}
