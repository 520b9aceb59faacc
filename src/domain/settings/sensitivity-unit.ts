import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";

const MICRO = 1_000_000;

/**
 * A sensitivity factor as typed, in its stored integer unit. The nearest
 * millionth of a mg/dL per U: exact for anything typed to 0.000001 mg/dL or
 * 0.01 mmol/L.
 */
export function microMgDlPerUnitFrom(value: number, unit: GlucoseUnit): number {
  return Math.round(unit === "mg/dL" ? value * MICRO : value * (MGDL_PER_MMOL * MICRO));
}

/** The stored sensitivity factor in the reader's unit, unrounded; rounding belongs to display. */
export function sensitivityIn(microMgDlPerUnit: number, unit: GlucoseUnit): number {
  return unit === "mg/dL" ? microMgDlPerUnit / MICRO : microMgDlPerUnit / (MGDL_PER_MMOL * MICRO);
}
