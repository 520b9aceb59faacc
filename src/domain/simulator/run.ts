import { AppError } from "@/domain/errors";
import { mmolToMgDl } from "@/domain/units";
import type { LivedDays } from "./lived-days";
import { RESCUE_CHANCE_SLOTS } from "./lived-days";
import { automaticRate, bolusUnits, LOOP, PERSON, wantsCorrection } from "./loop";
import type { LoopSettings } from "./loop-settings";
import { mealMmol, STATE } from "./model";
import { insulinOnBoard } from "./on-board";
import type { ModelParameters } from "./parameters";
import { stepperOf, type Stepper } from "./runge-kutta";
import { SENSOR_FLOOR_MMOL } from "./sensor";
import { SLOT_MINUTES, SLOTS_PER_DAY, SLOTS_PER_HOUR } from "./slots";
import { steadyStateAt } from "./steady-state";

/** Settings and the slot, counted from the beginning of the run, from which they hold. */
export type TimelineEntry = Readonly<{ fromSlot: number; settings: LoopSettings }>;

/**
 * What a run leaves behind, one value for each slot: readings in mg/dL, unrounded; basal
 * delivered and boluses in whole milli-units. `isCorrection` is 1 where a bolus was for no meal.
 */
export type SimulatedRun = Readonly<{
  days: number;
  glucoseMgDl: Float64Array;
  basalMilliUnits: Float64Array;
  bolusMilliUnits: Float64Array;
  isCorrection: Uint8Array;
}>;

export type RunOptions = Readonly<{
  gain?: number;
  /** Boluses are rounded to a multiple of this. */
  bolusStepMilliUnits?: number;
}>;

const { meal1, depot1, transport, disposal, blood, tissue } = STATE;
const STARTS_AT_MMOL = 6.2;
/** Blood glucose is held above this, mmol/L, so that very strong insulin cannot break the steps. */
const LEAST_BLOOD_MMOL = 1.5;
/** The method of Runge and Kutta stays near a decaying solution while rate times step is below 2.78. */
const LARGEST_STEP_SHARE = 2;
const SLOPE_SLOTS = LOOP.slopeMinutes / SLOT_MINUTES;
const RESCUE_REST_SLOTS = PERSON.everyMinutes / SLOT_MINUTES;
const LONG_AGO = -SLOTS_PER_DAY;

function gramsBySlot(slots: number, life: LivedDays): { eaten: Float64Array; dosed: Float64Array } {
  const eaten = new Float64Array(slots);
  const dosed = new Float64Array(slots);
  for (const { slot, grams, countedGrams, doseSlot } of life.meals) {
    eaten[slot] = (eaten[slot] ?? 0) + grams;
    if (doseSlot !== null) dosed[doseSlot] = (dosed[doseSlot] ?? 0) + countedGrams;
  }
  return { eaten, dosed };
}

/**
 * Five minutes, in one step. Where insulin acts so fast that one step would run away
 * from the solution, in as many as it takes; no ordinary dose comes near that.
 */
function live(step: Stepper, state: Float64Array, milliUnitsPerMinute: number, sensitivity: number, returnPerMinute: number): void {
  const fastest = Math.max(state[transport] ?? 0, returnPerMinute + (state[disposal] ?? 0));
  const steps = Math.max(1, Math.ceil((SLOT_MINUTES * fastest) / LARGEST_STEP_SHARE));
  for (let i = 0; i < steps; i++) step(state, SLOT_MINUTES / steps, milliUnitsPerMinute, sensitivity);
}

/**
 * Lives through days with a loop: sensor, meals, boluses, corrections by hand, food
 * against lows, all on the five-minute grid (comparison.md 5.1).
 *
 * @param timeline ascending; the first entry holds from slot 0
 * @throws {AppError} INVALID_INPUT for a timeline that does not begin at slot 0 or goes back
 */
export function simulate(
  parameters: ModelParameters,
  life: LivedDays,
  timeline: ReadonlyArray<TimelineEntry>,
  { gain = LOOP.usualGain, bolusStepMilliUnits = 1 }: RunOptions = {},
): SimulatedRun {
  const first = timeline[0];
  if (first?.fromSlot !== 0 || timeline.some(({ fromSlot }, i) => fromSlot < (timeline[i - 1]?.fromSlot ?? 0))) {
    throw new AppError("INVALID_INPUT", "a timeline begins at slot 0 and goes forward");
  }
  const slots = life.days * SLOTS_PER_DAY;
  const { eaten, dosed } = gramsBySlot(slots, life);
  const readings = new Float64Array(slots), basal = new Float64Array(slots), bolus = new Float64Array(slots);
  const isCorrection = new Uint8Array(slots);
  const beyond = new Float64Array(slots);
  const step = stepperOf(parameters);
  const { state } = steadyStateAt(parameters, STARTS_AT_MMOL);
  const glucoseVolumeL = parameters.glucoseVolumeLPerKg * parameters.bodyWeightKg;
  const leastBloodMmol = LEAST_BLOOD_MMOL * glucoseVolumeL;
  const at = { carbRatioGramsPerUnit: 0, sensitivityMmolPerUnit: 0, aimMmol: 0, basalUnitsPerHour: 0, gain };
  const seen = { nowMmol: 0, earlierMmol: 0, onBoardUnits: 0 };
  let inForce = first.settings, next = 1;
  let lastMeal = LONG_AGO, lastCorrection = LONG_AGO, lastRescue = LONG_AGO;

  for (let slot = 0; slot < slots; slot++) {
    for (let entry = timeline[next]; entry !== undefined && entry.fromSlot <= slot; entry = timeline[++next]) inForce = entry.settings;
    const slotOfDay = slot % SLOTS_PER_DAY;
    at.carbRatioGramsPerUnit = inForce.carbRatioGramsPerUnit[slotOfDay] ?? 0;
    at.sensitivityMmolPerUnit = inForce.sensitivityMmolPerUnit[slotOfDay] ?? 0;
    at.basalUnitsPerHour = inForce.basalUnitsPerHour[slotOfDay] ?? 0;
    at.aimMmol = inForce.aimMmol;

    const bloodMmol = (state[blood] ?? 0) / glucoseVolumeL;
    const now = Math.max(SENSOR_FLOOR_MMOL, bloodMmol * (life.sensorFactors[slot] ?? 1));
    readings[slot] = now;
    seen.nowMmol = now;
    seen.earlierMmol = readings[Math.max(0, slot - SLOPE_SLOTS)] ?? now;
    const before = insulinOnBoard(beyond, slot);

    let grams = eaten[slot] ?? 0;
    if (grams > 0) lastMeal = slot;
    const isAwake = life.sleepsThrough[Math.floor(slot / RESCUE_CHANCE_SLOTS)] !== 1;
    if (now < PERSON.eatsBelowMmol && isAwake && slot - lastRescue >= RESCUE_REST_SLOTS) {
      grams += PERSON.rescueGrams;
      lastRescue = slot;
    }
    if (grams > 0) state[meal1] = (state[meal1] ?? 0) + mealMmol(parameters, grams);

    const counted = dosed[slot] ?? 0;
    const corrects = counted === 0 && wantsCorrection(slot, now, lastMeal, lastCorrection);
    const wanted = counted > 0 || corrects ? bolusUnits(counted, now, before, at) : 0;
    const given = Math.round((wanted * 1000) / bolusStepMilliUnits) * bolusStepMilliUnits;
    if (given > 0) {
      bolus[slot] = given;
      state[depot1] = (state[depot1] ?? 0) + given;
      if (corrects) {
        isCorrection[slot] = 1;
        lastCorrection = slot;
      }
    }

    seen.onBoardUnits = before + given / 1000;
    const delivered = Math.round((automaticRate(seen, at) * 1000) / SLOTS_PER_HOUR);
    basal[slot] = delivered;
    beyond[slot] = (given + delivered) / 1000 - at.basalUnitsPerHour / SLOTS_PER_HOUR;
    live(step, state, delivered / SLOT_MINUTES, life.sensitivity[slot] ?? 1, parameters.returnPerMinute);
    if (!((state[blood] ?? 0) >= leastBloodMmol)) state[blood] = leastBloodMmol;
    if (!((state[tissue] ?? 0) >= 0)) state[tissue] = 0;
  }
  return { days: life.days, glucoseMgDl: readings.map(mmolToMgDl), basalMilliUnits: basal, bolusMilliUnits: bolus, isCorrection };
}
