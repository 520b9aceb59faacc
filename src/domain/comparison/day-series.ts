import type { DayValue } from "./day-value";

/** The daily figures a series is made of: counts per band (very low, low, in range, high, very high) and sums. */
export type DailyFigures = Readonly<{
  dayNumber: number;
  readings: number;
  sumMgDl: number;
  bandCounts: ReadonlyArray<number>;
  minutesInPart: number;
  intervalMinutes: number;
}>;

/** A day counts with at least this share of the readings it could have. */
export const USABLE_FRACTION = 0.7;

/** Share of the readings possible in the real minutes of that civil day (or part), 0 to 1 and a little. */
export function activeFraction({ readings, intervalMinutes, minutesInPart }: DailyFigures): number {
  return (readings * intervalMinutes) / minutesInPart;
}

const percentOf = (figures: DailyFigures, bands: ReadonlyArray<number>) =>
  (100 * bands.reduce((sum, band) => sum + (figures.bandCounts[band] ?? 0), 0)) / figures.readings;

/** What one day can be measured by. Percent of readings, or mg/dL. */
export const MEASURES = {
  inRangePercent: (f: DailyFigures) => percentOf(f, [2]),
  below70Percent: (f: DailyFigures) => percentOf(f, [0, 1]),
  below54Percent: (f: DailyFigures) => percentOf(f, [0]),
  meanMgDl: (f: DailyFigures) => f.sumMgDl / f.readings,
} as const;

/**
 * One value a day, with the reason where a day is left out: a flag first, then
 * too few readings.
 *
 * @param leftOut flagged days with the flag in words
 */
export function seriesOf(
  days: ReadonlyArray<DailyFigures>,
  measure: keyof typeof MEASURES,
  leftOut: ReadonlyMap<number, string>,
): DayValue[] {
  return days
    .filter(({ readings }) => readings > 0)
    .map((figures) => {
      const flag = leftOut.get(figures.dayNumber);
      const share = activeFraction(figures);
      const leftOutReason = flag ?? (share < USABLE_FRACTION ? `only ${Math.round(share * 100)}% of its readings` : undefined);
      const value = MEASURES[measure](figures);
      return leftOutReason === undefined
        ? { day: figures.dayNumber, value, isUsable: true }
        : { day: figures.dayNumber, value, isUsable: false, leftOutReason };
    });
}
