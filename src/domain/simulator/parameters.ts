/**
 * The numbers of the glucose model for one person. Amounts "per kg" are multiplied
 * by the body weight inside the model.
 *
 * @see Hovorka R et al., "Nonlinear model predictive control of glucose concentration
 *   in subjects with type 1 diabetes", Physiol Meas 2004;25:905-920. The paper was not
 *   read; equations and values agree with two public re-implementations that cite its
 *   equations 1-7 and tables 1-2.
 */
export type ModelParameters = Readonly<{
  bodyWeightKg: number;
  /** k12: glucose coming back from the tissues. */
  returnPerMinute: number;
  /** ka1, ka2, ka3: how fast insulin begins to act on transport, disposal and the liver. */
  transportActivationPerMinute: number;
  disposalActivationPerMinute: number;
  liverActivationPerMinute: number;
  /** SIT and SID, 1/min per mU/L; SIE per mU/L. */
  transportSensitivity: number;
  disposalSensitivity: number;
  liverSensitivity: number;
  /** ke: insulin leaving the blood. */
  eliminationPerMinute: number;
  /** VI and VG: volumes in which insulin and glucose are spread. */
  insulinVolumeLPerKg: number;
  glucoseVolumeLPerKg: number;
  /** AG: share of eaten carbohydrate that reaches the blood. */
  absorbedFraction: number;
  /** tmaxG and tmaxI: time of the fastest absorption of a meal and of injected insulin. */
  mealPeakMinutes: number;
  insulinPeakMinutes: number;
  /** EGP0: what the liver makes at no insulin; F01: what the brain uses. */
  liverMmolPerKgMinute: number;
  brainMmolPerKgMinute: number;
  /** kaint: how fast glucose at the sensor follows the blood. */
  sensorPerMinute: number;
}>;

/** Molar mass of glucose as the reference data have it, g/mol. */
export const GLUCOSE_GRAMS_PER_MOL = 180.16;

/**
 * The published mean values, for a person of 70 kg. They describe someone very
 * sensitive to insulin: a steady basal of 0.386 U/h at 6 mmol/L.
 * `sensorPerMinute` was read in one re-implementation; Wilinska 2010 from memory.
 */
export const NOMINAL_PARAMETERS: ModelParameters = {
  bodyWeightKg: 70,
  returnPerMinute: 0.066,
  transportActivationPerMinute: 0.006,
  disposalActivationPerMinute: 0.06,
  liverActivationPerMinute: 0.03,
  transportSensitivity: 51.2e-4,
  disposalSensitivity: 8.2e-4,
  liverSensitivity: 520e-4,
  eliminationPerMinute: 0.138,
  insulinVolumeLPerKg: 0.12,
  glucoseVolumeLPerKg: 0.16,
  absorbedFraction: 0.8,
  mealPeakMinutes: 40,
  insulinPeakMinutes: 55,
  liverMmolPerKgMinute: 0.0161,
  brainMmolPerKgMinute: 0.0097,
  sensorPerMinute: 0.073,
};
