/** One outcome of one civil day; `day` counts from 1970-01-01 in the journal's zone. */
export type DayValue = Readonly<{
  day: number;
  value: number;
  /** Enough readings, and no flag that leaves the day out. */
  isUsable: boolean;
  /** In words, why an unusable day is left out. */
  leftOutReason?: string;
}>;

/** Saturday or Sunday: day 0 was a Thursday. */
export function isWeekendDay(day: number): boolean {
  const rest = ((day % 7) + 7) % 7;
  return rest === 2 || rest === 3;
}

export function meanOf(values: ReadonlyArray<number>): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}

/** Sum of squared distances from the mean. */
export function squaresAroundMean(values: ReadonlyArray<number>): number {
  const mean = meanOf(values);
  return values.reduce((sum, value) => sum + (value - mean) ** 2, 0);
}
