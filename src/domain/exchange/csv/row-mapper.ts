import { z } from "zod";
import { bandOf, type Band } from "@/domain/glucose/band";
import { mmolToMgDl, type GlucoseUnit } from "@/domain/units";
import { DELIMITERS } from "./dialect";
import { instantsOfLocal } from "./local-times";
import { timeField } from "./preview";
import { readTime } from "./timestamp";
import { readGlucose } from "./value";

const column = z.coerce.number().int().min(0).max(500);

/** How the rows of a file are to be read, settled before anything is stored. */
export const csvMappingSchema = z.object({
  encoding: z.enum(["utf-8", "utf-16le", "utf-16be", "windows-1252"]),
  delimiter: z.enum(DELIMITERS),
  headerRow: z.coerce.number().int().min(-1).max(200),
  timeColumn: column,
  dateColumn: column.nullable(),
  glucoseColumn: column,
  subjectColumn: column.nullable(),
  subject: z.string().max(200).nullable(),
  dateOrder: z.enum(["day-first", "month-first"]),
  unit: z.enum(["mg/dL", "mmol/L"]),
  timeZone: z.string(),
  shiftMinutes: z.coerce.number().int().min(-1440).max(1440).default(0),
});
export type CsvMapping = z.infer<typeof csvMappingSchema>;

export type MappedReading = Readonly<{
  line: number;
  atMs: number;
  sourceValue: number;
  sourceUnit: GlucoseUnit;
  glucoseMgDl: number;
  bound: "below" | "above" | null;
  band: Band;
}>;

export type Refusal = Readonly<{ line: number; reason: string; text: string }>;
type Outcome = { reading: MappedReading } | { refusal: Refusal } | { duplicate: true } | { passedOver: true };

/**
 * Reads the rows of one file in order. Kept between rows: the instant before,
 * to tell the two passes of a repeated hour, and the instants seen.
 */
export class RowMapper {
  private previousMs: number | null = null;
  private readonly seen = new Map<number, number>();

  constructor(private readonly mapping: CsvMapping) {}

  /** @param line the file's line number, from 1 */
  map(fields: ReadonlyArray<string>, line: number): Outcome {
    const { mapping } = this;
    const refuse = (reason: string, text: string): Outcome => ({ refusal: { line, reason, text } });
    if (mapping.subjectColumn !== null && mapping.subject !== null && (fields[mapping.subjectColumn] ?? "").trim() !== mapping.subject) return { passedOver: true };
    const timeText = timeField(fields, mapping);
    const time = readTime(timeText, mapping.dateOrder);
    if (!time) return refuse("time-not-read", "The time can’t be read.");
    const glucose = readGlucose(fields[mapping.glucoseColumn] ?? "", mapping.unit);
    if (typeof glucose === "string") return refuse("value-not-read", glucose);
    const instant = time.kind === "instant" ? time.ms : this.resolve(time.ms);
    if (typeof instant === "string") return refuse(instant, LOCAL_REFUSALS[instant]);
    this.previousMs = instant;
    const atMs = instant + mapping.shiftMinutes * 60_000;
    const known = this.seen.get(atMs);
    if (known !== undefined) {
      return known === glucose.value ? { duplicate: true } : refuse("second-value", "There is another value at this very time; the first was kept.");
    }
    this.seen.set(atMs, glucose.value);
    const glucoseMgDl = mapping.unit === "mg/dL" ? glucose.value : mmolToMgDl(glucose.value);
    return {
      reading: { line, atMs, sourceValue: glucose.value, sourceUnit: mapping.unit, glucoseMgDl, bound: glucose.bound, band: bandOf(glucose.value, mapping.unit, glucose.bound) },
    };
  }

  private resolve(localMs: number): number | keyof typeof LOCAL_REFUSALS {
    const instants = instantsOfLocal(localMs, this.mapping.timeZone);
    const [first, second] = instants;
    if (first === undefined) return "no-such-time";
    if (second === undefined) return first;
    if (this.previousMs === null) return "time-twice";
    if (this.previousMs >= first) return second;
    return this.previousMs < first && first - this.previousMs <= HOUR_MS ? first : "time-twice";
  }
}

const HOUR_MS = 3_600_000;
const LOCAL_REFUSALS = {
  "no-such-time": "The clock skips this time in this zone; the device’s clock was perhaps not put forward.",
  "time-twice": "The clock shows this time twice in this zone, and the rows around it don’t tell which was meant.",
} as const;
