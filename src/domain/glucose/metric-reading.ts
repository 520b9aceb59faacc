import type { GlucoseUnit } from "@/domain/units";
import { bandOf, type Band } from "./band";

/** One reading as the figures want it: banded once, in the unit it came in. */
export type MetricReading = Readonly<{
  atMs: number;
  glucoseMgDl: number;
  band: Band;
  /** 70-140 mg/dL or 3.9-7.8 mmol/L, both ends included (Battelino 2019, Diabetes Care 42:1593). */
  isInTightRange: boolean;
}>;

const TIGHT_RANGE_TOP: Readonly<Record<GlucoseUnit, number>> = { "mg/dL": 140, "mmol/L": 7.8 };

/**
 * A reading ready for the figures.
 *
 * @param value       in `unit`, as it came in
 * @param glucoseMgDl the same value, canonical
 * @param bound       a sensor's LOW or HIGH; never in the tight range
 */
export function toMetricReading(
  { atMs, value, unit, glucoseMgDl, bound = null }:
  Readonly<{ atMs: number; value: number; unit: GlucoseUnit; glucoseMgDl: number; bound?: "below" | "above" | null }>,
): MetricReading {
  const band = bandOf(value, unit, bound);
  return { atMs, glucoseMgDl, band, isInTightRange: band === 2 && value <= TIGHT_RANGE_TOP[unit] };
}
