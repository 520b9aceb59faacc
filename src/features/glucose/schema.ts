import { z } from "zod";
import { csvMappingSchema } from "@/domain/exchange/csv/row-mapper";
import { isZone } from "@/domain/zone-name";

export const journalInput = z.object({ journalId: z.uuid() });
export const importInput = z.object({ journalId: z.uuid(), importId: z.uuid() });

const noneToNull = (value: unknown) => (value === "" || value === "none" || value === undefined ? null : value);

/** The preview's form: every guess may be changed; unit, zone and day order are settled here. */
export const runImportInput = z.object({
  journalId: z.uuid(),
  importId: z.uuid(),
  ...csvMappingSchema.shape,
  dateColumn: z.preprocess(noneToNull, csvMappingSchema.shape.dateColumn),
  subjectColumn: z.preprocess(noneToNull, csvMappingSchema.shape.subjectColumn),
  subject: z.preprocess(noneToNull, csvMappingSchema.shape.subject),
  unit: z.enum(["mg/dL", "mmol/L"], { error: "Say which unit the file is in." }),
  dateOrder: z.enum(["day-first", "month-first"], { error: "Say whether the day or the month comes first." }),
  timeZone: z.string({ error: "Choose the zone of the file’s clock." }).refine(isZone, "Choose a time zone from the list."),
  shiftMinutes: z.preprocess((v) => (v === "" || v === undefined ? 0 : v), z.coerce.number("Type whole minutes.").int("Type whole minutes.").min(-1440, "At most a day.").max(1440, "At most a day.")),
});
export type RunImportInput = z.input<typeof runImportInput>;
