import { AppError } from "@/domain/errors";
import { fixedLossMmolPerMinute, STATE, STATE_SIZE } from "./model";
import type { ModelParameters } from "./parameters";

/** A state in which nothing moves, and the insulin that keeps it so. */
export type SteadyState = Readonly<{ basalUnitsPerHour: number; state: Float64Array }>;

/** Glucose gained (above 0) or lost by the blood, mmol/min, once everything has settled at this insulin. */
function balance(parameters: ModelParameters, glucoseMmol: number, plasmaMilliUnitsPerL: number): number {
  const { bodyWeightKg, glucoseVolumeLPerKg, returnPerMinute } = parameters;
  const bloodMmol = glucoseMmol * glucoseVolumeLPerKg * bodyWeightKg;
  const transport = parameters.transportSensitivity * plasmaMilliUnitsPerL;
  const disposal = parameters.disposalSensitivity * plasmaMilliUnitsPerL;
  const liver = parameters.liverSensitivity * plasmaMilliUnitsPerL;
  const made = parameters.liverMmolPerKgMinute * bodyWeightKg * Math.max(0, 1 - liver);
  const burnt = (transport * bloodMmol * disposal) / (returnPerMinute + disposal);
  return made - burnt - fixedLossMmolPerMinute(parameters, glucoseMmol);
}

/**
 * The infusion at which a fasting person's glucose stays where it is, found by
 * halving an interval (the balance only falls as insulin grows).
 *
 * @param glucoseMmol above 0
 * @throws {AppError} INVALID_RANGE where no infusion does it: too high to be held even without insulin
 */
export function steadyStateAt(parameters: ModelParameters, glucoseMmol: number): SteadyState {
  if (!(glucoseMmol > 0) || balance(parameters, glucoseMmol, 0) < 0) {
    throw new AppError("INVALID_RANGE", `no steady state at ${glucoseMmol} mmol/L`);
  }
  let low = 0;
  let high = 1;
  while (balance(parameters, glucoseMmol, high) > 0) high *= 2;
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (balance(parameters, glucoseMmol, middle) > 0) low = middle;
    else high = middle;
  }
  const plasma = (low + high) / 2;
  const insulinVolumeL = parameters.insulinVolumeLPerKg * parameters.bodyWeightKg;
  const milliUnitsPerMinute = plasma * parameters.eliminationPerMinute * insulinVolumeL;
  const state = new Float64Array(STATE_SIZE);
  state[STATE.depot1] = milliUnitsPerMinute * parameters.insulinPeakMinutes;
  state[STATE.depot2] = milliUnitsPerMinute * parameters.insulinPeakMinutes;
  state[STATE.plasma] = plasma;
  state[STATE.transport] = parameters.transportSensitivity * plasma;
  state[STATE.disposal] = parameters.disposalSensitivity * plasma;
  state[STATE.liver] = parameters.liverSensitivity * plasma;
  const bloodMmol = glucoseMmol * parameters.glucoseVolumeLPerKg * parameters.bodyWeightKg;
  state[STATE.blood] = bloodMmol;
  state[STATE.tissue] =
    (parameters.transportSensitivity * plasma * bloodMmol) / (parameters.returnPerMinute + parameters.disposalSensitivity * plasma);
  state[STATE.sensor] = glucoseMmol;
  return { basalUnitsPerHour: (milliUnitsPerMinute * 60) / 1000, state };
}
