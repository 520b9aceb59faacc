import { z } from "zod";
import { apiProfileSchema } from "./profile-api-schema";

const gateAnswerSchema = z
  .union([z.boolean(), z.enum(["yes", "no", "not-sure"])])
  .transform((answer) => (answer === true ? "yes" : answer === false ? "no" : answer))
  .nullish();

/** Booleans as in the interface; "not-sure" may be said too. What is left out is not a no. */
const gateSchema = z.object({
  pregnant: gateAnswerSchema,
  under18: gateAnswerSchema,
  recentSevereLow: gateAnswerSchema,
  recentKetoacidosis: gateAnswerSchema,
  impairedAwareness: gateAnswerSchema,
  kidneyLiverAdrenal: gateAnswerSchema,
  steroids: gateAnswerSchema,
  acuteIllness: gateAnswerSchema,
  eatingDisorder: gateAnswerSchema,
  sglt2Inhibitor: gateAnswerSchema,
  firstEverPump: gateAnswerSchema,
  frailOrCognitive: gateAnswerSchema,
});

const dailyDoseUnitsSchema = z.number().min(1).max(500);
const largestRecentSchema = z.number().positive().max(100).nullish();

/** A step a pump can be set in: up to half a unit, in whole thousandths. */
const insulinStepSchema = z
  .number()
  .min(0.001)
  .max(0.5)
  .refine((step) => Math.abs(step * 1000 - Math.round(step * 1000)) < 1e-6, "whole thousandths of a unit");

/**
 * What the published arithmetic of a starting profile needs. Exactly one of the
 * injections' daily dose and the present pump (its profile and daily dose).
 * Doses in U, rates in U/h; the bounds catch slips of the keyboard only.
 */
export const startingProfileRequestSchema = z
  .object({
    weightKg: z.number().min(2).max(400),
    ageYears: z.number().min(0).max(120),
    injectionsTotalDailyDoseUnits: dailyDoseUnitsSchema.nullish(),
    pump: apiProfileSchema.extend({ totalDailyDoseUnits: dailyDoseUnitsSchema }).nullish(),
    hypoProne: z.boolean(),
    insulinStepUnits: insulinStepSchema.default(0.05),
    gate: gateSchema,
    forReview: z.boolean().default(false),
    glucoseUnit: z.enum(["mg/dL", "mmol/L"]).default("mg/dL"),
    largestRecentBolusUnits: largestRecentSchema,
    largestRecentBasalUnitsPerHour: largestRecentSchema,
  })
  .superRefine((request, context) => {
    const given = [request.injectionsTotalDailyDoseUnits, request.pump].filter((dose) => dose != null).length;
    if (given === 1) return;
    context.addIssue({
      code: "custom",
      path: ["injectionsTotalDailyDoseUnits"],
      message: "exactly one of injectionsTotalDailyDoseUnits and pump",
    });
  });

export type StartingProfileRequest = z.infer<typeof startingProfileRequestSchema>;
