import { readFileSync } from "node:fs";
import { parse } from "csv-parse/sync";
import { stringify } from "csv-stringify/sync";

/** The rows of a CSV file by column name, whatever the order of its columns; blank lines skipped. */
export function readRows(file: string): Record<string, string>[] {
  const rows: Record<string, string>[] = parse(readFileSync(file), { columns: true, bom: true, skip_empty_lines: true, trim: true });
  return rows;
}

/** @throws {Error} naming the column and its value when it is no number */
export function numberIn(row: Record<string, string>, column: string): number {
  const value = Number(row[column]);
  if (row[column] === undefined || row[column] === "" || !Number.isFinite(value)) {
    throw new Error(`column ${column}: "${row[column] ?? ""}" is not a number`);
  }
  return value;
}

export function optionalNumberIn(row: Record<string, string>, column: string): number | null {
  return row[column] === undefined || row[column] === "" ? null : numberIn(row, column);
}

/** Numbers to 12 significant digits, nothing for null. */
export function printRows(columns: ReadonlyArray<string>, rows: ReadonlyArray<Record<string, string | number | null>>): void {
  const cell = (value: string | number | null | undefined) =>
    typeof value === "number" ? String(Number(value.toPrecision(12))) : (value ?? "");
  process.stdout.write(stringify(rows.map((row) => columns.map((column) => cell(row[column]))), { header: true, columns: [...columns] }));
}
