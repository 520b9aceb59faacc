import { Temporal } from "@js-temporal/polyfill";

/**
 * The instant at which a civil day begins in a zone: midnight, or where a clock
 * change skips midnight, the first moment there is.
 *
 * @param isoDate  such as "2026-03-29"
 * @param daysOn   whole civil days to go on from there, negative to go back
 */
export function dayStart(isoDate: string, zone: string, daysOn = 0): Date {
  const day = Temporal.PlainDate.from(isoDate).add({ days: daysOn });
  return new Date(day.toZonedDateTime(zone).epochMilliseconds);
}

/** The civil date so many days on, negative to go back. */
export function addDays(isoDate: string, days: number): string {
  return Temporal.PlainDate.from(isoDate).add({ days }).toString();
}

/** Days since 1970-01-01 of a civil date. */
export function dayNumberOf(isoDate: string): number {
  return Date.parse(`${isoDate}T00:00:00Z`) / 86_400_000;
}
