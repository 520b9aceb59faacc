const MINUTE_MS = 60_000;
const QUARTER_MS = 15 * MINUTE_MS;
const DAY_MIN = 1440;

const formats = new Map<string, Intl.DateTimeFormat>();
const offsets = new Map<string, Map<number, number>>();

/** Minutes that a zone's clock is ahead of UTC at an instant; kept per quarter hour, in which no zone changes. */
export function offsetMinutes(epochMs: number, zone: string): number {
  const quarter = Math.floor(epochMs / QUARTER_MS);
  let known = offsets.get(zone);
  if (!known) offsets.set(zone, (known = new Map<number, number>()));
  let offset = known.get(quarter);
  if (offset === undefined) {
    offset = readOffset(quarter * QUARTER_MS, zone);
    known.set(quarter, offset);
  }
  return offset;
}

function readOffset(epochMs: number, zone: string): number {
  let format = formats.get(zone);
  if (!format) {
    format = new Intl.DateTimeFormat("en-US", {
      timeZone: zone, hourCycle: "h23", year: "numeric", month: "numeric", day: "numeric", hour: "numeric", minute: "numeric",
    });
    formats.set(zone, format);
  }
  const part: Record<string, number> = {};
  for (const { type, value } of format.formatToParts(epochMs)) part[type] = Number(value);
  const wall = Date.UTC(part.year ?? 0, (part.month ?? 1) - 1, part.day ?? 1, part.hour ?? 0, part.minute ?? 0);
  return Math.round((wall - epochMs) / MINUTE_MS);
}

/**
 * The civil day and the minute of it that a zone's clocks show at an instant.
 *
 * @returns dayNumber counts days since 1970-01-01; minuteOfDay is 0 to 1439
 */
export function civilOf(epochMs: number, zone: string): { dayNumber: number; minuteOfDay: number } {
  const minutes = Math.floor(epochMs / MINUTE_MS) + offsetMinutes(epochMs, zone);
  const dayNumber = Math.floor(minutes / DAY_MIN);
  return { dayNumber, minuteOfDay: minutes - dayNumber * DAY_MIN };
}

/** The instant at which a civil day begins, epoch milliseconds, found from the offsets around it. */
function dayBegins(dayNumber: number, zone: string): number {
  const wall = dayNumber * DAY_MIN * MINUTE_MS;
  const guess = wall - offsetMinutes(wall, zone) * MINUTE_MS;
  return wall - offsetMinutes(guess, zone) * MINUTE_MS;
}

/** Real minutes of a civil day (1380, 1440, 1500, or off by half an hour) and of its 00:00-06:00. */
export function minutesInCivilDay(dayNumber: number, zone: string): { day: number; night: number } {
  const begins = dayBegins(dayNumber, zone);
  const nextBegins = dayBegins(dayNumber + 1, zone);
  const sixOClock = (dayNumber * DAY_MIN + 360) * MINUTE_MS;
  const six = sixOClock - offsetMinutes(sixOClock - offsetMinutes(sixOClock, zone) * MINUTE_MS, zone) * MINUTE_MS;
  return { day: (nextBegins - begins) / MINUTE_MS, night: (six - begins) / MINUTE_MS };
}
