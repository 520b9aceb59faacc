import { Temporal } from "@js-temporal/polyfill";

/** The moment of a week at which a reader's digest falls due. */
export type DigestSlot = Readonly<{
  /** ISO 8601 week of the reader's own calendar, such as "2026-W11": one digest each. */
  isoWeek: string;
  atMs: number;
  /** The civil day it falls on, as ISO date; the digest tells of the seven days before. */
  on: string;
}>;

/** A digest that is later than this is left out; the next one is near. */
export const CATCH_UP_HOURS = 72;

/**
 * The latest slot that lies at or before `nowMs` on the reader's own clock.
 *
 * A wall time that a clock change skips counts from the moment after it; one
 * that comes twice counts the first time.
 *
 * @param zone        IANA name
 * @param weekday     1 Monday … 7 Sunday
 * @param minuteOfDay minutes after midnight
 */
export function latestSlot(nowMs: number, zone: string, { weekday, minuteOfDay }: { weekday: number; minuteOfDay: number }): DigestSlot {
  const today = Temporal.Instant.fromEpochMilliseconds(nowMs).toZonedDateTimeISO(zone).toPlainDate();
  const thisWeek = today.add({ days: weekday - today.dayOfWeek });
  const slot = slotOn(thisWeek, zone, minuteOfDay);
  return slot.atMs <= nowMs ? slot : slotOn(thisWeek.subtract({ days: 7 }), zone, minuteOfDay);
}

function slotOn(date: Temporal.PlainDate, zone: string, minuteOfDay: number): DigestSlot {
  const wall = date.toPlainDateTime().add({ minutes: minuteOfDay });
  const week = String(date.weekOfYear).padStart(2, "0");
  return {
    isoWeek: `${date.yearOfWeek}-W${week}`,
    atMs: wall.toZonedDateTime(zone, { disambiguation: "compatible" }).epochMilliseconds,
    on: date.toString(),
  };
}

/**
 * Whether a slot is to be served now: not served yet, not too long ago, and not
 * from before the reader came or chose.
 *
 * @param lastIsoWeek the latest week that has its digest, or null
 * @param sinceMs     when the reader's first grant began or the choice was made, whichever is later
 */
export function isSlotDue(slot: DigestSlot, nowMs: number, lastIsoWeek: string | null, sinceMs: number): boolean {
  const isOpen = lastIsoWeek === null || lastIsoWeek < slot.isoWeek;
  return isOpen && slot.atMs > sinceMs && nowMs - slot.atMs <= CATCH_UP_HOURS * 3_600_000;
}
