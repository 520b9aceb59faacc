import { z } from "zod";
import { PROFILE_BOUNDS } from "./profile-bounds";
import { featuresSchema } from "./profile-features";
import { scheduleSchema, startMinuteSchema } from "./schedule-schema";

const whole = ({ min, max }: { min: number; max: number }) => z.int().min(min).max(max);

const targetBlockSchema = z
  .object({
    startMinute: startMinuteSchema,
    lowMgDl: whole(PROFILE_BOUNDS.targetMgDl),
    highMgDl: whole(PROFILE_BOUNDS.targetMgDl),
  })
  .refine(({ lowMgDl, highMgDl }) => lowMgDl <= highMgDl, {
    path: ["highMgDl"],
    message: "the upper end of a target is not below the lower end",
  });

/**
 * A profile as it is stored: integers in the smallest unit that loses nothing.
 *
 * - basal in milli-units of insulin an hour
 * - carb ratio in milligrams of carbohydrate for one unit (12.5 g/U is 12500)
 * - sensitivity in millionths of a mg/dL for one unit. A hundredth of a mmol/L is
 *   0.180156 mg/dL, so values typed in either unit are whole numbers here, and
 *   showing a profile in the other unit never rewrites it
 * - target in whole mg/dL, finer than a tenth of a mmol/L (1.8 mg/dL)
 * - limits `null` where the person has set none
 */
export const settingsProfileSchema = z.object({
  basal: scheduleSchema(
    z.object({ startMinute: startMinuteSchema, milliUnitsPerHour: whole(PROFILE_BOUNDS.milliUnitsPerHour) }),
  ),
  carbRatio: scheduleSchema(
    z.object({ startMinute: startMinuteSchema, milligramsPerUnit: whole(PROFILE_BOUNDS.milligramsPerUnit) }),
  ),
  sensitivity: scheduleSchema(
    z.object({ startMinute: startMinuteSchema, microMgDlPerUnit: whole(PROFILE_BOUNDS.microMgDlPerUnit) }),
  ),
  target: scheduleSchema(targetBlockSchema),
  durationOfActionMinutes: whole(PROFILE_BOUNDS.durationOfActionMinutes),
  limits: z.object({
    maxBasalMilliUnitsPerHour: whole(PROFILE_BOUNDS.milliUnitsPerHour).nullable(),
    maxBolusMilliUnits: whole(PROFILE_BOUNDS.bolusMilliUnits).nullable(),
    maxInsulinOnBoardMilliUnits: whole(PROFILE_BOUNDS.insulinOnBoardMilliUnits).nullable(),
  }),
  features: featuresSchema,
});

export type SettingsProfile = z.infer<typeof settingsProfileSchema>;
export type BasalBlock = SettingsProfile["basal"][number];
export type CarbRatioBlock = SettingsProfile["carbRatio"][number];
export type SensitivityBlock = SettingsProfile["sensitivity"][number];
export type TargetBlock = SettingsProfile["target"][number];
