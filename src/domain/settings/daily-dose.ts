import { fractionOf, over, plus, smaller, times, type Fraction } from "./fraction";
import type { FormulaInputs } from "./formula";
import type { MethodInput } from "./method";
import { valueOfMethod } from "./methods";

/** 1 kg = 2.20462 lb (settings.md 1.1, conversions). */
const POUNDS_PER_KG = 2.20462;

/** What a person types about their insulin of today, in U a day. */
export type PresentDose =
  | Readonly<{ route: "injections"; dailyDoseUnits: number }>
  | Readonly<{ route: "pump"; dailyDoseUnits: number }>;

/** Estimates of the new setup's total daily dose, exact, in U a day. */
export type DailyDose = Readonly<{
  route: PresentDose["route"];
  weightKg: Fraction;
  /** As typed. */
  present: Fraction;
  /** TDD_a: from the present dose. */
  fromPresent: Fraction;
  /** TDD_b: from body weight. */
  fromWeight: Fraction;
  cautious: Fraction;
  standard: Fraction;
  inputs: FormulaInputs<MethodInput>;
}>;

/**
 * The total daily doses of the starting profile (settings.md 3.2, rule 2). From
 * injections: TDD_a is injections x 0.75, TDD_b is 0.5 U for each kg, cautious is
 * the smaller and standard the mean. From a pump: the dose as it is, twice, since
 * working settings are carried over.
 *
 * @param weightKg body weight, above zero
 */
export function estimateDailyDose(weightKg: number, present: PresentDose): DailyDose {
  const weight = fractionOf(weightKg);
  const dose = fractionOf(present.dailyDoseUnits);
  const isPump = present.route === "pump";
  const inputs: FormulaInputs<MethodInput> = {
    weightKg: weight,
    weightPounds: times(weight, fractionOf(POUNDS_PER_KG)),
    ...(isPump ? { pumpDailyDose: dose } : { injectionsDailyDose: dose }),
  };
  const fromPresent = valueOfMethod(isPump ? "pump-unchanged" : "injections-0.75", inputs);
  const fromWeight = valueOfMethod("weight-0.5", inputs);
  const mean = over(plus(fromPresent, fromWeight), fractionOf(2));
  return {
    route: present.route,
    weightKg: weight,
    present: dose,
    fromPresent,
    fromWeight,
    cautious: isPump ? dose : smaller(fromPresent, fromWeight),
    standard: isPump ? dose : mean,
    inputs,
  };
}
