import { NIGHT_ENDS_SLOT, type LoopSettings } from "./loop-settings";
import { slotOfMinute } from "./slots";

/** Factors on what is programmed; what is not named stays. A smaller ratio or sensitivity is a stronger setting. */
export type SettingFactors = Readonly<{
  nightBasal?: number;
  dayBasal?: number;
  sensitivity?: number;
  carbRatio?: number;
  /** The ratio from 05:00 to 10:00 only. */
  breakfastCarbRatio?: number;
}>;

const BREAKFAST = { fromSlot: slotOfMinute(300), toSlot: slotOfMinute(600) } as const;

/** The same settings with some of them multiplied; the first ones stay untouched. */
export function changedSettings(settings: LoopSettings, factors: SettingFactors): LoopSettings {
  const { nightBasal = 1, dayBasal = 1, sensitivity = 1, carbRatio = 1, breakfastCarbRatio = 1 } = factors;
  const isBreakfast = (slot: number) => slot >= BREAKFAST.fromSlot && slot < BREAKFAST.toSlot;
  return {
    ...settings,
    basalUnitsPerHour: settings.basalUnitsPerHour.map((rate, slot) => rate * (slot < NIGHT_ENDS_SLOT ? nightBasal : dayBasal)),
    sensitivityMmolPerUnit: settings.sensitivityMmolPerUnit.map((fall) => fall * sensitivity),
    carbRatioGramsPerUnit: settings.carbRatioGramsPerUnit.map((grams, slot) => grams * carbRatio * (isBreakfast(slot) ? breakfastCarbRatio : 1)),
  };
}
