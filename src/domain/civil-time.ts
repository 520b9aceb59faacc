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
