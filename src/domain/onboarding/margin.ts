import { fractionOf, over, times, toNumber } from "@/domain/settings/fraction";
import { roundToStep, weakerRounding } from "@/domain/settings/rounding";
import type { GlucoseUnit } from "@/domain/units";

/** The plain arithmetic before any caution: the mean of the published doses, unrounded. */
export type PlainArithmetic = Readonly<{ unitsPerHour: number; gramsPerUnit: number; mgDlPerUnit: number }>;

/** What the plain arithmetic becomes with a margin, every number rounded to its weaker side. */
export type WithMargin = Readonly<{ marginPercent: number; unitsPerHour: number; unitsPerDay: number; gramsPerUnit: number; sensitivity: number }>;

/** Margins to look at; none of them is ours to choose. */
export const MARGINS_PERCENT = [0, 10, 20, 30] as const;

/** mg/dL for one mmol/L in published rules (settings.md 1.1, conversions). */
const MGDL_PER_MMOL_OF_RULES = 18;

/**
 * What if everything were so much weaker: a day of insulin less by the margin
 * means a basal rate times (1 - m), and a ratio and a factor divided by (1 - m).
 * That is the arithmetic of all rules that divide a constant by the daily dose
 * (settings.md 1.3, 1.5, 1.6), worked out here (computed, no source of its own).
 *
 * @param plain    unrounded, U/h, g/U and mg/dL for one U
 * @param steps    smallest basal step in U/h
 * @returns sensitivity in `unit`
 */
export function withMargin(plain: PlainArithmetic, marginPercent: number, steps: Readonly<{ basalUnits: number }>, unit: GlucoseUnit): WithMargin {
  const left = over(fractionOf(100 - marginPercent), fractionOf(100));
  const basal = roundToStep(times(fractionOf(plain.unitsPerHour), left), weakerRounding("basal", fractionOf(steps.basalUnits)));
  const ratio = roundToStep(over(fractionOf(plain.gramsPerUnit), left), weakerRounding("carbRatio", fractionOf(1)));
  const mgDl = over(fractionOf(plain.mgDlPerUnit), left);
  const isMgDl = unit === "mg/dL";
  const inUnit = isMgDl ? mgDl : over(mgDl, fractionOf(MGDL_PER_MMOL_OF_RULES));
  const sensitivity = roundToStep(inUnit, weakerRounding("sensitivity", fractionOf(isMgDl ? 1 : 0.1)));
  return {
    marginPercent,
    unitsPerHour: toNumber(basal),
    unitsPerDay: toNumber(times(basal, fractionOf(24))),
    gramsPerUnit: toNumber(ratio),
    sensitivity: toNumber(sensitivity),
  };
}
