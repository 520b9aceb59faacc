import { z } from "zod";
import { DAY_FLAG_CODES, type DayFlagCode } from "@/domain/journal/day-flag";
import { decimal, wholeNumber } from "@/domain/form-text";
import { DOSE_KINDS, DOSE_TIMINGS, MEAL_SPEEDS } from "@/domain/journal/entry";

const journalId = z.uuid();
const at = z.string().regex(/^\d{4}-\d{2}-\d{2}T\d{2}:\d{2}/, "Type a date and time.");

export const dayInput = z.object({ journalId, date: z.iso.date() });
export const journalInput = z.object({ journalId });

export const logMealInput = z.object({
  journalId, at,
  carbohydrateGrams: wholeNumber({ min: 0, max: 500, unit: "g" }),
  label: z.string().trim().max(80, "At most 80 characters."),
  speed: z.enum(MEAL_SPEEDS).default("unsure"),
});
export const logDoseInput = z.object({
  journalId, at,
  units: decimal({ min: 0, max: 100, unit: "U" }),
  doseKind: z.enum(DOSE_KINDS, { error: "Choose what kind of dose." }),
  timing: z.enum(DOSE_TIMINGS).default("with"),
});
export const logNoteInput = z.object({ journalId, at, text: z.string().trim().min(1, "Type a note.").max(2000, "At most 2000 characters.") });
export const logKetonesInput = z.object({ journalId, at, ketonesMmolPerL: decimal({ min: 0, max: 20, unit: "mmol/L" }) });
export const removeEntryInput = z.object({ journalId, entryId: z.uuid() });
export const setFlagInput = z.object({
  journalId,
  code: z.enum(DAY_FLAG_CODES as [DayFlagCode, ...DayFlagCode[]], { error: "Choose what was different." }),
  firstDay: z.iso.date("Type a date."),
  lastDay: z.iso.date("Type a date."),
  note: z.string().trim().max(500, "At most 500 characters."),
}).refine((flag) => flag.firstDay <= flag.lastDay, { path: ["lastDay"], message: "The last day is not before the first." });
