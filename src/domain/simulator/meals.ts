import type { RandomSource } from "./random";
import { gammaDraw, lognormalDraw, normalDraw } from "./random-draws";
import { SLOT_MINUTES, SLOTS_PER_DAY } from "./slots";

export type MealName = "breakfast" | "lunch" | "snack" | "dinner";

/** A habit: when and how much, with spreads (min after midnight, g), and how often. */
export type MealHabit = Readonly<{
  name: MealName; minute: number; minuteSd: number; grams: number; gramsSd: number; shareOfDays: number;
}>;

/** Habits of comparison.md 5.1 (ours). */
export const USUAL_MEALS: ReadonlyArray<MealHabit> = [
  { name: "breakfast", minute: 465, minuteSd: 25, grams: 45, gramsSd: 12, shareOfDays: 1 },
  { name: "lunch", minute: 765, minuteSd: 35, grams: 65, gramsSd: 18, shareOfDays: 1 },
  { name: "snack", minute: 960, minuteSd: 30, grams: 15, gramsSd: 6, shareOfDays: 0.6 },
  { name: "dinner", minute: 1140, minuteSd: 40, grams: 75, gramsSd: 20, shareOfDays: 1 },
];

/**
 * One meal of a run. Slots count from the beginning of the run.
 *
 * @property grams what was eaten; `countedGrams` what the person took it for, whole grams
 * @property doseSlot when the dose for it was given, `null` for a meal without a dose
 */
export type SimulatedMeal = Readonly<{
  name: MealName; slot: number; grams: number; countedGrams: number; doseSlot: number | null;
}>;

const MOST_GRAMS = 160;
/** How far counts are from what is eaten: spread of the logarithm. */
export const USUAL_COUNT_LOG_SD = 0.3;
const MISSED_SHARE = 0.06;
/** Meals counted below this get no dose, g. */
const LEAST_DOSED_GRAMS = 5;
/** Doses come from 10 min before a meal on, most of them close to it. */
const DOSE_LEAD_MINUTES = 10;
const DOSE_DELAY = { shape: 1.2, scaleMinutes: 5 } as const;
/** On days off breakfast is an hour later and dinner larger. */
const DAY_OFF = { breakfastLaterMinutes: 60, dinnerFactor: 1 / 0.93 } as const;

function toGrid(minute: number): number {
  return Math.round(minute / SLOT_MINUTES);
}

function drawMeal(random: RandomSource, habit: MealHabit, day: number, lastSlot: number, isDayOff: boolean, countLogSd: number) {
  const minute = normalDraw(random, habit.minute, habit.minuteSd) + (isDayOff && habit.name === "breakfast" ? DAY_OFF.breakfastLaterMinutes : 0);
  const amount = normalDraw(random, habit.grams, habit.gramsSd) * (isDayOff && habit.name === "dinner" ? DAY_OFF.dinnerFactor : 1);
  const grams = Math.min(MOST_GRAMS, Math.max(0, amount));
  const countedGrams = Math.round(lognormalDraw(random, 1, countLogSd) * grams);
  const delay = SLOT_MINUTES * toGrid(gammaDraw(random, DOSE_DELAY.shape, DOSE_DELAY.scaleMinutes)) - DOSE_LEAD_MINUTES;
  const isMissed = random() < MISSED_SHARE;
  const isEaten = random() < habit.shareOfDays;
  const slot = day * SLOTS_PER_DAY + Math.min(SLOTS_PER_DAY - 1, Math.max(0, toGrid(minute)));
  const doseSlot = Math.min(lastSlot, Math.max(0, slot + delay / SLOT_MINUTES));
  const isDosed = !isMissed && countedGrams >= LEAST_DOSED_GRAMS;
  return { isEaten, meal: { name: habit.name, slot, grams, countedGrams, doseSlot: isDosed ? doseSlot : null } };
}

/**
 * What a person eats over a run, drawn before it begins: the same plan can be lived
 * under different settings.
 *
 * @param isDayOff for a day of the run, counted from 0
 * @returns in order of the day, then of the habits
 */
export function drawMeals(
  random: RandomSource,
  days: number,
  isDayOff: (day: number) => boolean,
  { habits = USUAL_MEALS, countLogSd = USUAL_COUNT_LOG_SD }: { habits?: ReadonlyArray<MealHabit>; countLogSd?: number } = {},
): SimulatedMeal[] {
  const lastSlot = days * SLOTS_PER_DAY - 1;
  const meals: SimulatedMeal[] = [];
  for (let day = 0; day < days; day++) {
    for (const habit of habits) {
      const { isEaten, meal } = drawMeal(random, habit, day, lastSlot, isDayOff(day), countLogSd);
      if (isEaten && meal.grams > 0) meals.push(meal);
    }
  }
  return meals;
}
