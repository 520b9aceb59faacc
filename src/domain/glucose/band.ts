import type { GlucoseUnit } from "@/domain/units";

/** 0 very low, 1 low, 2 in range, 3 high, 4 very high. */
export type Band = 0 | 1 | 2 | 3 | 4;

/** The consensus thresholds are pairs, not conversions of each other (Battelino 2019, Diabetes Care 42:1593). */
const THRESHOLDS: Readonly<Record<GlucoseUnit, readonly [number, number, number, number]>> = {
  "mg/dL": [54, 70, 180, 250],
  "mmol/L": [3.0, 3.9, 10.0, 13.9],
};

/**
 * The band of a reading, decided in the unit it came in: 10.0 mmol/L is in
 * range although it converts to 180.16 mg/dL.
 *
 * @param bound a sensor's LOW or HIGH belongs to the extreme band
 */
export function bandOf(value: number, unit: GlucoseUnit, bound: "below" | "above" | null = null): Band {
  if (bound === "below") return 0;
  if (bound === "above") return 4;
  const [veryLow, low, high, veryHigh] = THRESHOLDS[unit];
  if (value < veryLow) return 0;
  if (value < low) return 1;
  if (value <= high) return 2;
  return value <= veryHigh ? 3 : 4;
}
