import { mgDlToMmol, type GlucoseUnit } from "./units";

/** Rounded for display only: whole mg/dL, tenths of a mmol/L. */
function numberIn(glucoseMgDl: number, unit: GlucoseUnit): string {
  return unit === "mg/dL" ? String(Math.round(glucoseMgDl)) : mgDlToMmol(glucoseMgDl).toFixed(1);
}

/** A glucose value as text without its unit, for axes and table cells. */
export function glucoseNumber(glucoseMgDl: number, unit: GlucoseUnit): string {
  return numberIn(glucoseMgDl, unit);
}

/** A glucose value in the reader's unit, with the other beside it: "128 mg/dL (7.1 mmol/L)". */
export function glucoseText(glucoseMgDl: number, unit: GlucoseUnit): string {
  const other: GlucoseUnit = unit === "mg/dL" ? "mmol/L" : "mg/dL";
  return `${numberIn(glucoseMgDl, unit)} ${unit} (${numberIn(glucoseMgDl, other)} ${other})`;
}

/** The pairs of the consensus, which are not conversions of each other. */
const THRESHOLDS: Readonly<Record<54 | 70 | 180 | 250, string>> = { 54: "3.0", 70: "3.9", 180: "10.0", 250: "13.9" };

/** A consensus threshold in the reader's unit with the other beside it: "70 (3.9)" or "3.9 (70)". */
export function thresholdText(thresholdMgDl: 54 | 70 | 180 | 250, unit: GlucoseUnit): string {
  const mmol = THRESHOLDS[thresholdMgDl];
  return unit === "mg/dL" ? `${thresholdMgDl} (${mmol})` : `${mmol} (${thresholdMgDl})`;
}
