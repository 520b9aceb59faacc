import type { MetricReading } from "./metric-reading";

export type Summary = {
  meanMgDl: number;
  /** n - 1 in the divisor; null with one reading. */
  sdMgDl: number | null;
  cvFraction: number | null;
  gmiPercent: number;
  veryLowFraction: number;
  /** 54-69 mg/dL alone. */
  lowFraction: number;
  inRangeFraction: number;
  /** 181-250 mg/dL alone. */
  highFraction: number;
  veryHighFraction: number;
  tightRangeFraction: number;
};

/**
 * Mean, spread and shares per band, every reading weighing the same
 * (Battelino 2019, Diabetes Care 42:1593). GMI is 3.31 + 0.02392 x mean mg/dL
 * (Bergenstal 2018, Diabetes Care 41:2275, from memory).
 *
 * @param readings of one source with one interval; any order
 * @returns fractions 0 to 1, or null without a reading
 */
export function summarise(readings: ReadonlyArray<MetricReading>): Summary | null {
  const n = readings.length;
  if (n === 0) return null;
  const meanMgDl = readings.reduce((sum, r) => sum + r.glucoseMgDl, 0) / n;
  const squares = readings.reduce((sum, r) => sum + (r.glucoseMgDl - meanMgDl) ** 2, 0);
  const sdMgDl = n < 2 ? null : Math.sqrt(squares / (n - 1));
  const share = (band: number) => readings.filter((r) => r.band === band).length / n;
  return {
    meanMgDl,
    sdMgDl,
    cvFraction: sdMgDl === null ? null : sdMgDl / meanMgDl,
    gmiPercent: 3.31 + 0.02392 * meanMgDl,
    veryLowFraction: share(0),
    lowFraction: share(1),
    inRangeFraction: share(2),
    highFraction: share(3),
    veryHighFraction: share(4),
    tightRangeFraction: readings.filter((r) => r.isInTightRange).length / n,
  };
}
