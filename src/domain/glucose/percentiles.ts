import { civilOf } from "@/domain/civil-time";
import type { MetricReading } from "./metric-reading";

const DAY_MINUTES = 1440;
const STEP_MINUTES = 15;
const HALF_WINDOW_MINUTES = 30;
/** Fewer civil days make no profile; 14 are recommended. */
const FEWEST_DAYS = 5;

/** mg/dL at a minute after midnight; null where no day has a reading near. */
export type ProfileStep = { minute: number } & Record<"p5" | "p25" | "p50" | "p75" | "p95", number | null>;

/**
 * The profile of a usual day: at each quarter hour the 5, 25, 50, 75 and 95
 * percentiles of readings in the surrounding hour (from 30 minutes before to
 * just under 30 after) across days, also across midnight. Not smoothed.
 * (Ambulatory glucose profile, Battelino 2019 and ADA Standards section 7.)
 *
 * @param zone the journal's IANA zone; minutes are those its clocks show
 * @returns 96 steps, or null with readings on fewer than five days
 */
export function percentileProfile(readings: ReadonlyArray<Pick<MetricReading, "atMs" | "glucoseMgDl">>, zone: string): ProfileStep[] | null {
  const civil = readings.map((r) => ({ ...civilOf(r.atMs, zone), glucoseMgDl: r.glucoseMgDl }));
  if (new Set(civil.map((r) => r.dayNumber)).size < FEWEST_DAYS) return null;
  const byMinute = Array.from({ length: DAY_MINUTES }, (): number[] => []);
  for (const r of civil) byMinute[r.minuteOfDay]?.push(r.glucoseMgDl);
  return Array.from({ length: DAY_MINUTES / STEP_MINUTES }, (_, step) => {
    const minute = step * STEP_MINUTES;
    const near: number[] = [];
    for (let m = minute - HALF_WINDOW_MINUTES; m < minute + HALF_WINDOW_MINUTES; m += 1) {
      near.push(...(byMinute[(m + DAY_MINUTES) % DAY_MINUTES] ?? []));
    }
    near.sort((a, b) => a - b);
    const at = (fraction: number) => quantile(near, fraction);
    return { minute, p5: at(0.05), p25: at(0.25), p50: at(0.5), p75: at(0.75), p95: at(0.95) };
  });
}

/**
 * A straight line between the two nearest order statistics (R type 7).
 *
 * @param sorted   in rising order
 * @param fraction 0 to 1
 * @returns null when empty
 */
export function quantile(sorted: ReadonlyArray<number>, fraction: number): number | null {
  const place = (sorted.length - 1) * fraction;
  const low = sorted[Math.floor(place)];
  const high = sorted[Math.ceil(place)];
  return low === undefined || high === undefined ? null : low + (high - low) * (place - Math.floor(place));
}
