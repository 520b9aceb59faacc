import type { RandomSource } from "./random";
import { normalDraw } from "./random-draws";
import { SLOTS_PER_DAY, slotOfMinute } from "./slots";

/** Spreads of the logarithm of a person's sensitivity to insulin from day to day, and how days hang together. */
export type SensitivitySpread = Readonly<{
  /** Days: each is this much like the day before (lag-1 correlation), and this spread in all. */
  dayCorrelation: number;
  dayLogSd: number;
  /** The slow tide over weeks. */
  slowCorrelation: number;
  slowLogSd: number;
  /** What a night has to itself. */
  nightLogSd: number;
}>;

/** Spreads of comparison.md 5.1 (ours; for their size compare Ruan 2016, Diabetes Care 39:830). */
export const USUAL_SENSITIVITY_SPREAD: SensitivitySpread = {
  dayCorrelation: 0.3, dayLogSd: 0.16, slowCorrelation: 0.93, slowLogSd: 0.08, nightLogSd: 0.24,
};

const NIGHT_ENDS = slotOfMinute(360);
const DAWN = { fromSlot: slotOfMinute(270), toSlot: slotOfMinute(540), factor: 0.9 } as const;

/** A row of numbers of which each leans on the one before, with the same spread throughout. */
export function correlatedRow(random: RandomSource, length: number, correlation: number, sd: number): Float64Array {
  const row = new Float64Array(length);
  const own = sd * Math.sqrt(1 - correlation ** 2);
  for (let i = 0; i < length; i++) {
    row[i] = i === 0 ? normalDraw(random, 0, sd) : correlation * (row[i - 1] ?? 0) + normalDraw(random, 0, own);
  }
  return row;
}

/**
 * How sensitive a person is to insulin in every slot of a run, as a factor on their
 * own mean: days differ, nights (00:00 to 06:00) have a chance of their own, and from
 * 04:30 to 09:00 it is a tenth less.
 */
export function drawSensitivity(random: RandomSource, days: number, spread = USUAL_SENSITIVITY_SPREAD): Float64Array {
  const day = correlatedRow(random, days, spread.dayCorrelation, spread.dayLogSd);
  const slow = correlatedRow(random, days, spread.slowCorrelation, spread.slowLogSd);
  const night = correlatedRow(random, days, 0, spread.nightLogSd);
  const factors = new Float64Array(days * SLOTS_PER_DAY);
  for (let d = 0; d < days; d++) {
    const tide = slow[d] ?? 0;
    const byDay = Math.exp((day[d] ?? 0) + tide);
    const byNight = Math.exp((day[d] ?? 0) / 2 + tide + (night[d] ?? 0));
    const first = d * SLOTS_PER_DAY;
    factors.fill(byDay, first, first + SLOTS_PER_DAY).fill(byNight, first, first + NIGHT_ENDS);
    for (let slot = first + DAWN.fromSlot; slot < first + DAWN.toSlot; slot++) factors[slot] = (factors[slot] ?? 1) * DAWN.factor;
  }
  return factors;
}
