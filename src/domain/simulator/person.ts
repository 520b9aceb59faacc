import { NOMINAL_PARAMETERS, type ModelParameters } from "./parameters";
import type { RandomSource } from "./random";
import { lognormalDraw, normalDraw } from "./random-draws";

const WEIGHT_KG = { mean: 75, sd: 10, lowest: 50, highest: 105 } as const;

/** How sensitive people are to insulin, against the published mean person: median and spread of the logarithm. */
const COMMON_SENSITIVITY = { median: 0.62, logSd: 0.22 } as const;

/** Spread of the natural logarithm of what differs from person to person besides. */
const LOG_SD = {
  ownSensitivity: 0.15, return: 0.15, activation: 0.2, glucoseVolume: 0.1,
  mealPeak: 0.2, insulinPeak: 0.15, liver: 0.1, brain: 0.08,
} as const;

/**
 * One invented person of the population on which the comparison is tried out
 * (comparison.md 5.1; ours, not published). Always takes the same number of draws.
 */
export function drawPerson(random: RandomSource): ModelParameters {
  const weight = normalDraw(random, WEIGHT_KG.mean, WEIGHT_KG.sd);
  const common = lognormalDraw(random, COMMON_SENSITIVITY.median, COMMON_SENSITIVITY.logSd);
  const about = (nominal: number, logSd: number) => lognormalDraw(random, nominal, logSd);
  const N = NOMINAL_PARAMETERS;
  return {
    ...N,
    bodyWeightKg: Math.min(WEIGHT_KG.highest, Math.max(WEIGHT_KG.lowest, weight)),
    transportSensitivity: about(common * N.transportSensitivity, LOG_SD.ownSensitivity),
    disposalSensitivity: about(common * N.disposalSensitivity, LOG_SD.ownSensitivity),
    liverSensitivity: about(common * N.liverSensitivity, LOG_SD.ownSensitivity),
    returnPerMinute: about(N.returnPerMinute, LOG_SD.return),
    transportActivationPerMinute: about(N.transportActivationPerMinute, LOG_SD.activation),
    disposalActivationPerMinute: about(N.disposalActivationPerMinute, LOG_SD.activation),
    liverActivationPerMinute: about(N.liverActivationPerMinute, LOG_SD.activation),
    glucoseVolumeLPerKg: about(N.glucoseVolumeLPerKg, LOG_SD.glucoseVolume),
    mealPeakMinutes: about(N.mealPeakMinutes, LOG_SD.mealPeak),
    insulinPeakMinutes: about(N.insulinPeakMinutes, LOG_SD.insulinPeak),
    liverMmolPerKgMinute: about(N.liverMmolPerKgMinute, LOG_SD.liver),
    brainMmolPerKgMinute: about(N.brainMmolPerKgMinute, LOG_SD.brain),
  };
}
