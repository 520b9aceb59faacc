/** Quartiles of glucose around one time of day. */
export type TimeOfDayBand = Readonly<{ minute: number; p25: number; p50: number; p75: number; readings: number }>;

const STEP_MINUTES = 30;
const READINGS_AT_LEAST = 5;

/** Linear interpolation between order statistics (R's type 7). `sorted` ascending and not empty. */
export function quantile(sorted: ReadonlyArray<number>, p: number): number {
  const position = (sorted.length - 1) * p;
  const below = sorted[Math.floor(position)] ?? Number.NaN;
  const above = sorted[Math.ceil(position)] ?? below;
  return below + (above - below) * (position - Math.floor(position));
}

/**
 * Where glucose lay at each time of day: the middle half and the middle, from
 * the readings of the surrounding hour across days. A time with hardly any
 * readings is left out, so that a gap stays a gap.
 *
 * @param readings minute of the civil day, 0-1439, and mg/dL
 */
export function timeOfDayBands(readings: ReadonlyArray<{ minute: number; glucoseMgDl: number }>): TimeOfDayBand[] {
  const slots = Array.from({ length: 1440 / STEP_MINUTES }, (): number[] => []);
  for (const { minute, glucoseMgDl } of readings) slots[Math.floor(minute / STEP_MINUTES)]?.push(glucoseMgDl);
  return slots.flatMap((slot, i) => {
    const before = slots[(i + slots.length - 1) % slots.length] ?? [];
    const around = [...before, ...slot].toSorted((a, b) => a - b);
    if (around.length < READINGS_AT_LEAST) return [];
    return [{ minute: i * STEP_MINUTES, p25: quantile(around, 0.25), p50: quantile(around, 0.5), p75: quantile(around, 0.75), readings: around.length }];
  });
}
