/**
 * Readings got for each reading possible between the first and the last at
 * the nominal interval, 0 to 1. The possible count follows real minutes, so a
 * day of 23 or 25 hours needs no exception (Battelino 2019 asks for 0.70).
 *
 * @param readings in order of time
 * @returns null without a reading
 */
export function sensorActive(readings: ReadonlyArray<Readonly<{ atMs: number }>>, intervalMinutes: number): number | null {
  const firstMs = readings[0]?.atMs;
  const lastMs = readings.at(-1)?.atMs;
  if (firstMs === undefined || lastMs === undefined) return null;
  const possible = Math.round((lastMs - firstMs) / (intervalMinutes * 60_000)) + 1;
  return Math.min(1, readings.length / possible);
}
