import { mgDlToMmol, type GlucoseUnit } from "@/domain/units";
import { clockText } from "./clock-text";
import type { ProfileDifference, SettingChange } from "./difference";
import { sensitivityIn } from "./sensitivity-unit";

/** A rate with two decimals, or three where the device's step needs them: a rate is never shown rounded. */
const rate = (milliUnitsPerHour: number) => (milliUnitsPerHour / 1000).toFixed(milliUnitsPerHour % 10 === 0 ? 2 : 3);

const trimmed = (value: number, places: number) => String(Number(value.toFixed(places)));

/** A stored setting value as people write it, with its unit. */
export function settingValueText(change: Pick<SettingChange, "field" | "family">, value: SettingChange["oldValue"], unit: GlucoseUnit): string {
  if (value === null) return "not set";
  if (typeof value !== "number") return typeof value === "boolean" ? (value ? "on" : "off") : value;
  switch (change.field) {
    case "milliUnitsPerHour":
    case "maxBasalMilliUnitsPerHour":
      return `${rate(value)} U/h`;
    case "milligramsPerUnit":
      return `${trimmed(value / 1000, 3)} g/U`;
    case "microMgDlPerUnit":
      return `${trimmed(sensitivityIn(value, unit), unit === "mg/dL" ? 0 : 1)} ${unit} per U`;
    case "lowMgDl":
    case "highMgDl":
      return `${unit === "mg/dL" ? value : mgDlToMmol(value).toFixed(1)} ${unit}`;
    case "durationOfActionMinutes":
      return `${trimmed(value / 60, 2)} h`;
    case "maxBolusMilliUnits":
    case "maxInsulinOnBoardMilliUnits":
      return `${trimmed(value / 1000, 3)} U`;
    default:
      return String(value);
  }
}

const NAME: Readonly<Record<string, string>> = {
  milliUnitsPerHour: "Basal",
  milligramsPerUnit: "Carb ratio",
  microMgDlPerUnit: "Sensitivity factor",
  lowMgDl: "Target, lower end",
  highMgDl: "Target, upper end",
  durationOfActionMinutes: "Duration of action",
  maxBasalMilliUnitsPerHour: "Largest basal rate",
  maxBolusMilliUnits: "Largest bolus",
  maxInsulinOnBoardMilliUnits: "Largest insulin on board",
};

/** One change in a line: "Basal 00:00–04:00: 0.50 U/h → 0.55 U/h (10% stronger)". */
export function changeText(change: SettingChange, unit: GlucoseUnit): string {
  const name = change.label ?? NAME[change.field] ?? change.field;
  const isWholeDay = change.fromMinute === 0 && change.toMinute === 1440;
  const part = isWholeDay ? "" : ` ${clockText(change.fromMinute)}–${clockText(change.toMinute)}`;
  const step = change.stepPercent === null ? "" : `${Math.round(change.stepPercent)}% `;
  const way = change.direction === "neutral" ? (step ? `(${step.trim()})` : "") : `(${step}${change.direction})`;
  const values = `${settingValueText(change, change.oldValue, unit)} → ${settingValueText(change, change.newValue, unit)}`;
  return `${name}${part}: ${values}${way ? ` ${way}` : ""}`;
}

/** All changes, a line each; empty when nothing differs. */
export function differenceLines(difference: ProfileDifference, unit: GlucoseUnit): string[] {
  return difference.changes.map((change) => changeText(change, unit));
}
