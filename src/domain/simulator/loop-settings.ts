import type { IdealSettings } from "./ideal-settings";
import type { RandomSource } from "./random";
import { normalDraw } from "./random-draws";
import { SLOTS_PER_DAY, slotOfMinute } from "./slots";

/** What is programmed, for every slot of a day: basal in U/h, mmol/L per U, g per U; and the aim in mmol/L. */
export type LoopSettings = Readonly<{
  basalUnitsPerHour: Float64Array;
  sensitivityMmolPerUnit: Float64Array;
  carbRatioGramsPerUnit: Float64Array;
  aimMmol: number;
}>;

/** The aim of the simulated loop unless a person's settings say otherwise, mmol/L. */
export const DEFAULT_AIM_MMOL = 6.1;

export const NIGHT_ENDS_SLOT = slotOfMinute(360);

/** Mean and spread of the logarithm of how far people's settings are from what would fit them. */
const ERRORS = {
  dayBasal: { mean: -0.03, sd: 0.1 },
  nightBasal: { mean: -0.05, sd: 0.15 },
  sensitivity: { mean: 0.1, sd: 0.15 },
  carbRatio: { mean: 0.22, sd: 0.22 },
} as const;

/**
 * Settings as a person might have them: the ideal ones times errors that stay with
 * the person, on the cautious side (comparison.md 5.1; ours).
 */
export function drawLoopSettings(random: RandomSource, ideal: IdealSettings): LoopSettings {
  const off = ({ mean, sd }: { mean: number; sd: number }) => Math.exp(normalDraw(random, mean, sd));
  const day = ideal.basalUnitsPerHour * off(ERRORS.dayBasal);
  const night = ideal.basalUnitsPerHour * off(ERRORS.nightBasal);
  return {
    basalUnitsPerHour: new Float64Array(SLOTS_PER_DAY).fill(day).fill(night, 0, NIGHT_ENDS_SLOT),
    sensitivityMmolPerUnit: new Float64Array(SLOTS_PER_DAY).fill(ideal.sensitivityMmolPerUnit * off(ERRORS.sensitivity)),
    carbRatioGramsPerUnit: new Float64Array(SLOTS_PER_DAY).fill(ideal.carbRatioGramsPerUnit * off(ERRORS.carbRatio)),
    aimMmol: DEFAULT_AIM_MMOL,
  };
}
