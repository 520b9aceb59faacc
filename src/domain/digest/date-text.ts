import { isoDayOf } from "@/domain/iso-day";

const WORDS = new Intl.DateTimeFormat("en-GB", { weekday: "long", day: "numeric", month: "long", timeZone: "UTC" });

function parts(format: Intl.DateTimeFormat, atMs: number): Record<string, string> {
  return Object.fromEntries(format.formatToParts(atMs).map(({ type, value }) => [type, value]));
}

/** An ISO date in words, without its year: "2026-03-09" is "Monday 9 March". */
export function dateText(isoDate: string): string {
  const { weekday, day, month } = parts(WORDS, Date.parse(`${isoDate}T00:00:00Z`));
  return `${weekday} ${day} ${month}`;
}

/** The same with its year, for dates that may lie far away: "9 March 2027". */
export function longDateText(isoDate: string): string {
  const { day, month } = parts(WORDS, Date.parse(`${isoDate}T00:00:00Z`));
  return `${day} ${month} ${isoDate.slice(0, 4)}`;
}

/** An instant on the clock of a zone: "Monday 9 March, 08:05". */
export function momentText(at: Date, zone: string): string {
  const { hour, minute } = parts(
    new Intl.DateTimeFormat("en-GB", { hour: "2-digit", minute: "2-digit", hourCycle: "h23", timeZone: zone }),
    at.getTime(),
  );
  return `${dateText(isoDayOf(at, zone))}, ${hour}:${minute}`;
}
