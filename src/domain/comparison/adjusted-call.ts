import type { AdjustedEffect } from "./adjusted";
import { studentTQuantile } from "./student-t";

const DAYS_TO_CALL = 5;

/**
 * What days at equal insulin say, where they say anything: "lower" at the 97.5 %
 * level, "higher" at 95 % on purpose, and only where the plain difference of
 * glucose points the same way.
 */
export function callAdjusted(effect: AdjustedEffect): "lower" | "higher" | null {
  if (effect.nAfter < DAYS_TO_CALL) return null;
  if (effect.t < -studentTQuantile(0.975, effect.nu) && effect.rawDifference < 0) return "lower";
  if (effect.t > studentTQuantile(0.95, effect.nu) && effect.rawDifference > 0) return "higher";
  return null;
}
