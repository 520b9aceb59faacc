import type { DailyDose } from "./daily-dose";
import { compare, fractionOf, minus, over, plus, times, type Fraction } from "./fraction";

/**
 * The spans outside of which no preset is shown (settings.md 3.2, rules 2 and 3).
 * 20 to 100 U: formula data are poor under 20 (Walsh, read) and rules were stated
 * for 20 to 100 (read). 0.70 is the deepest published cut from injections that was
 * read; below it lies a ketone risk. The 30 % and 0.3 to 1.0 U/kg are our own.
 */
export const GATE_DOSE_LIMITS = {
  dailyDoseUnits: { low: 20, high: 100 },
  dailyDoseUnitsPerKg: { low: 0.3, high: 1 },
  differenceOfMean: 0.3,
  weightShareOfInjections: 0.7,
} as const;

export type GateDoseCode =
  | "totalDailyDoseOutOfRange"
  | "dosePerKgOutOfRange"
  | "estimatesFarApart"
  | "weightEstimateTooLow";

const TEXTS: Record<GateDoseCode, string> = {
  totalDailyDoseOutOfRange: "The total daily dose lies outside the span the published formulas were made for.",
  dosePerKgOutOfRange: "The total daily dose is unusual for the body weight that was typed.",
  estimatesFarApart: "The estimate from the doses and the estimate from body weight lie far apart.",
  weightEstimateTooLow: "The estimate from body weight is lower than any published step down from injections.",
};

function isOutside(value: Fraction, { low, high }: { low: number; high: number }): boolean {
  return compare(value, fractionOf(low)) < 0 || compare(value, fractionOf(high)) > 0;
}

/**
 * The reasons in the typed numbers that route a person to their educator.
 *
 * The sources do not say which dose the spans are for, so the dose as typed and
 * both presets must lie inside; on the border is inside. The two comparisons of
 * estimates apply to injections only: a pump's dose is carried over, not cut.
 */
export function gateDoseReasons(dose: DailyDose): { code: GateDoseCode; text: string }[] {
  const { present, fromPresent, fromWeight, cautious, standard, weightKg } = dose;
  const doses = [present, cautious, standard];
  const mean = over(plus(fromPresent, fromWeight), fractionOf(2));
  const [smallerOne, largerOne] =
    compare(fromPresent, fromWeight) < 0 ? [fromPresent, fromWeight] : [fromWeight, fromPresent];
  const allowedDifference = times(fractionOf(GATE_DOSE_LIMITS.differenceOfMean), mean);
  const weightFloor = times(fractionOf(GATE_DOSE_LIMITS.weightShareOfInjections), present);
  const isFromInjections = dose.route === "injections";

  const fires: Record<GateDoseCode, boolean> = {
    totalDailyDoseOutOfRange: doses.some((units) => isOutside(units, GATE_DOSE_LIMITS.dailyDoseUnits)),
    dosePerKgOutOfRange: doses.some((units) => isOutside(over(units, weightKg), GATE_DOSE_LIMITS.dailyDoseUnitsPerKg)),
    estimatesFarApart: isFromInjections && compare(minus(largerOne, smallerOne), allowedDifference) > 0,
    weightEstimateTooLow: isFromInjections && compare(fromWeight, weightFloor) < 0,
  };
  return (Object.keys(TEXTS) as GateDoseCode[])
    .filter((code) => fires[code])
    .map((code) => ({ code, text: TEXTS[code] }));
}
