/** An instant as "14 May, 22:10" in a zone. */
export function dateTimeText(instant: Date, zone: string): string {
  const format = new Intl.DateTimeFormat("en-GB", { timeZone: zone, day: "numeric", month: "long", hour: "2-digit", minute: "2-digit", hourCycle: "h23" });
  return format.format(instant).replace(" at ", ", ");
}

/** An instant as "14 May" in a zone. */
export function dateText(instant: Date, zone: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone: zone, day: "numeric", month: "long" }).format(instant);
}

/** A civil date "2026-05-14" as "Thu 14 May". */
export function isoDayText(isoDay: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", weekday: "short", day: "numeric", month: "short" }).format(new Date(`${isoDay}T00:00:00Z`)).replace(",", "");
}

/** A count with its noun: "1 day", "3 days". */
export function counted(count: number, one: string, many = `${one}s`): string {
  return `${count} ${count === 1 ? one : many}`;
}

/** An ISO date as "23 September 2028", for what lies years ahead. */
export function isoDateText(isoDay: string): string {
  return new Intl.DateTimeFormat("en-GB", { timeZone: "UTC", day: "numeric", month: "long", year: "numeric" }).format(new Date(`${isoDay}T00:00:00Z`));
}
