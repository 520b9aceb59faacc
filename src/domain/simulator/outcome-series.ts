import type { InsulinDay } from "@/domain/comparison/adjusted";
import type { DayValue } from "@/domain/comparison/day-value";
import type { OutcomeId } from "@/domain/comparison/outcomes";
import { NIGHT_ENDS_SLOT } from "./loop-settings";
import type { MealName, SimulatedMeal } from "./meals";
import type { SimulatedRun } from "./run";
import { SLOTS_PER_DAY, SLOTS_PER_HOUR } from "./slots";

/** The days of a run as the comparison reads them. */
export type OutcomeSeries = Readonly<{
  series: Record<OutcomeId, DayValue[]>;
  below54Percent: DayValue[];
  insulin: Readonly<{ night: InsulinDay[]; day: InsulinDay[] }>;
}>;

const AFTER_MEAL_SLOTS = 4 * SLOTS_PER_HOUR;
/** A correction is judged from two to four hours after it. */
const AFTER_CORRECTION = { fromSlots: 2 * SLOTS_PER_HOUR, toSlots: 4 * SLOTS_PER_HOUR } as const;

const isInRange = (glucoseMgDl: number) => glucoseMgDl >= 70 && glucoseMgDl <= 180;

function meanBetween(values: Float64Array, fromSlot: number, toSlot: number, of: (value: number) => number = (value) => value): number {
  let sum = 0;
  for (let slot = fromSlot; slot < toSlot; slot++) sum += of(values[slot] ?? 0);
  return sum / (toSlot - fromSlot);
}

const percent = (test: (value: number) => boolean) => (value: number) => (test(value) ? 100 : 0);

/**
 * Each outcome of the comparison for each day of a run, and the insulin of its days
 * and nights. Carbohydrate of a day is what was entered for doses: a meal without a
 * dose was not written down.
 *
 * @param firstDay day number, since 1970-01-01, of the first day of the run
 * @returns days on which an outcome does not exist (no correction, a meal too near the end) are absent
 */
export function outcomeSeries(run: SimulatedRun, meals: ReadonlyArray<SimulatedMeal>, firstDay: number): OutcomeSeries {
  const { glucoseMgDl: glucose, days } = run;
  const valuesOf = (value: (firstSlot: number, index: number) => number | null): DayValue[] =>
    Array.from({ length: days }, (_, index) => ({ index, value: value(index * SLOTS_PER_DAY, index) })).flatMap(({ index, value }) =>
      value === null ? [] : [{ day: firstDay + index, value, isUsable: true }],
    );
  const byDay = (of?: (value: number) => number) => valuesOf((first) => meanBetween(glucose, first, first + SLOTS_PER_DAY, of));
  const byNight = (of?: (value: number) => number) => valuesOf((first) => meanBetween(glucose, first, first + NIGHT_ENDS_SLOT, of));
  const afterMeal = (name: MealName) => {
    const slots = new Map(meals.filter((meal) => meal.name === name).map(({ slot }) => [Math.floor(slot / SLOTS_PER_DAY), slot]));
    return valuesOf((_, index) => {
      const slot = slots.get(index);
      return slot === undefined || slot + AFTER_MEAL_SLOTS > glucose.length ? null : meanBetween(glucose, slot, slot + AFTER_MEAL_SLOTS);
    });
  };
  const afterCorrections = valuesOf((first) => {
    const shares: number[] = [];
    for (let slot = first; slot < first + SLOTS_PER_DAY && slot + AFTER_CORRECTION.toSlots <= glucose.length; slot++) {
      if (run.isCorrection[slot] === 1) {
        shares.push(meanBetween(glucose, slot + AFTER_CORRECTION.fromSlots, slot + AFTER_CORRECTION.toSlots, percent(isInRange)));
      }
    }
    return shares.length === 0 ? null : shares.reduce((a, b) => a + b, 0) / shares.length;
  });
  const insulinUntil = (slots: number, carbohydrateOf: (index: number) => number): InsulinDay[] =>
    Array.from({ length: days }, (_, index) => {
      const [from, to] = [index * SLOTS_PER_DAY, index * SLOTS_PER_DAY + slots];
      const milliUnits = slots * (meanBetween(run.basalMilliUnits, from, to) + meanBetween(run.bolusMilliUnits, from, to));
      return {
        day: firstDay + index, glucoseMgDl: meanBetween(glucose, from, to),
        insulinUnits: milliUnits / 1000, carbohydrateGrams: carbohydrateOf(index),
      };
    });
  return {
    series: {
      "day-time-in-range": byDay(percent(isInRange)),
      "day-mean": byDay(),
      "day-lows": byDay(percent((value) => value < 70)),
      "night-mean": byNight(),
      "night-time-in-range": byNight(percent(isInRange)),
      "breakfast-mean": afterMeal("breakfast"),
      "lunch-mean": afterMeal("lunch"),
      "dinner-mean": afterMeal("dinner"),
      "correction-in-range": afterCorrections,
    },
    below54Percent: byDay(percent((value) => value < 54)),
    insulin: { night: insulinUntil(NIGHT_ENDS_SLOT, () => 0), day: insulinUntil(SLOTS_PER_DAY, countedGramsByDay(meals)) },
  };
}

function countedGramsByDay(meals: ReadonlyArray<SimulatedMeal>): (index: number) => number {
  const grams = new Map<number, number>();
  for (const { slot, countedGrams, doseSlot } of meals) {
    const index = Math.floor(slot / SLOTS_PER_DAY);
    if (doseSlot !== null) grams.set(index, (grams.get(index) ?? 0) + countedGrams);
  }
  return (index) => grams.get(index) ?? 0;
}
