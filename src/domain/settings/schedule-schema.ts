import { z } from "zod";
import { MAX_BLOCKS } from "./profile-bounds";
import { MINUTES_PER_DAY, scheduleFault } from "./schedule";

export const startMinuteSchema = z
  .int()
  .min(0)
  .max(MINUTES_PER_DAY - 1);

/**
 * A list of blocks that is a schedule: at least one, the first at minute 0,
 * ascending, none twice, at most 48. The issue names the block at fault.
 */
export function scheduleSchema<B extends z.ZodType<{ startMinute: number }>>(block: B) {
  return z
    .array(block)
    .max(MAX_BLOCKS)
    .superRefine((blocks, context) => {
      const fault = scheduleFault(blocks);
      if (fault) context.addIssue({ code: "custom", path: [fault.index, "startMinute"], message: fault.text });
    });
}
