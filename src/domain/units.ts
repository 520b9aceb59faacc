/**
 * Units of glucose and insulin. mg/dL and integer milli-units are canonical;
 * mmol/L exists only where a value is read in or shown.
 */
export type GlucoseUnit = "mg/dL" | "mmol/L";

/** mg/dL per mmol/L: molar mass of glucose 180.156 g/mol, divided by ten. */
export const MGDL_PER_MMOL = 18.0156;

/** Exact conversion, unrounded; rounding belongs to display. */
export function mmolToMgDl(glucoseMmol: number): number {
  return glucoseMmol * MGDL_PER_MMOL;
}

/** Exact conversion, unrounded; rounding belongs to display. */
export function mgDlToMmol(glucoseMgDl: number): number {
  return glucoseMgDl / MGDL_PER_MMOL;
}

/** Units of insulin as a number of U from integer milli-units. */
export function unitsFromMilliUnits(milliUnits: number): number {
  return milliUnits / 1000;
}

/** Nearest integer milli-units; use only for values that are exact to a device step. */
export function milliUnitsFromUnits(units: number): number {
  return Math.round(units * 1000);
}

/** The same for a field that may be left empty. */
export function milliUnitsOrNull(units: number | null): number | null {
  return units === null ? null : milliUnitsFromUnits(units);
}
