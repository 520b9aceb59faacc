import { MGDL_PER_MMOL, type GlucoseUnit } from "@/domain/units";
import type { DailyDose } from "./daily-dose";
import type { FormulaInputs } from "./formula";
import { fractionOf, over, times, type Fraction } from "./fraction";
import type { MethodInput } from "./method";
import { valueOfMethod } from "./methods";
import { roundToStep, weakerRounding } from "./rounding";

/**
 * Which published rule each step of the starting profile uses. The combination
 * is our own, of cited rules (settings.md 3.2, rules 4 to 8), and is labelled so.
 */
export const STARTING_RULES = {
  basal: "basal-0.40",
  otherBasal: "basal-0.50",
  carbRatio: "ratio-500",
  sensitivity: "sensitivity-1800",
  sensitivityHypoProne: "sensitivity-1960",
  duration: "duration-4-h",
  durationOlderOrRenal: "duration-5-h",
  /** Shown beside a carried-over pump dose only where lows are frequent (settings.md 1.2). */
  pumpWithLows: ["pump-0.95", "pump-0.90"],
} as const;

/** Published rules turn mg/dL into mmol/L with 18, not 18.0156 (settings.md 1.1, conversions). */
export const MGDL_PER_MMOL_OF_RULES = 18;

/** The smallest difference a starting value is written in, in the unit it is typed in. */
const STEPS = { gramsPerUnit: 1, mgDlPerUnit: 1, mmolPerUnit: 0.1 } as const;

export type ExactAndRounded = Readonly<{ exact: Fraction; rounded: Fraction }>;

/** Everything a rule may ask for, once a total daily dose is settled on. */
export function inputsAt(totalDailyDose: Fraction, dose: Pick<DailyDose, "inputs">): FormulaInputs<MethodInput> {
  const inputs = { ...dose.inputs, totalDailyDose };
  return {
    ...inputs,
    basalDailyDose: valueOfMethod(STARTING_RULES.basal, inputs),
    carbRatio: valueOfMethod(STARTING_RULES.carbRatio, inputs),
  };
}

/** Grams for one unit: 500 / TDD, up to a whole gram. */
export function startingCarbRatio(totalDailyDose: Fraction): ExactAndRounded {
  const exact = valueOfMethod(STARTING_RULES.carbRatio, { totalDailyDose });
  return { exact, rounded: roundToStep(exact, weakerRounding("carbRatio", fractionOf(STEPS.gramsPerUnit))) };
}

/**
 * Sensitivity for one unit: 1800 / TDD (1960 where lows are frequent), up to a
 * whole mg/dL; in mmol/L the rule divided by 18, up to a tenth.
 */
export function startingSensitivity(
  totalDailyDose: Fraction,
  { hypoProne, glucoseUnit }: { hypoProne: boolean; glucoseUnit: GlucoseUnit },
): ExactAndRounded {
  const rule = hypoProne ? STARTING_RULES.sensitivityHypoProne : STARTING_RULES.sensitivity;
  const mgDl = valueOfMethod(rule, { totalDailyDose });
  const isMgDl = glucoseUnit === "mg/dL";
  const exact = isMgDl ? mgDl : over(mgDl, fractionOf(MGDL_PER_MMOL_OF_RULES));
  const step = fractionOf(isMgDl ? STEPS.mgDlPerUnit : STEPS.mmolPerUnit);
  return { exact, rounded: roundToStep(exact, weakerRounding("sensitivity", step)) };
}

/** A sensitivity in the given unit as a stored number of millionths of a mg/dL, exact. */
export function microMgDl(sensitivity: Fraction, glucoseUnit: GlucoseUnit): Fraction {
  const mgDl = glucoseUnit === "mg/dL" ? sensitivity : times(sensitivity, fractionOf(MGDL_PER_MMOL));
  return times(mgDl, fractionOf(1_000_000));
}
