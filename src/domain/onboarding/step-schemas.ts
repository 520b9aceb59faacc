import { z } from "zod";
import { decimal, optionalDecimal, timeOfDay, wholeNumber } from "@/domain/form-text";
import { readBlocks } from "@/domain/settings/blocks-text";
import { GATE_QUESTIONS, type GateQuestion } from "@/domain/settings/gate-questions";

const words = (most: number) => z.string().trim().max(most, `At most ${most} characters.`);

const blocksOfText = z.string().transform((typed, ctx) => {
  if (typed.trim() === "") return null;
  const blocks = readBlocks(typed);
  if (typeof blocks !== "string") return blocks;
  ctx.addIssue({ code: "custom", message: blocks });
  return z.NEVER;
});

const answer = z.enum(["yes", "no", "not-sure"], { error: "Choose yes, no or not sure." });
const gateShape = Object.fromEntries(Object.keys(GATE_QUESTIONS).map((q) => [q, answer])) as Record<GateQuestion, typeof answer>;

/** Rows left empty are dropped; one that is half filled is not. */
const blockRows = (bounds: { min: number; max: number; unit: string }) =>
  z.preprocess(
    (rows) => (Array.isArray(rows) ? (rows as ({ from?: string; value?: string } | undefined)[]).filter((r) => r && ((r.from ?? "") !== "" || (r.value ?? "") !== "")) : []),
    z.array(z.object({ from: timeOfDay, value: decimal(bounds) })).max(48),
  );

const targetRows = z.preprocess(
  (rows) => (Array.isArray(rows) ? (rows as ({ from?: string; low?: string } | undefined)[]).filter((r) => r && ((r.from ?? "") !== "" || (r.low ?? "") !== "")) : []),
  z.array(z.object({ from: timeOfDay, low: decimal({ min: 3, max: 300, unit: "" }), high: decimal({ min: 3, max: 300, unit: "" }) })).max(48),
);

const startsAtMidnight = <T extends { from: number }>(rows: T[], ctx: z.RefinementCtx) => {
  if (rows.length === 0) return;
  if (rows[0]?.from !== 0) ctx.addIssue({ code: "custom", path: ["blocks", 0, "from"], message: "The first block starts at 00:00." });
  rows.forEach((row, i) => {
    if (i > 0 && row.from <= (rows[i - 1]?.from ?? -1)) ctx.addIssue({ code: "custom", path: ["blocks", i, "from"], message: "A block starts later than the one before." });
  });
};

const blocksStep = (bounds: { min: number; max: number; unit: string }) =>
  z.object({ blocks: blockRows(bounds) }).superRefine(({ blocks }, ctx) => startsAtMidnight(blocks, ctx));

/** What each page asks; typed text in, numbers out. */
export const STEP_SCHEMAS = {
  "about-you": z.object({
    weightKg: decimal({ min: 20, max: 300, unit: "kg" }),
    ageYears: wholeNumber({ min: 1, max: 110, unit: "years" }),
    totalDailyDoseUnits: decimal({ min: 1, max: 300, unit: "U" }),
    hypoProne: z.enum(["yes", "no"], { error: "Choose yes or no." }),
    largestMealBolusUnits: optionalDecimal({ min: 0.1, max: 60, unit: "U" }),
    workingBasal: blocksOfText.optional(),
    workingCarbRatio: blocksOfText.optional(),
    workingSensitivity: blocksOfText.optional(),
  }),
  gate: z.object(gateShape),
  device: z.object({
    basalStepUnits: decimal({ min: 0.005, max: 0.5, unit: "U/h" }),
    bolusStepUnits: decimal({ min: 0.005, max: 1, unit: "U" }),
    durationOfActionHours: optionalDecimal({ min: 2, max: 8, unit: "hours" }),
  }),
  basal: blocksStep({ min: 0, max: 10, unit: "U/h" }),
  "carb-ratio": blocksStep({ min: 1, max: 150, unit: "g/U" }),
  sensitivity: blocksStep({ min: 0.2, max: 600, unit: "" }),
  targets: z.object({ blocks: targetRows }).superRefine(({ blocks }, ctx) => {
    startsAtMidnight(blocks, ctx);
    blocks.forEach((b, i) => {
      if (b.high < b.low) ctx.addIssue({ code: "custom", path: ["blocks", i, "high"], message: "The upper end is not below the lower end." });
    });
  }),
  limits: z.object({
    maxBasalUnitsPerHour: optionalDecimal({ min: 0, max: 20, unit: "U/h" }),
    maxBolusUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
    maxInsulinOnBoardUnits: optionalDecimal({ min: 0, max: 60, unit: "U" }),
    features: z.preprocess(
      (rows) => (Array.isArray(rows) ? (rows as ({ label?: string } | undefined)[]).filter((r) => (r?.label ?? "").trim() !== "") : []),
      z.array(z.object({ label: words(80).min(1), value: words(200) })).max(30),
    ),
  }),
  margin: z.object({}),
  fallback: z.object({
    previousSetup: words(4000).min(1, "Write down what you would go back to."),
    longActingUnits: optionalDecimal({ min: 0, max: 200, unit: "U" }),
    emergencyNumber: words(40).min(1, "Type the emergency number where you live."),
    contacts: z.preprocess(
      (rows) => (Array.isArray(rows) ? (rows as ({ name?: string } | undefined)[]).filter((r) => (r?.name ?? "").trim() !== "") : []),
      z.array(z.object({ name: words(80).min(1), phone: words(40).min(1, "Type a phone number.") })).min(1, "Name at least one person who can be called.").max(6),
    ),
  }),
  review: z.object({}),
} as const;
