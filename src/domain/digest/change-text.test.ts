import { describe, expect, it } from "vitest";
import type { SettingChange } from "@/domain/settings/difference";
import { changeText } from "./change-text";

const change = (given: Partial<SettingChange>): SettingChange => ({
  family: "basal", field: "milliUnitsPerHour", label: null, fromMinute: 0, toMinute: 1440,
  oldValue: 500, newValue: 550, stepPercent: 10, direction: "stronger", ...given,
});

describe("changeText", () => {
  it.each<[string, Partial<SettingChange>]>([
    ["basal rate, 0.50 U/h → 0.55 U/h", {}],
    ["basal rate 00:00 to 04:00, 0.50 U/h → 0.525 U/h", { toMinute: 240, newValue: 525 }],
    ["carb ratio 05:00 to 10:00, 17 g/U → 15 g/U", { family: "carbRatio", field: "milligramsPerUnit", fromMinute: 300, toMinute: 600, oldValue: 17_000, newValue: 15_000 }],
    ["sensitivity factor, 60 mg/dL per U (3.3 mmol/L per U) → 50 mg/dL per U (2.8 mmol/L per U)", { family: "sensitivity", field: "microMgDlPerUnit", oldValue: 60_000_000, newValue: 50_000_000 }],
    ["glucose target, lower end, 120 mg/dL (6.7 mmol/L) → 110 mg/dL (6.1 mmol/L)", { family: "target", field: "lowMgDl", oldValue: 120, newValue: 110 }],
    ["bolus limit, none → 8 U", { family: "limits", field: "maxBolusMilliUnits", oldValue: null, newValue: 8000 }],
    ["Night mode, off → on", { family: "features", field: "feature", label: "Night mode", oldValue: false, newValue: true }],
  ])("says %j", (text, given) => expect(changeText(change(given))).toBe(text));
});
