import { drawSensitivity, USUAL_SENSITIVITY_SPREAD, type SensitivitySpread } from "./day-sensitivity";
import { drawMeals, type MealHabit, type SimulatedMeal } from "./meals";
import type { RandomSource } from "./random";
import { drawSensorFactors } from "./sensor";
import { SLOTS_PER_DAY, SLOTS_PER_HOUR } from "./slots";

/**
 * Everything that chance decides about a run of days, whatever is programmed. The
 * same days can be lived twice under different settings, so that only the settings
 * differ.
 *
 * @property sensitivity factor for every slot; `sensorFactors` likewise, reading over blood
 * @property sleepsThrough for every half hour, 1 where a low would not wake the person
 */
export type LivedDays = Readonly<{
  days: number;
  sensitivity: Float64Array;
  meals: ReadonlyArray<SimulatedMeal>;
  sensorFactors: Float64Array;
  sleepsThrough: Uint8Array;
}>;

/** A chance for a rescue comes round this often, slots. */
export const RESCUE_CHANCE_SLOTS = SLOTS_PER_HOUR / 2;

/** How many lows in ten nights go unnoticed for half an hour. */
const MISSED_AT_NIGHT_SHARE = 0.4;
const ASLEEP = { fromHour: 23, untilHour: 7 } as const;

function drawSleep(random: RandomSource, days: number): Uint8Array {
  const chancesPerDay = SLOTS_PER_DAY / RESCUE_CHANCE_SLOTS;
  return Uint8Array.from({ length: days * chancesPerDay }, (_, chance) => {
    const hour = (chance % chancesPerDay) / 2;
    const isNight = hour >= ASLEEP.fromHour || hour < ASLEEP.untilHour;
    return random() < MISSED_AT_NIGHT_SHARE && isNight ? 1 : 0;
  });
}

/**
 * Draws the days of a run.
 *
 * @param isDayOff for a day of the run, counted from 0: later breakfast, larger dinner
 * @param own `habits`, `countLogSd` (meals) and `spread` (sensitivity) of a person who is unlike the usual
 */
export function drawLivedDays(
  random: RandomSource,
  days: number,
  isDayOff: (day: number) => boolean,
  { spread = USUAL_SENSITIVITY_SPREAD, ...own }: { habits?: ReadonlyArray<MealHabit>; countLogSd?: number; spread?: SensitivitySpread } = {},
): LivedDays {
  return {
    days,
    sensitivity: drawSensitivity(random, days, spread),
    meals: drawMeals(random, days, isDayOff, own),
    sensorFactors: drawSensorFactors(random, days),
    sleepsThrough: drawSleep(random, days),
  };
}
