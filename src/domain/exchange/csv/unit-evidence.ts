import type { GlucoseUnit } from "@/domain/units";

export type UnitGuess = Readonly<{ unit: GlucoseUnit | "ask"; evidence: string }>;

/** The unit of a column: its header first, then its values, else it is asked. Nothing is ever converted silently. */
export function guessUnit(header: string, values: ReadonlyArray<number>): UnitGuess {
  if (/mmol/i.test(header)) return { unit: "mmol/L", evidence: `The header says so: “${header}”.` };
  if (/mg\s*\/?\s*dl/i.test(header)) return { unit: "mg/dL", evidence: `The header says so: “${header}”.` };
  const sorted = values.toSorted((a, b) => a - b);
  const [least, middle, most] = [sorted[0], sorted[Math.floor(sorted.length / 2)], sorted.at(-1)];
  if (least === undefined || middle === undefined || most === undefined) return { unit: "ask", evidence: "There is no value to go by." };
  if (middle < 20 && most < 35) return { unit: "mmol/L", evidence: `Values run from ${least} to ${most}, as mmol/L do.` };
  if (middle > 40 && least >= 18) return { unit: "mg/dL", evidence: `Values run from ${least} to ${most}, as mg/dL do.` };
  return { unit: "ask", evidence: `Values run from ${least} to ${most}: that could be either unit.` };
}
