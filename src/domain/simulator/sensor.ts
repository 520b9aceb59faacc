import { correlatedRow } from "./day-sensitivity";
import type { RandomSource } from "./random";
import { SLOTS_PER_DAY } from "./slots";

/** Spread of a sensor's error as a share of the reading, and how much each error is like the one five minutes before. */
const ERROR_SHARE = 0.07;
const ERROR_CORRELATION = 0.9;

/** What a sensor shows at least, mmol/L. */
export const SENSOR_FLOOR_MMOL = 2.2;

/**
 * The factor between a sensor's reading and the blood in every slot of a run
 * (comparison.md 5.1; that errors hang together: Breton and Kovatchev 2008).
 */
export function drawSensorFactors(random: RandomSource, days: number): Float64Array {
  return correlatedRow(random, days * SLOTS_PER_DAY, ERROR_CORRELATION, ERROR_SHARE).map((error) => 1 + error);
}
