import { readFile } from "node:fs/promises";
import { parse } from "csv-parse/sync";
import { z } from "zod";
import { AppError } from "@/domain/errors";
import { NOMINAL_PARAMETERS } from "@/domain/simulator/parameters";
import { referenceRun, type RunEvent } from "@/domain/simulator/reference-run";

/** A refusal of the input, said in one message that names the line. */
class RefusedInput extends Error {}

const UNIT_OF_KIND = { basal: "U/h", bolus: "U", meal: "g" } as const;

const number = z.string().trim().min(1, "a number is missing").pipe(z.coerce.number("not a number"));

const rowSchema = z
  .object({
    kind: z.enum(["basal", "bolus", "meal"]),
    t_min: number.pipe(z.number().min(0, "before the start")),
    value: number.pipe(z.number().min(0, "below zero")),
    unit: z.string().trim(),
  })
  .refine(({ kind, unit }) => unit === UNIT_OF_KIND[kind], { path: ["unit"], message: "basal is in U/h, bolus in U, meal in g" });

/**
 * The inputs of a file with the columns kind, t_min, value and unit, in any order.
 *
 * @throws {RefusedInput} naming the line (the header is 1) and the column at fault
 */
function eventsIn(csv: string): RunEvent[] {
  let rows: Record<string, string>[];
  try {
    rows = parse(csv, { columns: true, bom: true, trim: true, skip_empty_lines: true });
  } catch (error) {
    throw new RefusedInput(`not a table: ${error instanceof Error ? error.message : String(error)}`);
  }
  return rows.map((row, index) => {
    const parsed = rowSchema.safeParse(row);
    if (parsed.success) return { kind: parsed.data.kind, minute: parsed.data.t_min, value: parsed.data.value };
    const faults = parsed.error.issues.map(({ path, message }) => `line ${index + 2}: ${path.map(String).join(".")}: ${message}`);
    throw new RefusedInput(faults.join("\n"));
  });
}

/**
 * The glucose of the reference person (70 kg, published mean values, from a steady
 * state at 6 mmol/L) over one day, as text with the columns t_min and G_mmol_L.
 */
export function trajectoryText(csv: string): string {
  const rows = referenceRun(NOMINAL_PARAMETERS, eventsIn(csv), { startMmol: 6, untilMinute: 1440, everyMinutes: 5 });
  const lines = rows.map(({ minute, glucoseMmol }) => `${minute},${Number(glucoseMmol.toPrecision(10))}`);
  return ["t_min,G_mmol_L", ...lines, ""].join("\n");
}

/**
 * `verify -- simulator INPUTS.csv`: prints the run every 5 min to 1440. The row at the
 * time of an input holds the state after it. A file that cannot be read or is not valid
 * ends with exit code 1 and a message on stderr; nothing is printed then.
 */
export async function run(args: string[]): Promise<void> {
  const [file] = args;
  try {
    if (file === undefined) throw new RefusedInput("usage: verify -- simulator INPUTS.csv");
    const csv = await readFile(file, "utf8").catch((error: unknown) => {
      throw new RefusedInput(error instanceof Error ? error.message : String(error));
    });
    process.stdout.write(trajectoryText(csv));
  } catch (error) {
    if (!(error instanceof RefusedInput || error instanceof AppError)) throw error;
    process.stderr.write(`${error.message}\n`);
    process.exitCode = 1;
  }
}
