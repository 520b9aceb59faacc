import { z } from "zod";
import { PROFILE_BOUNDS } from "./profile-bounds";
import { featuresSchema } from "./profile-features";
import { scheduleSchema, startMinuteSchema } from "./schedule-schema";

/** Far below a thousandth, far above the noise of a number that went through binary. */
const NOISE = 1e-6;

/** A decimal number to three places, within bounds given in thousandths. */
const toThousandths = ({ min, max }: { min: number; max: number }) =>
  z
    .number()
    .min(min / 1000)
    .max(max / 1000)
    .refine((value) => Math.abs(value * 1000 - Math.round(value * 1000)) < NOISE, "at most three decimal places");

const { microMgDlPerUnit, targetMgDl, durationOfActionMinutes } = PROFILE_BOUNDS;
const limit = (bounds: { min: number; max: number }) => toThousandths(bounds).nullable().default(null);

/** A profile as the HTTP interface carries it: U/h, g/U, mg/dL per U. */
export const apiProfileSchema = z.object({
  basal: scheduleSchema(
    z.object({ startMinute: startMinuteSchema, unitsPerHour: toThousandths(PROFILE_BOUNDS.milliUnitsPerHour) }),
  ),
  carbRatio: scheduleSchema(
    z.object({ startMinute: startMinuteSchema, gramsPerUnit: toThousandths(PROFILE_BOUNDS.milligramsPerUnit) }),
  ),
  sensitivity: scheduleSchema(
    z.object({
      startMinute: startMinuteSchema,
      mgDlPerUnit: z
        .number()
        .min(microMgDlPerUnit.min / 1e6)
        .max(microMgDlPerUnit.max / 1e6),
    }),
  ),
  target: scheduleSchema(
    z
      .object({
        startMinute: startMinuteSchema,
        lowMgDl: z.int().min(targetMgDl.min).max(targetMgDl.max),
        highMgDl: z.int().min(targetMgDl.min).max(targetMgDl.max),
      })
      .refine(({ lowMgDl, highMgDl }) => lowMgDl <= highMgDl, { path: ["highMgDl"], message: "below lowMgDl" }),
  ),
  durationOfActionMinutes: z.int().min(durationOfActionMinutes.min).max(durationOfActionMinutes.max),
  limits: z
    .object({
      maxBasalUnitsPerHour: limit(PROFILE_BOUNDS.milliUnitsPerHour),
      maxBolusUnits: limit(PROFILE_BOUNDS.bolusMilliUnits),
      maxInsulinOnBoardUnits: limit(PROFILE_BOUNDS.insulinOnBoardMilliUnits),
    })
    .prefault({}),
  features: featuresSchema.default([]),
});

export type ApiProfile = z.infer<typeof apiProfileSchema>;
