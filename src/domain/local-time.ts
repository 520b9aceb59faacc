import { Temporal } from "@js-temporal/polyfill";
import { AppError } from "@/domain/errors";

/**
 * The instant of a wall-clock time typed in a zone, such as "2026-03-10T22:10".
 *
 * @throws {AppError} INVALID_INPUT on `field` for a time that the clock skips or shows twice
 */
export function instantOfLocal(local: string, zone: string, field: string): Date {
  try {
    const zoned = Temporal.PlainDateTime.from(local).toZonedDateTime(zone, { disambiguation: "reject" });
    return new Date(zoned.epochMilliseconds);
  } catch {
    throw new AppError("INVALID_INPUT", `${local} in ${zone}`, {
      [field]: ["The clock skips this time or shows it twice. Type a time an hour earlier or later."],
    });
  }
}

/** An instant as "2026-03-10T22:10" in a zone, for a date and time field. */
export function localOfInstant(instant: Date, zone: string): string {
  const zoned = Temporal.Instant.fromEpochMilliseconds(instant.getTime()).toZonedDateTimeISO(zone);
  return zoned.toPlainDateTime().toString({ smallestUnit: "minute" });
}
