import { AppError } from "@/domain/errors";

/** Share of a dose that is still to act when its duration of action has passed. */
export const REMAINING_AT_DURATION_FRACTION = 0.05;

/** The x > 0 at which (1 + x)e^-x is 0.05, computed by bisection. */
const TIME_CONSTANTS_TO_REMAINING = 4.743864518390578;

function assertTimes(minutes: number, durationMinutes: number): void {
  if (!(Number.isFinite(minutes) && minutes >= 0)) throw new AppError("INVALID_RANGE", `${minutes} minutes after a dose`);
  if (!(Number.isFinite(durationMinutes) && durationMinutes > 0)) {
    throw new AppError("INVALID_RANGE", `a duration of ${durationMinutes} minutes`);
  }
}

/**
 * Share of a dose still to act after a number of minutes, for two compartments
 * one after the other: (1 + t/T)e^(-t/T).
 *
 * @param timeConstantMinutes T; 55 min in the published model
 * @see Hovorka 2004, Physiol Meas 25:905, t_max,I = 55 min (from memory; settings.md 1.8)
 */
export function twoCompartmentOnBoardFraction(minutes: number, timeConstantMinutes: number): number {
  assertTimes(minutes, timeConstantMinutes);
  const x = minutes / timeConstantMinutes;
  return (1 + x) * Math.exp(-x);
}

/**
 * Insulin on board as a share of the dose, the two-compartment form stretched so
 * that 5 % is left at the duration of action (settings.md 1.8).
 *
 * The duration of a bolus calculator, of the straight line below and of this form
 * are three different numbers and are never copied into each other without a note.
 *
 * @returns 1 at the dose, 0.05 at the duration, towards 0 afterwards
 * @throws {AppError} INVALID_RANGE for a negative time or a duration that is not above zero
 */
export function insulinOnBoardFraction(minutes: number, durationOfActionMinutes: number): number {
  return twoCompartmentOnBoardFraction(minutes, durationOfActionMinutes / TIME_CONSTANTS_TO_REMAINING);
}

/**
 * The straight line, as a plain reference: 1 at the dose, 0 at the duration.
 *
 * @throws {AppError} INVALID_RANGE for a negative time or a duration that is not above zero
 */
export function linearOnBoardFraction(minutes: number, durationOfActionMinutes: number): number {
  assertTimes(minutes, durationOfActionMinutes);
  return Math.max(0, 1 - minutes / durationOfActionMinutes);
}
