import type { EntryData } from "@/domain/journal/entry";
import { hasBegun, momentOfSlot } from "./demo-calendar";
import type { DemoEntry } from "./demo-diary";
import type { DemoSeries } from "./demo-series";
import type { MealName, SimulatedMeal } from "./meals";
import { SLOT_MINUTES } from "./slots";

type Speed = Extract<EntryData, { kind: "meal" }>["speed"];

/** What a baker eats, in turn. */
const LABELS: Record<MealName, ReadonlyArray<readonly [label: string, speed: Speed]>> = {
  breakfast: [["Rye rolls and cheese", "mixed"], ["Oat porridge with apple", "slow"], ["Two cardamom buns", "fast"], ["Toast and brown cheese", "mixed"]],
  lunch: [["Lentil soup and bread", "slow"], ["Open sandwiches", "mixed"], ["Potato salad and trout", "mixed"], ["Leftover pie", "unsure"], ["Barley bowl", "slow"]],
  snack: [["Pear", "fast"], ["End of a loaf", "mixed"], ["Yoghurt and berries", "mixed"]],
  dinner: [["Fish cakes and potatoes", "mixed"], ["Bean stew", "slow"], ["Pasta with greens", "slow"], ["Flatbread night", "unsure"], ["Meatballs and mash", "mixed"]],
};

function timingOf({ slot, doseSlot }: SimulatedMeal): Extract<EntryData, { kind: "dose" }>["timing"] {
  if (doseSlot === null) return "missed";
  return doseSlot < slot ? "before" : doseSlot === slot ? "with" : "after";
}

function mealEntries(meal: SimulatedMeal, index: number, bolusMilliUnits: Float64Array): DemoEntry[] {
  const labels = LABELS[meal.name];
  const [label, speed] = labels[index % labels.length] ?? ["A meal", "unsure"];
  const eaten: DemoEntry = { ...momentOfSlot(meal.slot), data: { kind: "meal", carbohydrateGrams: meal.countedGrams, label, speed } };
  const milliUnits = meal.doseSlot === null ? 0 : (bolusMilliUnits[meal.doseSlot] ?? 0);
  if (meal.doseSlot !== null && milliUnits === 0) return [eaten];
  const at = momentOfSlot(meal.doseSlot ?? meal.slot);
  return [eaten, { ...at, data: { kind: "dose", milliUnits, doseKind: "meal-and-correction", timing: timingOf(meal) } }];
}

/**
 * The meals and doses of the demo as its person logged them: carbohydrate as counted,
 * a forgotten dose as missed, corrections by hand by themselves. In order of time.
 */
export function demoEntries({ run, meals }: DemoSeries): DemoEntry[] {
  const begun = meals.filter(({ slot }) => hasBegun(slot));
  const corrections = [...run.isCorrection.keys()].filter((slot) => run.isCorrection[slot] === 1 && hasBegun(slot));
  return [
    ...begun.flatMap((meal, index) => mealEntries(meal, index + Math.floor(index / 9), run.bolusMilliUnits)),
    ...corrections.map((slot): DemoEntry => ({
      ...momentOfSlot(slot),
      data: { kind: "dose", milliUnits: run.bolusMilliUnits[slot] ?? 0, doseKind: "correction", timing: "with" },
    })),
  ].toSorted((a, b) => a.day - b.day || a.minute - b.minute);
}

/** Readings in whole mg/dL and insulin as delivered in whole milli-units, for every five minutes since the start. */
export type DemoRow = Readonly<{ day: number; minute: number; glucoseMgDl: number; basalMilliUnits: number; bolusMilliUnits: number }>;

/** The trace of the demo's sensor and pump; basal is what was delivered in the five minutes from each row on. */
export function demoRows({ run }: DemoSeries): DemoRow[] {
  const slots = [...run.glucoseMgDl.keys()].filter(hasBegun);
  return slots.map((slot) => ({
    ...momentOfSlot(slot),
    glucoseMgDl: Math.min(SENSOR_CEILING_MG_DL, Math.round(run.glucoseMgDl[slot] ?? 0)),
    basalMilliUnits: run.basalMilliUnits[slot] ?? 0,
    bolusMilliUnits: run.bolusMilliUnits[slot] ?? 0,
  }));
}

/** The most a sensor shows, mg/dL (common practice, no source). */
const SENSOR_CEILING_MG_DL = 400;

/** Minutes that one row stands for. */
export const DEMO_ROW_MINUTES = SLOT_MINUTES;
