import { guessColumns, type ColumnGuess } from "./columns";
import { guessDelimiter, previewRows, type Delimiter } from "./dialect";
import { guessEncoding, isBinary, type Encoding } from "./encoding";
import { guessDateOrder, readTime, type DateOrder } from "./timestamp";
import { guessUnit, type UnitGuess } from "./unit-evidence";
import { readGlucose } from "./value";

/** How a file would be read: guesses to be shown, each of which can be changed before anything is stored. */
export type CsvPreview = ColumnGuess &
  Readonly<{
    encoding: Encoding;
    delimiter: Delimiter;
    dateOrder: DateOrder | "ask";
    /** Times carry an offset: no zone is needed. */
    hasOffset: boolean;
    subjects: string[];
    sampleRows: string[][];
  }> &
  UnitGuess;

/**
 * Look at the beginning of a delimited text file.
 *
 * @param bytes the first part of the file, some hundred kB at most
 * @returns a sentence instead when it is no such file
 */
export function previewCsv(bytes: Uint8Array): CsvPreview | string {
  if (bytes.length === 0) return "The file is empty.";
  if (isBinary(bytes)) return "This is a picture, document or archive, not a text file. Choose a file with a time and a glucose column.";
  const encoding = guessEncoding(bytes);
  const text = new TextDecoder(encoding).decode(bytes, { stream: true });
  const whole = text.includes("\n") && text.length > 4000 ? text.slice(0, text.lastIndexOf("\n")) : text;
  const delimiter = guessDelimiter(whole);
  const rows = previewRows(whole, delimiter);
  const columns = guessColumns(rows);
  if (!columns) return "No column of times with a column of glucose values beside it was found in this file.";
  const data = rows.slice(columns.headerRow + 1).filter((row) => row.length === columns.columns.length);
  const times = data.map((row) => timeField(row, columns));
  const values = data.flatMap((row) => {
    const field = row[columns.glucoseColumn] ?? "";
    const read = [readGlucose(field, "mg/dL"), readGlucose(field, "mmol/L")].find((v) => typeof v !== "string");
    return read && typeof read !== "string" && read.bound === null ? [read.value] : [];
  });
  const { subjectColumn } = columns;
  const subjects = subjectColumn === null ? [] : subjectsOf(whole, delimiter, subjectColumn, columns.headerRow);
  return {
    ...columns,
    ...guessUnit(columns.headerRow >= 0 ? (columns.columns[columns.glucoseColumn] ?? "") : "", values),
    encoding, delimiter, subjects,
    dateOrder: guessDateOrder(times),
    hasOffset: times.length > 0 && times.every((t) => readTime(t, "day-first")?.kind !== "local"),
    sampleRows: data.slice(0, 6),
  };
}

/** The time of a row, its date put before it where that is a column of its own. */
export function timeField(row: ReadonlyArray<string>, at: { timeColumn: number; dateColumn: number | null }): string {
  const time = row[at.timeColumn] ?? "";
  return at.dateColumn === null ? time : `${(row[at.dateColumn] ?? "").trim()} ${time.trim()}`;
}

const SUBJECTS_SHOWN = 50;

function subjectsOf(text: string, delimiter: Delimiter, column: number, headerRow: number): string[] {
  const found = new Set<string>();
  for (const line of text.split(/\r?\n/).slice(headerRow + 1)) {
    const field = line.split(delimiter)[column]?.trim().replace(/^"|"$/g, "");
    if (field) found.add(field);
    if (found.size >= SUBJECTS_SHOWN) break;
  }
  return [...found];
}
