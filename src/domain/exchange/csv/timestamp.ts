/** A time as a file has it: an instant, or a wall-clock time that needs a zone. */
export type FileTime = Readonly<{ kind: "instant"; ms: number } | { kind: "local"; ms: number }>;

/** Order of day and month in slashed or dotted dates, decided for a whole column. */
export type DateOrder = "day-first" | "month-first";

const ISO = /^(\d{4})-(\d{1,2})-(\d{1,2})(?:[T ](\d{1,2}):(\d{2})(?::(\d{2})(?:[.,]\d+)?)?)?\s*(Z|[+-]\d{2}:?\d{2})?$/i;
const YEAR_FIRST = /^(\d{4})[/.](\d{1,2})[/.](\d{1,2})[ T,]+(\d{1,2}):(\d{2})(?::(\d{2}))?\s*([AP]\.?M\.?)?$/i;
const PARTED = /^(\d{1,2})[/.-](\d{1,2})[/.-](\d{2}|\d{4})[ T,]+(\d{1,2})[:.](\d{2})(?:[:.](\d{2}))?\s*([AP]\.?M\.?)?$/i;
/** Days from 1899-12-30 to 1970-01-01, as spreadsheets count. */
const SHEET_EPOCH_DAYS = 25_569;

/**
 * Read one time. Offsets make an instant; without one it is local, given as if
 * it were UTC.
 *
 * @returns null for what is no time, or no time of this calendar
 */
export function readTime(field: string, order: DateOrder): FileTime | null {
  const text = field.trim();
  const iso = ISO.exec(text);
  if (iso) {
    const [, y, mo, d, h = "0", mi = "0", s = "0", offset] = iso;
    const ms = utc(Number(y), Number(mo), Number(d), Number(h), Number(mi), Number(s));
    if (ms === null) return null;
    return offset === undefined ? { kind: "local", ms } : { kind: "instant", ms: ms - offsetMs(offset) };
  }
  const yearFirst = YEAR_FIRST.exec(text);
  if (yearFirst) {
    const [, y, mo, d, h, mi, s = "0", half] = yearFirst;
    return local(utc(Number(y), Number(mo), Number(d), hourOf(Number(h), half), Number(mi), Number(s)));
  }
  const parted = PARTED.exec(text);
  if (parted) {
    const [, a, b, year, h, mi, s = "0", half] = parted;
    const [day, month] = order === "day-first" ? [Number(a), Number(b)] : [Number(b), Number(a)];
    return local(utc(fullYear(Number(year)), month, day, hourOf(Number(h), half), Number(mi), Number(s)));
  }
  return readNumberTime(text);
}

function readNumberTime(text: string): FileTime | null {
  if (/^\d{13}$/.test(text)) return { kind: "instant", ms: Number(text) };
  if (/^\d{10}$/.test(text)) return { kind: "instant", ms: Number(text) * 1000 };
  if (!/^\d{5}([.,]\d+)?$/.test(text)) return null;
  const seconds = Math.round((Number(text.replace(",", ".")) - SHEET_EPOCH_DAYS) * 86_400);
  return { kind: "local", ms: seconds * 1000 };
}

const local = (ms: number | null): FileTime | null => (ms === null ? null : { kind: "local", ms });
const fullYear = (year: number) => (year < 100 ? 2000 + year : year);

function hourOf(hour: number, half: string | undefined): number {
  if (half === undefined) return hour;
  if (hour < 1 || hour > 12) return Number.NaN;
  return (hour % 12) + (/^p/i.test(half) ? 12 : 0);
}

function utc(year: number, month: number, day: number, hour: number, minute: number, second: number): number | null {
  const ms = Date.UTC(year, month - 1, day, hour, minute, second);
  const back = new Date(ms);
  const isReal = back.getUTCMonth() === month - 1 && back.getUTCDate() === day && hour < 24 && minute < 60 && second < 60;
  return isReal && year >= 1990 && year < 2100 ? ms : null;
}

function offsetMs(offset: string): number {
  if (/^z$/i.test(offset)) return 0;
  const [, sign, hours, minutes] = /^([+-])(\d{2}):?(\d{2})$/.exec(offset) ?? [];
  return (sign === "-" ? -1 : 1) * (Number(hours) * 60 + Number(minutes)) * 60_000;
}

/** Whether a column of slashed or dotted dates is day-first or month-first; "ask" when no value tells. */
export function guessDateOrder(fields: ReadonlyArray<string>): DateOrder | "ask" {
  let isDayFirst = false;
  let isMonthFirst = false;
  let isParted = false;
  for (const field of fields) {
    const [, a, b] = PARTED.exec(field.trim()) ?? [];
    if (a === undefined) continue;
    isParted = true;
    if (Number(a) > 12) isDayFirst = true;
    if (Number(b) > 12) isMonthFirst = true;
  }
  if (!isParted || isDayFirst) return "day-first";
  return isMonthFirst ? "month-first" : "ask";
}

