import { z } from "zod";

/**
 * Readers of what people type into forms. Each takes text as the browser sends
 * it and gives a number or a list, or says in plain words what is amiss.
 */

const FULL_WIDTH_ZERO = 0xff10;

/** Full-width digits, points, commas and colons to plain ones; spaces of every kind dropped. */
export function plainDigits(typed: string): string {
  return typed
    .replace(/[\uff10-\uff19]/g, (c) => String(c.charCodeAt(0) - FULL_WIDTH_ZERO))
    .replace(/[\uff0e\u3002]/g, ".")
    .replace(/[\uff0c\u066b]/g, ",")
    .replace(/\uff1a/g, ":")
    .replace(/\s+/gu, "");
}

const EMPTY = "Type a number.";

/**
 * A decimal number as people write one: "5,6", "5.6", " 5.6 U/h", full-width
 * digits. A unit behind the number is dropped; "1,234" is refused, since it may
 * be a thousand or one and a bit.
 *
 * @returns the number, or a sentence that says why it can't be read
 */
export function readDecimal(typed: string): number | string {
  const text = plainDigits(typed).replace(/[\p{L}%/()²·]+$/u, "").replace(/[\p{L}]+\/[\p{L}]*$/u, "");
  if (text === "") return EMPTY;
  if (/^-?\d{1,3},\d{3}$/.test(text) && !/^-?0,/.test(text)) return "Write this without a comma, or with a point: it can be read in two ways.";
  if (!/^-?\d+([.,]\d+)?$/.test(text)) return "Type one number, such as 0.5 or 12.";
  return Number(text.replace(",", "."));
}

type Bounds = Readonly<{ min: number; max: number; unit: string }>;

function boundsSentence({ min, max, unit }: Bounds): string {
  return `Type a number between ${min} and ${max}${unit ? ` ${unit}` : ""}.`;
}

/** A typed decimal within bounds, both included. */
export function decimal(bounds: Bounds) {
  return z.union([z.string(), z.number()]).transform((typed, ctx) => {
    const value = typeof typed === "number" ? typed : readDecimal(typed);
    if (typeof value === "string") {
      const of = bounds.unit ? `, in ${bounds.unit}` : "";
      ctx.addIssue({ code: "custom", message: value === EMPTY ? `Type a number${of}.` : value.replace(/\.$/, `${of}.`) });
      return z.NEVER;
    }
    if (!Number.isFinite(value) || value < bounds.min || value > bounds.max) {
      ctx.addIssue({ code: "custom", message: boundsSentence(bounds) });
      return z.NEVER;
    }
    return value;
  });
}

/** A typed decimal that may be left empty: null then. */
export function optionalDecimal(bounds: Bounds) {
  return z
    .union([z.literal("").transform(() => null), decimal(bounds)])
    .nullish()
    .transform((value) => value ?? null);
}

/** A typed whole number within bounds, both included. */
export function wholeNumber(bounds: Bounds) {
  return decimal(bounds).refine((value) => Number.isInteger(value), { message: "Type a whole number." });
}

/** A checkbox: present is yes. */
export const tick = z
  .union([z.literal("on"), z.literal("true"), z.boolean(), z.literal(""), z.literal("false")])
  .optional()
  .transform((value) => value === "on" || value === "true" || value === true);

/** What a group of fields with one name sends, as a list: none, one or many. */
export function asList(given: unknown): unknown[] {
  if (given === undefined || given === null || given === "" || given === false) return [];
  return Array.isArray(given) ? (given as unknown[]) : [given];
}

/** A group of checkboxes: none, one or many values of a list. */
export function listOf<const T extends readonly [string, ...string[]]>(values: T) {
  return z.preprocess(
    asList,
    z.array(z.enum(values)),
  );
}

const CLOCK = /^(\d{1,2})[:.](\d{2})$/;

/** A time of day "HH:MM" as minutes after midnight; 24:00 is not a start. */
export const timeOfDay = z.union([z.string(), z.number().int()]).transform((typed, ctx) => {
  const [, hours = "", minutes = ""] = typeof typed === "number" ? [] : (CLOCK.exec(plainDigits(typed)) ?? []);
  const minute = typeof typed === "number" ? typed : hours === "" ? Number.NaN : Number(hours) * 60 + Number(minutes);
  if (!(minute >= 0 && minute < 1440) || Number(minutes) > 59) {
    ctx.addIssue({ code: "custom", message: "Type a time of day, such as 06:30." });
    return z.NEVER;
  }
  return minute;
});
