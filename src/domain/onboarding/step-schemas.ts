import { z } from "zod";
import { decimal, optionalDecimal, wholeNumber } from "@/domain/form-text";
import { readBlocks } from "@/domain/settings/blocks-text";
import { GATE_QUESTIONS, type GateQuestion } from "@/domain/settings/gate-questions";
import type { GlucoseUnit } from "@/domain/units";
import { targetRows, valueRows } from "./block-schemas";
import { dailyTotals } from "./daily-totals";
import { featureRows } from "./feature-rows";

type Bounds = Readonly<{ min: number; max: number; unit: string }>;

/** They catch a slip of the keyboard and nothing more. Common practice, no source. */
const BASAL: Bounds = { min: 0, max: 10, unit: "U/h" };
const CARB_RATIO: Bounds = { min: 1, max: 150, unit: "g/U" };
const SENSITIVITY: Readonly<Record<GlucoseUnit, Bounds>> = {
  "mg/dL": { min: 2, max: 900, unit: "mg/dL per U" },
  "mmol/L": { min: 0.1, max: 50, unit: "mmol/L per U" },
};
const TARGET: Readonly<Record<GlucoseUnit, Bounds>> = {
  "mg/dL": { min: 60, max: 300, unit: "mg/dL" },
  "mmol/L": { min: 3.4, max: 16.6, unit: "mmol/L" },
};

const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);

/** Blocks written as on a device, one a line; null where nothing was written. */
const writtenBlocks = (bounds: Bounds) =>
  words(2000)
    .transform((typed, ctx) => {
      if (typed === "") return null;
      const blocks = readBlocks(typed);
      const isOutside = typeof blocks !== "string" && blocks.some(({ value }) => value < bounds.min || value > bounds.max);
      if (typeof blocks !== "string" && !isOutside) return blocks;
      ctx.addIssue({ code: "custom", message: typeof blocks === "string" ? blocks : `Each value lies between ${bounds.min} and ${bounds.max} ${bounds.unit}.` });
      return z.NEVER;
    })
    .optional();

const gateAnswer = z.enum(["yes", "no", "not-sure"], { error: "Choose yes, no or not sure." });
const gateShape = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((q) => [q, gateAnswer])) as Record<GateQuestion, typeof gateAnswer>;

const contacts = z.preprocess(
  (rows): unknown => (Array.isArray(rows) ? rows : []),
  z
    .array(
      z.preprocess(
        (row) => (row && typeof row === "object" && Object.values(row).some((text) => typeof text === "string" && text.trim() !== "") ? row : null),
        z.object({ name: words(80).min(1, "Type a name."), phone: words(40).min(1, "Type a phone number.") }).nullable(),
      ),
    )
    .max(6)
    .transform((rows) => rows.filter((row) => row !== null))
    .refine((rows) => rows.length > 0, { path: [0, "name"], message: "Name at least one person who can be called." }),
);

/** What stands on the fallback card; the wizard's page and the card's own form ask the same. */
export const cardFields = z.object({
  previousSetup: words(4000).min(1, "Write down what you would go back to."),
  longActingUnits: optionalDecimal({ min: 0, max: 200, unit: "U" }),
  rapidUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
  emergencyNumber: words(40).min(1, "Type the emergency number where you live."),
  contacts,
});

const inUnit = (unit: GlucoseUnit) => ({
  "about-you": z
    .object({
      weightKg: decimal({ min: 20, max: 300, unit: "kg" }),
      ageYears: wholeNumber({ min: 1, max: 110, unit: "years" }),
      totalDailyDoseUnits: optionalDecimal({ min: 1, max: 300, unit: "U" }),
      dailyTotals: dailyTotals.optional(),
      hypoProne: z.enum(["yes", "no"], { error: "Choose yes or no." }),
      largestMealBolusUnits: optionalDecimal({ min: 0.1, max: 60, unit: "U" }),
      workingBasal: writtenBlocks(BASAL),
      workingCarbRatio: writtenBlocks(CARB_RATIO),
      workingSensitivity: writtenBlocks(SENSITIVITY[unit]),
    })
    .refine((page) => page.totalDailyDoseUnits !== null || (page.dailyTotals ?? null) !== null, {
      path: ["totalDailyDoseUnits"], message: "Type a number, in U, or the total of each day below.",
    }),
  gate: z.object(gateShape),
  device: z.object({
    insulin: words(120).optional(),
    basalStepUnits: decimal({ min: 0.005, max: 0.5, unit: "U/h" }),
    bolusStepUnits: decimal({ min: 0.005, max: 1, unit: "U" }),
    durationOfActionHours: optionalDecimal({ min: 2, max: 8, unit: "hours" }),
  }),
  basal: z.object({ blocks: valueRows(BASAL) }),
  "carb-ratio": z.object({ blocks: valueRows(CARB_RATIO) }),
  sensitivity: z.object({ blocks: valueRows(SENSITIVITY[unit]) }),
  targets: z.object({ blocks: targetRows(TARGET[unit]) }),
  limits: z.object({
    maxBasalUnitsPerHour: optionalDecimal({ min: 0, max: 20, unit: "U/h" }),
    maxBolusUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
    maxInsulinOnBoardUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
    features: featureRows,
  }),
  margin: z.object({}),
  fallback: cardFields,
  review: z.object({}),
});

const SCHEMAS = { "mg/dL": inUnit("mg/dL"), "mmol/L": inUnit("mmol/L") } as const;

/** What each page asks, typed text in and numbers out; glucose in the notebook's unit. */
export function stepSchemas(unit: GlucoseUnit) {
  return SCHEMAS[unit];
}
