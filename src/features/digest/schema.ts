import { z } from "zod";
import { DIGEST_LEVELS } from "@/domain/digest/basis";
import { tick, timeOfDay, wholeNumber } from "@/domain/form-text";

export const digestPreferenceInput = z.object({
  level: z.enum(DIGEST_LEVELS, { error: "Choose how much comes by mail." }),
  weekday: wholeNumber({ min: 1, max: 7, unit: "" }),
  minuteOfDay: timeOfDay,
  isToldOfComments: tick,
});
export type DigestPreferenceInput = z.input<typeof digestPreferenceInput>;

export const unsubscribeInput = z.object({ token: z.string().min(1).max(200) });
