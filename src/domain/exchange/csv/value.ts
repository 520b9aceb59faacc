import type { GlucoseUnit } from "@/domain/units";

export type TypedGlucose = Readonly<{ value: number; bound: "below" | "above" | null }>;

/** What sensors commonly can show; a limit of the file, not of glucose. */
const LIMITS: Readonly<Record<GlucoseUnit, readonly [number, number]>> = { "mg/dL": [40, 400], "mmol/L": [2.2, 22.2] };
/** Values outside these are not glucose (ours, generous on purpose). */
const PLAUSIBLE: Readonly<Record<GlucoseUnit, readonly [number, number]>> = { "mg/dL": [10, 1000], "mmol/L": [0.5, 55] };

const LOW = /^(low|lo|niedrig|laag|bas|bajo|lav|lågt|matala)$/i;
const HIGH = /^(high|hi|hoch|hoog|haut|alto|høj|høy|hög|korkea)$/i;

/**
 * A glucose value of a file. LOW, HIGH and comparators keep their meaning as a
 * bound at the limit.
 *
 * @returns the value in `unit`, or a sentence that says why it was not taken
 */
export function readGlucose(field: string, unit: GlucoseUnit): TypedGlucose | string {
  const text = field.trim();
  const [low, high] = LIMITS[unit];
  if (text === "") return "There is no value.";
  if (LOW.test(text)) return { value: low, bound: "below" };
  if (HIGH.test(text)) return { value: high, bound: "above" };
  const [, comparator = "", digits = ""] = /^([<>≤≥]?)=?\s*(\d{1,4}(?:[.,]\d{1,6})?)$/.exec(text) ?? [];
  if (digits === "") return "The value is not a number.";
  const value = Number(digits.replace(",", "."));
  const [least, most] = PLAUSIBLE[unit];
  if (value < least || value > most) return `The value is not a glucose value in ${unit}.`;
  if (comparator === "") return { value, bound: null };
  return { value, bound: comparator === "<" || comparator === "≤" ? "below" : "above" };
}
