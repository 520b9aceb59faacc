import { z } from "zod";

/** What can be logged. The lists are those of the trade or our own words; see the content page of the glossary. */
export const ENTRY_KINDS = ["meal", "dose", "activity", "site", "sensor", "feeling", "ketones", "note"] as const;
export type EntryKind = (typeof ENTRY_KINDS)[number];

export const MEAL_SPEEDS = ["fast", "mixed", "slow", "unsure"] as const;
export const DOSE_TIMINGS = ["before", "with", "after", "missed"] as const;
export const DOSE_KINDS = ["meal", "correction", "meal-and-correction", "injected-back-up", "long-acting"] as const;
export const ACTIVITY_LEVELS = ["easy", "steady", "hard", "mixed"] as const;
export const SITE_EVENTS = ["changed", "fell-off", "blocked", "leaking", "sore"] as const;
export const SENSOR_EVENTS = ["new", "warming-up", "fault", "lay-on-it"] as const;

const words = z.string().trim().max(2000);
const slider = z.number().int().min(0).max(10);

/** The content of an entry by kind: carbohydrate in g, insulin in milli-units, durations in minutes, ketones in µmol/L. */
export const entryDataSchema = z.discriminatedUnion("kind", [
  z.object({
    kind: z.literal("meal"),
    carbohydrateGrams: z.number().int().min(0).max(500),
    label: words.max(80),
    speed: z.enum(MEAL_SPEEDS),
  }),
  z.object({
    kind: z.literal("dose"),
    milliUnits: z.number().int().min(0).max(100_000),
    doseKind: z.enum(DOSE_KINDS),
    timing: z.enum(DOSE_TIMINGS),
  }),
  z.object({
    kind: z.literal("activity"),
    level: z.enum(ACTIVITY_LEVELS),
    durationMinutes: z.number().int().min(1).max(1440),
    isPlanned: z.boolean(),
  }),
  z.object({ kind: z.literal("site"), event: z.enum(SITE_EVENTS) }),
  z.object({ kind: z.literal("sensor"), event: z.enum(SENSOR_EVENTS) }),
  z.object({ kind: z.literal("feeling"), wornOutToFresh: slider, worriedToAtEase: slider }),
  z.object({ kind: z.literal("ketones"), ketonesMicroMolPerL: z.number().int().min(0).max(20_000) }),
  z.object({ kind: z.literal("note"), text: words.min(1) }),
]);

export type EntryData = z.infer<typeof entryDataSchema>;
