import { fraction, type Fraction } from "./fraction";
import { roundToStep, type RoundingDirection } from "./rounding";
import { spansOf, type Schedule } from "./schedule";

type BasalBlock = Readonly<{ startMinute: number; milliUnitsPerHour: number }>;

/** A day's programmed basal insulin in milli-units, exact: rate x minutes / 60 over all blocks. */
export function exactDailyBasalMilliUnits(basal: Schedule<BasalBlock>): Fraction {
  let rateMinutes = 0n;
  for (const { block, fromMinute, toMinute } of spansOf(basal)) {
    rateMinutes += BigInt(block.milliUnitsPerHour) * BigInt(toMinute - fromMinute);
  }
  return fraction(rateMinutes, 60n);
}

/**
 * The same as an integer. Blocks that start on the hour always come out exact;
 * others may leave a fraction of a milli-unit, and the caller names its rounding.
 */
export function dailyBasalMilliUnits(basal: Schedule<BasalBlock>, direction: RoundingDirection): number {
  const whole = roundToStep(exactDailyBasalMilliUnits(basal), { direction, step: fraction(1n, 1n) });
  return Number(whole.numerator);
}
