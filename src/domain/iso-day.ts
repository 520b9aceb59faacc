import { Temporal } from "@js-temporal/polyfill";

/** The civil date of a day number. */
export function isoDayOfNumber(dayNumber: number): string {
  return new Date(dayNumber * 86_400_000).toISOString().slice(0, 10);
}

/** The civil date of an instant in a zone. */
export function isoDayOf(instant: Date, zone: string): string {
  return Temporal.Instant.fromEpochMilliseconds(instant.getTime()).toZonedDateTimeISO(zone).toPlainDate().toString();
}
