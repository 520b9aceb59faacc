import { readGlucose } from "./value";
import { readTime } from "./timestamp";

export type ColumnGuess = Readonly<{
  headerRow: number;
  columns: string[];
  timeColumn: number;
  /** A separate column of dates, where time is a column of its own. */
  dateColumn: number | null;
  glucoseColumn: number;
  subjectColumn: number | null;
}>;

const TIME_WORDS = /time|date|zeit|datum|heure|hora|fecha|tid|dato|aika|pvm|timestamp/i;
const GLUCOSE_WORDS = /gluc|gluk|^gl$|bg\b|sgv|sensor value|blood sugar|zucker|socker|sukker|verensokeri/i;
const SUBJECT_WORDS = /^(id|subject|person|patient|participant|name)$/i;

const isTime = (field: string) => readTime(field, "day-first") !== null || readTime(field, "month-first") !== null;
const isDateOnly = (field: string) => /^(\d{4}-\d{1,2}-\d{1,2}|\d{1,2}[./-]\d{1,2}[./-]\d{2,4})$/.test(field.trim());
const isClockOnly = (field: string) => /^\d{1,2}[:.]\d{2}([:.]\d{2})?(\s*[AP]M)?$/i.test(field.trim());
const isGlucose = (field: string) => typeof readGlucose(field, "mg/dL") !== "string" || typeof readGlucose(field, "mmol/L") !== "string";

/** Share of rows in which a column passes. */
function share(rows: ReadonlyArray<string[]>, column: number, test: (field: string) => boolean): number {
  return rows.filter((row) => test(row[column] ?? "")).length / Math.max(1, rows.length);
}

/**
 * Which line is the header and which columns hold time and glucose. Words of
 * the header count together with what stands below; preamble lines above the
 * header are passed over.
 *
 * @returns null when no pair of columns looks like time and glucose
 */
export function guessColumns(rows: ReadonlyArray<string[]>): ColumnGuess | null {
  const width = modeOf(rows.map((row) => row.length));
  const first = rows.findIndex((row) => row.length === width && row.some((f) => isTime(f) || isDateOnly(f)) && row.some(isGlucose));
  if (first === -1) return null;
  const above = rows[first - 1];
  const headerRow = above && above.length === width ? first - 1 : -1;
  const columns = Array.from({ length: width }, (_, i) => (headerRow >= 0 ? (above?.[i] ?? "").trim() : "") || `Column ${i + 1}`);
  const data = rows.slice(first);
  const scored = (words: RegExp, test: (field: string) => boolean) =>
    columns.map((name, column) => ({ column, score: share(data, column, test) + (headerRow >= 0 && words.test(name) ? 0.6 : 0) })).toSorted((a, b) => b.score - a.score);
  const [time] = scored(TIME_WORDS, isTime);
  const dateColumn = columns.findIndex((_, column) => share(data, column, isDateOnly) > 0.6);
  const clockColumn = columns.findIndex((_, column) => share(data, column, isClockOnly) > 0.6);
  const isSplit = dateColumn !== -1 && clockColumn !== -1 && clockColumn !== dateColumn;
  const timeColumn = isSplit ? clockColumn : (time?.column ?? 0);
  const taken = new Set([timeColumn, isSplit ? dateColumn : -1]);
  const glucose = scored(GLUCOSE_WORDS, isGlucose).find(({ column, score }) => !taken.has(column) && score > 0.5);
  if (!glucose || (!isSplit && (time?.score ?? 0) < 0.5)) return null;
  const subjectColumn = columns.findIndex((name, column) => headerRow >= 0 && SUBJECT_WORDS.test(name) && !taken.has(column) && column !== glucose.column);
  return { headerRow, columns, timeColumn, dateColumn: isSplit ? dateColumn : null, glucoseColumn: glucose.column, subjectColumn: subjectColumn === -1 ? null : subjectColumn };
}

function modeOf(numbers: ReadonlyArray<number>): number {
  const counts = new Map<number, number>();
  for (const n of numbers) counts.set(n, (counts.get(n) ?? 0) + 1);
  return [...counts].toSorted((a, b) => b[1] - a[1])[0]?.[0] ?? 1;
}
