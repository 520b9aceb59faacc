import { plainDigits } from "@/domain/form-text";
import { clockText } from "@/domain/settings/clock-text";
import { MAX_BLOCKS } from "@/domain/settings/profile-bounds";
import { MINUTES_PER_DAY } from "@/domain/settings/schedule";

/**
 * A block as it stands in its fields, unread: when it starts and its one or two
 * values. Text stays text until a page is saved, so that nothing half typed is lost.
 */
export type TypedRow = Readonly<{ from: string } & Record<string, string>>;

/** The rows after an edit, where the focus goes, and what is said aloud about it. */
export type RowEdit = Readonly<{ rows: ReadonlyArray<TypedRow>; focusRow: number; say: string }>;

const HALF_HOUR = 30;

/** The minute of a typed start, or null while it can't be read. */
export function startOfRow(from: string): number | null {
  const [, hours = "", minutes = ""] = /^(\d{1,2})[:.](\d{2})$/.exec(plainDigits(from)) ?? [];
  if (hours === "" || Number(minutes) > 59) return null;
  const minute = Number(hours) * 60 + Number(minutes);
  return minute < MINUTES_PER_DAY ? minute : null;
}

/** Nothing stands in any of its value fields. */
export function hasNoValue({ from: _from, ...values }: TypedRow): boolean {
  return Object.values(values).every((value) => value.trim() === "");
}

/** An empty row at the end; its start is typed by the person. */
export function addRow(rows: ReadonlyArray<TypedRow>, fields: ReadonlyArray<string>): RowEdit {
  if (rows.length >= MAX_BLOCKS) return { rows, focusRow: rows.length - 1, say: `There are ${MAX_BLOCKS} blocks already, one for each half hour.` };
  const empty = Object.fromEntries(fields.map((field) => [field, ""]));
  return { rows: [...rows, { ...empty, from: rows.length === 0 ? "00:00" : "" }], focusRow: rows.length, say: `Block ${rows.length + 1} added. Type when it starts.` };
}

/** Where a block ends: at the next readable start after it, or at midnight. */
function endOfRow(rows: ReadonlyArray<TypedRow>, startMinute: number): number {
  const later = rows.flatMap((row) => startOfRow(row.from) ?? []).filter((minute) => minute > startMinute);
  return Math.min(MINUTES_PER_DAY, ...later);
}

/**
 * Cut a block in two in its middle, on a half hour where there is one; both
 * halves keep the value. A block whose start can't be read stays whole.
 */
export function splitRow(rows: ReadonlyArray<TypedRow>, index: number): RowEdit {
  const row = rows[index];
  const start = row ? startOfRow(row.from) : null;
  const stays = (say: string): RowEdit => ({ rows, focusRow: Math.min(index, rows.length - 1), say });
  if (!row || start === null) return stays("Type when this block starts first, such as 06:30.");
  if (rows.length >= MAX_BLOCKS) return stays(`There are ${MAX_BLOCKS} blocks already, one for each half hour.`);
  const end = endOfRow(rows, start);
  const middle = start + (end - start) / 2;
  const onHalfHour = Math.floor(middle / HALF_HOUR) * HALF_HOUR;
  const at = onHalfHour > start ? onHalfHour : Math.floor(middle);
  if (at <= start) return stays("This block is too short to be cut.");
  const from = clockText(at);
  return { rows: rows.toSpliced(index + 1, 0, { ...row, from }), focusRow: index + 1, say: `Cut in two. The new block starts at ${from}.` };
}

/** Let the block before run on over this one. The first block stays: a day begins at 00:00. */
export function removeRow(rows: ReadonlyArray<TypedRow>, index: number): RowEdit {
  if (index <= 0 || index >= rows.length) return { rows, focusRow: 0, say: "The first block stays; it starts the day." };
  const from = rows[index]?.from ?? "";
  return { rows: rows.toSpliced(index, 1), focusRow: index - 1, say: `Block ${from} removed; the one before runs on.`.replace("  ", " ") };
}

/** One press of an editor's button, as its name says: "add", "split.2" or "remove.2". Anything else changes nothing. */
export function editRows(rows: ReadonlyArray<TypedRow>, edit: string, fields: ReadonlyArray<string>): RowEdit {
  if (edit === "add") return addRow(rows, fields);
  const [, verb, index] = /^(split|remove)\.(\d{1,2})$/.exec(edit) ?? [];
  if (verb === "split") return splitRow(rows, Number(index));
  if (verb === "remove") return removeRow(rows, Number(index));
  return { rows, focusRow: 0, say: "" };
}
