import { dayStart } from "@/domain/day-start";
import { AppError } from "@/domain/errors";

/**
 * The instant at which a helper's last day is over, in the journal's zone.
 *
 * @param until the last day as ISO date, or null for a grant without end
 * @throws {AppError} INVALID_INPUT at `until` when that day is over already
 */
export function grantEnd(until: string | null, zone: string, now: Date): Date | null {
  if (until === null) return null;
  const end = dayStart(until, zone, 1);
  if (end <= now) throw new AppError("INVALID_INPUT", "the last day is over", { until: ["This day is over. Choose today or later."] });
  return end;
}
