import { USABLE_FRACTION } from "./day-series";
import { meanOf, type DayValue } from "./day-value";

type Reading = Readonly<{ atMs: number; glucoseMgDl: number; isInRange: boolean }>;
type Event = Readonly<{ atMs: number; day: number }>;

const MINUTE_MS = 60_000;

/**
 * One value a day from the hours after events of that day (meals of one name,
 * corrections): the mean over its events. An event with too few readings in its
 * window does not count; a day with none is absent.
 *
 * @param readings in order of time
 * @param from     minutes after the event at which its window opens
 * @param to       minutes after the event at which it closes, excluded
 * @param value    "mean" in mg/dL, or the percent of readings in range
 */
export function eventSeries(
  events: ReadonlyArray<Event>,
  readings: ReadonlyArray<Reading>,
  window: Readonly<{ from: number; to: number; value: "mean" | "in-range"; intervalMinutes: number }>,
  leftOut: ReadonlyMap<number, string>,
): DayValue[] {
  const byDay = new Map<number, number[]>();
  const possible = (window.to - window.from) / window.intervalMinutes;
  for (const { atMs, day } of events) {
    const inside = between(readings, atMs + window.from * MINUTE_MS, atMs + window.to * MINUTE_MS);
    if (inside.length < USABLE_FRACTION * possible) continue;
    const figure =
      window.value === "mean"
        ? meanOf(inside.map((r) => r.glucoseMgDl))
        : (100 * inside.filter((r) => r.isInRange).length) / inside.length;
    byDay.set(day, [...(byDay.get(day) ?? []), figure]);
  }
  return [...byDay].map(([day, figures]) => {
    const leftOutReason = leftOut.get(day);
    const value = meanOf(figures);
    return leftOutReason === undefined ? { day, value, isUsable: true } : { day, value, isUsable: false, leftOutReason };
  });
}

/** Readings from one instant to another, the end excluded, found by halving. */
function between(readings: ReadonlyArray<Reading>, fromMs: number, toMs: number): Reading[] {
  let low = 0;
  let high = readings.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if ((readings[middle]?.atMs ?? Infinity) < fromMs) low = middle + 1;
    else high = middle;
  }
  const inside: Reading[] = [];
  for (let i = low; i < readings.length; i += 1) {
    const reading = readings[i];
    if (!reading || reading.atMs >= toMs) break;
    inside.push(reading);
  }
  return inside;
}
