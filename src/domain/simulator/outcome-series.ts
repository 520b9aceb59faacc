import type { InsulinDay } from "@/domain/comparison/adjusted";
import { seriesOf, type DailyFigures, type MEASURES } from "@/domain/comparison/day-series";
import type { DayValue } from "@/domain/comparison/day-value";
import { eventSeries } from "@/domain/comparison/event-series";
import type { OutcomeId } from "@/domain/comparison/outcomes";
import { NIGHT_ENDS_SLOT } from "./loop-settings";
import type { MealName, SimulatedMeal } from "./meals";
import type { SimulatedRun } from "./run";
import { SLOT_MINUTES, SLOTS_PER_DAY } from "./slots";

/** The days of a run as the comparison reads them. */
export type OutcomeSeries = Readonly<{
  series: Record<OutcomeId, DayValue[]>;
  below54Percent: DayValue[];
  insulin: Readonly<{ night: InsulinDay[]; day: InsulinDay[] }>;
}>;

const MINUTE_MS = 60_000;
const AFTER_MEAL = { from: 0, to: 240, value: "mean", intervalMinutes: SLOT_MINUTES } as const;
const AFTER_CORRECTION = { from: 120, to: 240, value: "in-range", intervalMinutes: SLOT_MINUTES } as const;

const bandOf = (glucoseMgDl: number) => (glucoseMgDl < 54 ? 0 : glucoseMgDl < 70 ? 1 : glucoseMgDl <= 180 ? 2 : glucoseMgDl <= 250 ? 3 : 4);
const dayOfSlot = (slot: number) => Math.floor(slot / SLOTS_PER_DAY);

/** The first slots of one day: how many readings, their sum, and how many in each band. */
function figuresOf(glucose: Float64Array, index: number, slots: number, dayNumber: number): DailyFigures {
  const bandCounts = [0, 0, 0, 0, 0];
  let readings = 0;
  let sumMgDl = 0;
  for (let slot = index * SLOTS_PER_DAY; slot < index * SLOTS_PER_DAY + slots; slot++) {
    const value = glucose[slot] ?? NaN;
    if (Number.isNaN(value)) continue;
    const band = bandOf(value);
    bandCounts[band] = (bandCounts[band] ?? 0) + 1;
    readings += 1;
    sumMgDl += value;
  }
  return { dayNumber, readings, sumMgDl, bandCounts, minutesInPart: slots * SLOT_MINUTES, intervalMinutes: SLOT_MINUTES };
}

function sumBetween(values: Float64Array, fromSlot: number, toSlot: number): number {
  let sum = 0;
  for (let slot = fromSlot; slot < toSlot; slot++) sum += values[slot] ?? 0;
  return sum;
}

function countedGramsByDay(meals: ReadonlyArray<SimulatedMeal>, days: number): Float64Array {
  const grams = new Float64Array(days);
  for (const { slot, countedGrams, doseSlot } of meals) {
    if (doseSlot !== null) grams[dayOfSlot(slot)] = (grams[dayOfSlot(slot)] ?? 0) + countedGrams;
  }
  return grams;
}

/**
 * Each outcome of the comparison for each day of a run, worked out as for anyone's
 * readings, and the insulin of its days and nights. Carbohydrate of a day is what was
 * entered for doses: a meal without a dose was not written down.
 *
 * @param firstDay day number, since 1970-01-01, of the first day of the run
 * @param leftOut  flagged days, by day number, with the flag in words
 * @returns a reading that is NaN is missing; days on which an outcome does not exist are absent
 */
export function outcomeSeries(
  run: SimulatedRun,
  meals: ReadonlyArray<SimulatedMeal>,
  firstDay: number,
  leftOut: ReadonlyMap<number, string> = new Map(),
): OutcomeSeries {
  const indexes = Array.from({ length: run.days }, (_, index) => index);
  const wholeDays = indexes.map((index) => figuresOf(run.glucoseMgDl, index, SLOTS_PER_DAY, firstDay + index));
  const nights = indexes.map((index) => figuresOf(run.glucoseMgDl, index, NIGHT_ENDS_SLOT, firstDay + index));
  const byDay = (measure: keyof typeof MEASURES) => seriesOf(wholeDays, measure, leftOut);
  const byNight = (measure: keyof typeof MEASURES) => seriesOf(nights, measure, leftOut);

  const readings = Array.from(run.glucoseMgDl, (glucoseMgDl, slot) => ({
    atMs: slot * SLOT_MINUTES * MINUTE_MS, glucoseMgDl, isInRange: bandOf(glucoseMgDl) === 2,
  })).filter(({ glucoseMgDl }) => !Number.isNaN(glucoseMgDl));
  const event = (slot: number) => ({ atMs: slot * SLOT_MINUTES * MINUTE_MS, day: firstDay + dayOfSlot(slot) });
  const afterMeal = (name: MealName) => eventSeries(meals.filter((meal) => meal.name === name).map(({ slot }) => event(slot)), readings, AFTER_MEAL, leftOut);
  const corrections = Array.from(run.isCorrection.keys()).filter((slot) => run.isCorrection[slot] === 1);

  const carbohydrate = countedGramsByDay(meals, run.days);
  const insulinOf = (figures: ReadonlyArray<DailyFigures>, slots: number, hasMeals: boolean): InsulinDay[] =>
    figures.map(({ dayNumber, sumMgDl, readings: count }, index) => {
      const [from, to] = [index * SLOTS_PER_DAY, index * SLOTS_PER_DAY + slots];
      return {
        day: dayNumber, glucoseMgDl: sumMgDl / count,
        insulinUnits: (sumBetween(run.basalMilliUnits, from, to) + sumBetween(run.bolusMilliUnits, from, to)) / 1000,
        carbohydrateGrams: hasMeals ? (carbohydrate[index] ?? 0) : 0,
      };
    });
  return {
    series: {
      "day-time-in-range": byDay("inRangePercent"), "day-mean": byDay("meanMgDl"), "day-lows": byDay("below70Percent"),
      "night-mean": byNight("meanMgDl"), "night-time-in-range": byNight("inRangePercent"),
      "breakfast-mean": afterMeal("breakfast"), "lunch-mean": afterMeal("lunch"), "dinner-mean": afterMeal("dinner"),
      "correction-in-range": eventSeries(corrections.map(event), readings, AFTER_CORRECTION, leftOut),
    },
    below54Percent: byDay("below54Percent"),
    insulin: { night: insulinOf(nights, NIGHT_ENDS_SLOT, false), day: insulinOf(wholeDays, SLOTS_PER_DAY, true) },
  };
}
