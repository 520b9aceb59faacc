import { DEMO_DAYS, DEMO_EFFECTIVE, DEMO_FEVER, DEMO_MISSED_DOSE_DAY, DEMO_PRESSURE, isDemoDayOff, slotOfMoment } from "./demo-calendar";
import { DEMO_MEALS, DEMO_TRUTH, demoDayFactors, demoParameters, type DemoTruth } from "./demo-person";
import { DEMO_PROFILES } from "./demo-profiles";
import { drawLivedDays, RESCUE_CHANCE_SLOTS, type LivedDays } from "./lived-days";
import type { SimulatedMeal } from "./meals";
import { programmedProfile } from "./programmed-profile";
import { seededRandom } from "./random";
import { simulate, type SimulatedRun } from "./run";
import { SLOTS_PER_DAY, slotOfMinute } from "./slots";

/** Fever leaves this share of what insulin does; lying on a sensor leaves this share of its reading. */
const FEVER_FACTOR = 0.6;
const PRESSURE_FACTOR = 0.38;
const BOLUS_STEP_MILLI_UNITS = 50;

const firstSlotOf = (day: number) => (day - 1) * SLOTS_PER_DAY;

function scale(values: Float64Array, fromSlot: number, toSlot: number, factor: number): void {
  for (let slot = fromSlot; slot < toSlot; slot++) values[slot] = (values[slot] ?? 0) * factor;
}

/** The days as chance and the story have them: parts of the day, fever, the forgotten dose, the night on the sensor. */
function demoLife(truth: DemoTruth): LivedDays {
  const drawn = drawLivedDays(seededRandom(truth.seed), DEMO_DAYS, (index) => isDemoDayOff(index + 1), { habits: DEMO_MEALS, spread: truth.spread, countLogSd: truth.countLogSd });
  const sensitivity = drawn.sensitivity.slice();
  const sensorFactors = drawn.sensorFactors.slice();
  const factors = demoDayFactors(truth);
  for (let slot = 0; slot < sensitivity.length; slot++) {
    sensitivity[slot] = (sensitivity[slot] ?? 1) * (factors[slot % SLOTS_PER_DAY] ?? 1);
  }
  scale(sensitivity, slotOfMoment(DEMO_FEVER.begins), slotOfMoment(DEMO_FEVER.ends), FEVER_FACTOR);
  const night = firstSlotOf(DEMO_PRESSURE.day);
  const [fromSlot, toSlot] = [night + slotOfMinute(DEMO_PRESSURE.fromMinute), night + slotOfMinute(DEMO_PRESSURE.toMinute)];
  scale(sensorFactors, fromSlot, toSlot, PRESSURE_FACTOR);
  const sleepsThrough = drawn.sleepsThrough.slice().fill(1, Math.floor(fromSlot / RESCUE_CHANCE_SLOTS), Math.ceil(toSlot / RESCUE_CHANCE_SLOTS));
  const meals = drawn.meals.map((meal): SimulatedMeal => {
    const isForgotten = meal.name === "dinner" && Math.floor(meal.slot / SLOTS_PER_DAY) + 1 === DEMO_MISSED_DOSE_DAY;
    return { ...meal, doseSlot: isForgotten ? null : (meal.doseSlot ?? meal.slot) };
  });
  return { ...drawn, sensitivity, sensorFactors, sleepsThrough, meals };
}

/** What the demo's devices and person leave behind: 32 days, slot 0 is midnight of day 1. */
export type DemoSeries = Readonly<{ run: SimulatedRun; meals: ReadonlyArray<SimulatedMeal> }>;

/**
 * The glucose, insulin and meals of the demo: the published model with the settings in
 * force at each moment. The same every time.
 */
export function demoSeries(truth: DemoTruth = DEMO_TRUTH): DemoSeries {
  const life = demoLife(truth);
  const inForce = [
    [DEMO_EFFECTIVE.version1, DEMO_PROFILES.start],
    [DEMO_EFFECTIVE.version2, DEMO_PROFILES.breakfast15],
    [DEMO_EFFECTIVE.version3, DEMO_PROFILES.night055],
    [DEMO_EFFECTIVE.version4, DEMO_PROFILES.afternoon50],
    [DEMO_EFFECTIVE.version5, DEMO_PROFILES.night055],
  ] as const;
  const timeline = inForce.map(([moment, profile], i) => ({ fromSlot: i === 0 ? 0 : slotOfMoment(moment), settings: programmedProfile(profile) }));
  const run = simulate(demoParameters(truth), life, timeline, { gain: truth.gain, bolusStepMilliUnits: BOLUS_STEP_MILLI_UNITS });
  return { run, meals: life.meals };
}
