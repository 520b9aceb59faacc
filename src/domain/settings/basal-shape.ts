import { fraction, fractionOf, over, plus, times, toNumber, type Fraction } from "./fraction";
import type { Provenance } from "./provenance";
import { roundToStep, weakerRounding } from "./rounding";
import { MINUTES_PER_DAY, spansOf, type Schedule } from "./schedule";

/** How strong each part of the day is against the others; only the proportions count. */
export type BasalShape = Schedule<Readonly<{ startMinute: number; weight: number }>>;

/** "Usual to start with a flat basal rate" (UK insulin pump workbook, read; settings.md 1.4). */
export const FLAT_SHAPE: BasalShape = [{ startMinute: 0, weight: 1 }];

/**
 * Published three-block shape: 00-04 at 0.8, 04-09 at 1.2, the rest at 1 times the
 * flat rate (settings.md 1.4). As printed it sums to 24.2 hours' worth; spreading a
 * day's insulin over it brings it back to 24.
 */
export const EARLY_MORNING_SHAPE = {
  described: {
    id: "early-morning",
    label: "three blocks: less before 04:00, more from 04:00 to 09:00",
    source: "perinatology reference page, brought back to 24 hours",
    provenance: "R",
  },
  shape: [
    { startMinute: 0, weight: 0.8 },
    { startMinute: 240, weight: 1.2 },
    { startMinute: 540, weight: 1 },
  ],
} as const satisfies { described: { provenance: Provenance } & Record<string, string>; shape: BasalShape };

/**
 * Spread a day's basal insulin over a shape. Each rate is rounded down to the
 * pump's step, so the day's sum never exceeds what was to be spread.
 *
 * @param dailyUnits basal insulin of a day, in U
 * @param stepMilliUnitsPerHour smallest step of the pump's rate
 * @throws {AppError} INVALID_RANGE unless the step is above zero
 */
export function spreadDailyBasal(
  dailyUnits: Fraction,
  shape: BasalShape,
  stepMilliUnitsPerHour: number,
): { startMinute: number; milliUnitsPerHour: number }[] {
  const spans = spansOf(shape);
  const weightMinutes = spans
    .map(({ block, fromMinute, toMinute }) => times(fractionOf(block.weight), fractionOf(toMinute - fromMinute)))
    .reduce(plus);
  const meanWeight = over(weightMinutes, fractionOf(MINUTES_PER_DAY));
  const flatMilliUnitsPerHour = times(dailyUnits, fraction(1000n, 24n));
  const rounding = weakerRounding("basal", fractionOf(stepMilliUnitsPerHour));
  return shape.map(({ startMinute, weight }) => {
    const rate = times(flatMilliUnitsPerHour, over(fractionOf(weight), meanWeight));
    return { startMinute, milliUnitsPerHour: toNumber(roundToStep(rate, rounding)) };
  });
}
