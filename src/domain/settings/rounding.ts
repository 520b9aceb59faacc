import { AppError } from "@/domain/errors";
import { FAMILY_FACTS, type SettingFamily } from "./family";
import { compare, fraction, fractionOf, over, times, type Fraction } from "./fraction";

export type RoundingDirection = "down" | "up" | "nearest";

/** A rounding is always named: which way, to multiples of which step. */
export type Rounding = Readonly<{ direction: RoundingDirection; step: Fraction }>;

/** The largest integer that is not above the value. */
function floor({ numerator, denominator }: Fraction): bigint {
  const quotient = numerator / denominator;
  return numerator % denominator < 0n ? quotient - 1n : quotient;
}

/**
 * Round to a whole number of steps, exactly. A value that already lies on a
 * step is never moved. "nearest" sends a half up.
 *
 * @throws {AppError} INVALID_RANGE unless the step is above zero
 */
export function roundToStep(value: Fraction, { direction, step }: Rounding): Fraction {
  if (compare(step, fractionOf(0)) <= 0) throw new AppError("INVALID_RANGE", "a rounding step must be above zero");
  const steps = over(value, step);
  const below = floor(steps);
  const isOnStep = steps.denominator === 1n;
  const isUpperHalf = compare(steps, fraction(2n * below + 1n, 2n)) >= 0;
  const goesUp = !isOnStep && (direction === "up" || (direction === "nearest" && isUpperHalf));
  return times(fraction(goesUp ? below + 1n : below, 1n), step);
}

/**
 * The product's own rounding: only ever to the side of less insulin. Basal and
 * limits go down; ratio, sensitivity, target and duration go up (settings.md 3.2).
 *
 * @throws {AppError} INVALID_INPUT for a family that has no weaker side
 */
export function weakerRounding(family: SettingFamily, step: Fraction): Rounding {
  const { strongerWhen } = FAMILY_FACTS[family];
  if (strongerWhen === "unknown") throw new AppError("INVALID_INPUT", `${family} has no weaker side`);
  return { direction: strongerWhen === "higher" ? "down" : "up", step };
}

/**
 * The rounding a published page used for its own printed figure. Sources differ,
 * some towards more insulin, so this serves to check a worked example against
 * its page and nothing else (settings.md 2).
 */
export function publishedRounding(direction: RoundingDirection, step: number): Rounding {
  return { direction, step: fractionOf(step) };
}
