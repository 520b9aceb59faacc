export type Span = Readonly<{ fromMs: number; toMs: number }>;

/**
 * Readings got for each reading possible in a span at the nominal interval, 0
 * to 1. The possible count follows real minutes, so a day of 23 or 25 hours
 * needs no exception (Battelino 2019 asks for 0.70 of 14 days).
 *
 * @param readings in order of time
 * @param span     `toMs` left out; without one, first to last reading, both counted
 * @returns null when no reading is possible
 */
export function sensorActive(readings: ReadonlyArray<Readonly<{ atMs: number }>>, intervalMinutes: number, span?: Span): number | null {
  const firstMs = readings[0]?.atMs;
  const lastMs = readings.at(-1)?.atMs;
  if (firstMs === undefined || lastMs === undefined) return null;
  const spanMs = span ? span.toMs - span.fromMs : lastMs - firstMs + intervalMinutes * 60_000;
  const possible = Math.round(spanMs / (intervalMinutes * 60_000));
  return possible < 1 ? null : Math.min(1, readings.length / possible);
}
