import { mealMmol, STATE } from "./model";
import type { ModelParameters } from "./parameters";
import { stepperOf } from "./runge-kutta";
import { steadyStateAt } from "./steady-state";

/** Settings that fit a simulated person as the model sees it, the same all day. */
export type IdealSettings = Readonly<{
  basalUnitsPerHour: number;
  sensitivityMmolPerUnit: number;
  carbRatioGramsPerUnit: number;
}>;

/** Glucose at which the person is held before the small dose or meal, mmol/L. */
const HELD_AT_MMOL = 6.2;
const WATCHED_MINUTES = 240;
const TRIAL_UNITS = 0.2;
const TRIAL_GRAMS = 10;

/**
 * The settings the model itself implies: the basal that holds 6.2 mmol/L, the fall
 * 240 min after 0.2 U per unit, and that fall divided by the rise 240 min after 10 g
 * per gram (comparison.md 5.1; ours).
 *
 * @throws {AppError} INVALID_RANGE for a person who cannot be held at 6.2 mmol/L
 */
export function idealSettings(parameters: ModelParameters): IdealSettings {
  const { basalUnitsPerHour, state: held } = steadyStateAt(parameters, HELD_AT_MMOL);
  const step = stepperOf(parameters);
  const changeAfter = (part: number, amount: number) => {
    const state = held.slice();
    state[part] = (state[part] ?? 0) + amount;
    for (let minute = 0; minute < WATCHED_MINUTES; minute++) step(state, 1, (basalUnitsPerHour * 1000) / 60, 1);
    return (state[STATE.blood] ?? 0) / (parameters.glucoseVolumeLPerKg * parameters.bodyWeightKg) - HELD_AT_MMOL;
  };
  const sensitivityMmolPerUnit = -changeAfter(STATE.depot1, 1000 * TRIAL_UNITS) / TRIAL_UNITS;
  const riseMmolPerGram = changeAfter(STATE.meal1, mealMmol(parameters, TRIAL_GRAMS)) / TRIAL_GRAMS;
  return { basalUnitsPerHour, sensitivityMmolPerUnit, carbRatioGramsPerUnit: sensitivityMmolPerUnit / riseMmolPerGram };
}
