import { z } from "zod";
import { decimal, timeOfDay } from "@/domain/form-text";
import { MAX_BLOCKS } from "@/domain/settings/profile-bounds";

type Bounds = Readonly<{ min: number; max: number; unit: string }>;
type Read = Readonly<{ from: number }>;

const textOf = (value: unknown) => (typeof value === "string" ? value.trim() : typeof value === "number" ? String(value) : "");

/** A row without a value counts as not there, unless a start other than midnight was typed into it. */
function orNothing(fields: ReadonlyArray<string>) {
  return (row: unknown) => {
    if (row === null || typeof row !== "object") return null;
    const typed = row as Record<string, unknown>;
    const isEmpty = fields.every((field) => textOf(typed[field]) === "");
    return isEmpty && ["", "00:00", "0:00"].includes(textOf(typed.from)) ? null : row;
  };
}

function sayWhereDayBreaks(rows: ReadonlyArray<Read | null>, ctx: z.RefinementCtx): void {
  const starts = rows.flatMap((row, index) => (row ? [{ index, from: row.from }] : []));
  const first = starts.toSorted((a, b) => a.from - b.from)[0];
  if (first && first.from !== 0) ctx.addIssue({ code: "custom", path: [first.index, "from"], message: "The first block starts at 00:00." });
  for (const { index, from } of starts) {
    if (starts.some((other) => other.index < index && other.from === from)) {
      ctx.addIssue({ code: "custom", path: [index, "from"], message: "A block starts at this time already." });
    }
  }
}

/**
 * Rows of a page, read. They may be typed in any order and come back in the
 * order of the day; an issue names the row as it was typed.
 */
function rowsOf<R extends Read>(fields: ReadonlyArray<string>, row: z.ZodType<R>) {
  return z.preprocess(
    (rows): unknown => (Array.isArray(rows) ? rows : []),
    z
      .array(z.preprocess(orNothing(fields), row.nullable()))
      .max(MAX_BLOCKS)
      .superRefine(sayWhereDayBreaks)
      .transform((rows) => rows.filter((read): read is R => read !== null).toSorted((a, b) => a.from - b.from)),
  );
}

/** Blocks of one value, such as a basal rate. */
export function valueRows(bounds: Bounds) {
  return rowsOf(["value"], z.object({ from: timeOfDay, value: decimal(bounds) }));
}

/** Blocks of a lower and an upper end. */
export function targetRows(bounds: Bounds) {
  const row = z
    .object({ from: timeOfDay, low: decimal(bounds), high: decimal(bounds) })
    .refine(({ low, high }) => low <= high, { path: ["high"], message: "The upper end is not below the lower end." });
  return rowsOf(["low", "high"], row);
}
