import { SLOT_MINUTES } from "./slots";

/**
 * The simulated loop and the person beside it (comparison.md 5.1; ours, made for
 * trying out the comparison, not a way to treat anyone).
 */
export const LOOP = {
  /** Share of the need that is met, spread over the minutes. */
  usualGain: 0.35,
  spreadMinutes: 40,
  lookAheadMinutes: 30,
  slopeMinutes: 20,
  steepestMmolPerMinute: 0.15,
  /** Off below this glucose; never above this multiple of what is programmed. */
  offBelowMmol: 4.6,
  mostTimesProgrammed: 2.5,
} as const;

/** When a person corrects by hand, and when they eat against a low. */
export const PERSON = {
  correctsAboveMmol: 10.5,
  correctsFromMinute: 420,
  correctsUntilMinute: 1380,
  afterMealMinutes: 150,
  afterCorrectionMinutes: 180,
  everyMinutes: 30,
  eatsBelowMmol: 3.7,
  rescueGrams: 12,
} as const;

/**
 * Glucose expected in half an hour if the last twenty minutes go on.
 *
 * @param earlierMmol reading of 20 min before
 */
export function predictedMmol(nowMmol: number, earlierMmol: number): number {
  const slope = (nowMmol - earlierMmol) / LOOP.slopeMinutes;
  const limited = Math.min(LOOP.steepestMmolPerMinute, Math.max(-LOOP.steepestMmolPerMinute, slope));
  return nowMmol + LOOP.lookAheadMinutes * limited;
}

/**
 * Insulin missing to reach the aim, U; below zero where there is too much already.
 *
 * @param onBoardUnits below zero counts as none
 */
export function missingUnits(glucoseMmol: number, aimMmol: number, sensitivityMmolPerUnit: number, onBoardUnits: number): number {
  return (glucoseMmol - aimMmol) / sensitivityMmolPerUnit - Math.max(onBoardUnits, 0);
}

/** The rate the loop sets for the next five minutes, U/h. */
export function automaticRate(
  { nowMmol, earlierMmol, onBoardUnits }: { nowMmol: number; earlierMmol: number; onBoardUnits: number },
  { basalUnitsPerHour, sensitivityMmolPerUnit, aimMmol, gain }: { basalUnitsPerHour: number; sensitivityMmolPerUnit: number; aimMmol: number; gain: number },
): number {
  if (nowMmol < LOOP.offBelowMmol) return 0;
  const need = missingUnits(predictedMmol(nowMmol, earlierMmol), aimMmol, sensitivityMmolPerUnit, onBoardUnits);
  const rate = basalUnitsPerHour + (gain * need * 60) / LOOP.spreadMinutes;
  return Math.min(LOOP.mostTimesProgrammed * basalUnitsPerHour, Math.max(0, rate));
}

/**
 * A bolus for a meal with what is missing or too much at the time, U; never below 0.
 * Below the aim, insulin on board is left out.
 *
 * @param countedGrams 0 for a correction alone
 */
export function bolusUnits(
  countedGrams: number, glucoseMmol: number, onBoardUnits: number,
  { carbRatioGramsPerUnit, sensitivityMmolPerUnit, aimMmol }: { carbRatioGramsPerUnit: number; sensitivityMmolPerUnit: number; aimMmol: number },
): number {
  const heeded = glucoseMmol > aimMmol ? onBoardUnits : 0;
  return Math.max(0, countedGrams / carbRatioGramsPerUnit + missingUnits(glucoseMmol, aimMmol, sensitivityMmolPerUnit, heeded));
}

/** Whether a person corrects at a slot: awake, high, long after a meal and after the last correction. Slots count from the beginning of the run. */
export function wantsCorrection(slot: number, glucoseMmol: number, lastMealSlot: number, lastCorrectionSlot: number): boolean {
  const minute = (slot * SLOT_MINUTES) % 1440;
  return (
    glucoseMmol > PERSON.correctsAboveMmol &&
    minute % PERSON.everyMinutes === 0 &&
    minute >= PERSON.correctsFromMinute &&
    minute < PERSON.correctsUntilMinute &&
    (slot - lastMealSlot) * SLOT_MINUTES > PERSON.afterMealMinutes &&
    (slot - lastCorrectionSlot) * SLOT_MINUTES > PERSON.afterCorrectionMinutes
  );
}
