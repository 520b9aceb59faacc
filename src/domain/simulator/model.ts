import { GLUCOSE_GRAMS_PER_MOL, type ModelParameters } from "./parameters";

/**
 * Where each part of the model's state stands in its array.
 *
 * - meal1, meal2: glucose in the gut, mmol
 * - depot1, depot2: insulin under the skin, mU; plasma: insulin in the blood, mU/L
 * - transport, disposal (1/min), liver: the three actions of insulin
 * - blood, tissue: glucose in the body, mmol; sensor: mmol/L at the sensor
 */
export const STATE = {
  meal1: 0, meal2: 1, depot1: 2, depot2: 3, plasma: 4,
  transport: 5, disposal: 6, liver: 7, blood: 8, tissue: 9, sensor: 10,
} as const;

export const STATE_SIZE = 11;

/** Blood glucose, mmol/L, below which the brain's use falls, and from which the kidneys lose glucose. */
const BRAIN_FULL_FROM_MMOL = 4.5;
const KIDNEY_FROM_MMOL = 9;
const KIDNEY_PER_MINUTE = 0.003;

/** What leaves the blood whatever insulin does, mmol/min: the brain's use and the kidneys' loss. */
export function fixedLossMmolPerMinute(parameters: ModelParameters, glucoseMmol: number): number {
  const { bodyWeightKg, brainMmolPerKgMinute, glucoseVolumeLPerKg } = parameters;
  const brain = brainMmolPerKgMinute * bodyWeightKg * Math.min(1, glucoseMmol / BRAIN_FULL_FROM_MMOL);
  const kidney = KIDNEY_PER_MINUTE * Math.max(0, glucoseMmol - KIDNEY_FROM_MMOL) * glucoseVolumeLPerKg * bodyWeightKg;
  return brain + kidney;
}

/**
 * Glucose that a meal eaten at once puts into the first part of the gut, mmol.
 *
 * @param carbohydrateGrams eaten
 */
export function mealMmol(parameters: ModelParameters, carbohydrateGrams: number): number {
  return (parameters.absorbedFraction * 1000 * carbohydrateGrams) / GLUCOSE_GRAMS_PER_MOL;
}

/** Writes the rate of change of every part of the state, per minute, into `out`. */
export type Derivative = (
  state: Float64Array, insulinMilliUnitsPerMinute: number, sensitivityFactor: number, out: Float64Array,
) => void;

/**
 * The equations of the model for one person.
 *
 * What the liver makes is never below zero (common practice, no source): without
 * that floor strong insulin would have it consume glucose.
 *
 * @returns a function of the state, the insulin infusion in mU/min and a factor on all
 *   three insulin sensitivities (1 is the person's own)
 */
export function derivativeOf(parameters: ModelParameters): Derivative {
  const {
    bodyWeightKg, returnPerMinute: k12, transportActivationPerMinute: ka1, disposalActivationPerMinute: ka2,
    liverActivationPerMinute: ka3, transportSensitivity, disposalSensitivity, liverSensitivity,
    eliminationPerMinute: ke, mealPeakMinutes: tG, insulinPeakMinutes: tI, sensorPerMinute: kaint,
  } = parameters;
  const insulinVolumeL = parameters.insulinVolumeLPerKg * bodyWeightKg;
  const glucoseVolumeL = parameters.glucoseVolumeLPerKg * bodyWeightKg;
  const liver0 = parameters.liverMmolPerKgMinute * bodyWeightKg;
  const brain0 = parameters.brainMmolPerKgMinute * bodyWeightKg;

  return (state, insulin, factor, out) => {
    const d1 = state[0] ?? 0, d2 = state[1] ?? 0, s1 = state[2] ?? 0, s2 = state[3] ?? 0, plasma = state[4] ?? 0;
    const x1 = state[5] ?? 0, x2 = state[6] ?? 0, x3 = state[7] ?? 0, q1 = state[8] ?? 0, q2 = state[9] ?? 0;
    const glucose = q1 / glucoseVolumeL;
    const brain = glucose >= BRAIN_FULL_FROM_MMOL ? brain0 : (brain0 * glucose) / BRAIN_FULL_FROM_MMOL;
    const kidney = glucose >= KIDNEY_FROM_MMOL ? KIDNEY_PER_MINUTE * (glucose - KIDNEY_FROM_MMOL) * glucoseVolumeL : 0;
    const made = x3 < 1 ? liver0 * (1 - x3) : 0;
    out[0] = -d1 / tG;
    out[1] = (d1 - d2) / tG;
    out[2] = insulin - s1 / tI;
    out[3] = (s1 - s2) / tI;
    out[4] = s2 / tI / insulinVolumeL - ke * plasma;
    out[5] = ka1 * (transportSensitivity * factor * plasma - x1);
    out[6] = ka2 * (disposalSensitivity * factor * plasma - x2);
    out[7] = ka3 * (liverSensitivity * factor * plasma - x3);
    out[8] = -brain - x1 * q1 + k12 * q2 - kidney + d2 / tG + made;
    out[9] = x1 * q1 - (k12 + x2) * q2;
    out[10] = kaint * (glucose - (state[10] ?? 0));
  };
}
