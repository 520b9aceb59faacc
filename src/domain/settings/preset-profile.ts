import type { GlucoseUnit } from "@/domain/units";
import { FLAT_SHAPE, spreadDailyBasal } from "./basal-shape";
import { fractionOf, times, toNumber, type Fraction } from "./fraction";
import { valueOfMethod } from "./methods";
import type { SettingsProfile } from "./profile";
import { roundToStep, weakerRounding } from "./rounding";
import { microMgDl, STARTING_RULES, startingCarbRatio, startingSensitivity } from "./starting-rules";
import { startingTarget } from "./starting-target";

export type PresetOptions = Readonly<{
  hypoProne: boolean;
  isOlderOrRenal: boolean;
  insulinStepMilliUnits: number;
  glucoseUnit: GlucoseUnit;
  largestRecentBolusUnits: number | null;
  largestRecentBasalUnitsPerHour: number | null;
}>;

/** The largest recent dose as a limit in milli-units, down to the device's step. */
function cap(largestUnits: number | null, stepMilliUnits: number): number | null {
  if (largestUnits === null) return null;
  const milliUnits = times(fractionOf(largestUnits), fractionOf(1000));
  return toNumber(roundToStep(milliUnits, weakerRounding("limits", fractionOf(stepMilliUnits))));
}

/**
 * A starting profile for a total daily dose, every number rounded to its weaker
 * side: basal 0.40 of the dose, flat, down to the pump's step; ratio, sensitivity,
 * target and duration as in settings.md 3.2. Limits are the largest recent doses
 * (the idea: Burnside 2020 protocol, read), or none where they are not known.
 *
 * @param totalDailyDose in U a day, above zero
 */
export function presetProfile(totalDailyDose: Fraction, options: PresetOptions): SettingsProfile {
  const { glucoseUnit, insulinStepMilliUnits } = options;
  const basalDaily = valueOfMethod(STARTING_RULES.basal, { totalDailyDose });
  const gramsPerUnit = startingCarbRatio(totalDailyDose).rounded;
  const sensitivity = startingSensitivity(totalDailyDose, options).rounded;
  const duration = options.isOlderOrRenal ? STARTING_RULES.durationOlderOrRenal : STARTING_RULES.duration;
  return {
    basal: spreadDailyBasal(basalDaily, FLAT_SHAPE, insulinStepMilliUnits),
    carbRatio: [{ startMinute: 0, milligramsPerUnit: toNumber(times(gramsPerUnit, fractionOf(1000))) }],
    sensitivity: [{ startMinute: 0, microMgDlPerUnit: toNumber(microMgDl(sensitivity, glucoseUnit)) }],
    target: [{ startMinute: 0, ...startingTarget(glucoseUnit) }],
    durationOfActionMinutes: toNumber(valueOfMethod(duration, {})),
    limits: {
      maxBasalMilliUnitsPerHour: cap(options.largestRecentBasalUnitsPerHour, insulinStepMilliUnits),
      maxBolusMilliUnits: cap(options.largestRecentBolusUnits, insulinStepMilliUnits),
      maxInsulinOnBoardMilliUnits: null,
    },
    features: [],
  };
}
