import { civilOf } from "@/domain/civil-time";
import type { MetricReading } from "./metric-reading";

const MINUTE_MS = 60_000;
/** Nothing is filled in across a longer gap. */
const LONGEST_FILLED_MINUTES = 45;

export type Grid = Readonly<{
  intervalMinutes: number;
  /** The instant of the first value: midnight of the first civil day. */
  startMs: number;
  /** mg/dL at each step; null where no reading is near. */
  values: ReadonlyArray<number | null>;
}>;

type Point = Pick<MetricReading, "atMs" | "glucoseMgDl">;

/**
 * Readings brought to even steps: the rounded middle gap, counted from the
 * midnight of the first day, a straight line between neighbours, nothing
 * across a gap longer than 45 minutes.
 *
 * @param readings in order of time; two at one instant count as their mean
 * @param zone     IANA zone whose midnight the steps are counted from
 * @returns null with fewer than two instants
 */
export function toGrid(readings: ReadonlyArray<Point>, zone: string): Grid | null {
  const points = mergeInstants(readings);
  const [first] = points;
  const last = points.at(-1);
  if (!first || !last || points.length < 2) return null;
  const intervalMinutes = middleGapMinutes(points);
  const minuteMs = Math.floor(first.atMs / MINUTE_MS) * MINUTE_MS;
  const startMs = minuteMs - civilOf(first.atMs, zone).minuteOfDay * MINUTE_MS;
  const values: (number | null)[] = [];
  let after = 0;
  for (let atMs = startMs; atMs <= last.atMs; atMs += intervalMinutes * MINUTE_MS) {
    while ((points[after]?.atMs ?? Infinity) < atMs) after += 1;
    values.push(valueAt(atMs, points[after - 1], points[after]));
  }
  return { intervalMinutes, startMs, values };
}

function valueAt(atMs: number, before: Point | undefined, after: Point | undefined): number | null {
  if (after?.atMs === atMs) return after.glucoseMgDl;
  if (!before || !after) return null;
  const gapMs = after.atMs - before.atMs;
  if (gapMs > LONGEST_FILLED_MINUTES * MINUTE_MS) return null;
  return before.glucoseMgDl + ((after.glucoseMgDl - before.glucoseMgDl) * (atMs - before.atMs)) / gapMs;
}

function mergeInstants(readings: ReadonlyArray<Point>): Point[] {
  const byInstant = new Map<number, { sum: number; n: number }>();
  for (const { atMs, glucoseMgDl } of readings) {
    const seen = byInstant.get(atMs) ?? { sum: 0, n: 0 };
    byInstant.set(atMs, { sum: seen.sum + glucoseMgDl, n: seen.n + 1 });
  }
  return [...byInstant].map(([atMs, { sum, n }]) => ({ atMs, glucoseMgDl: sum / n }));
}

/** The rounded median gap, at least one minute. */
function middleGapMinutes(points: ReadonlyArray<Point>): number {
  const gaps = points.slice(1).map((p, i) => (p.atMs - (points[i]?.atMs ?? p.atMs)) / MINUTE_MS).toSorted((a, b) => a - b);
  const low = gaps[Math.floor((gaps.length - 1) / 2)] ?? 5;
  const high = gaps[Math.floor(gaps.length / 2)] ?? low;
  return Math.max(1, Math.round((low + high) / 2));
}
