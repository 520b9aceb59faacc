import { OPEN_GATE } from "@/domain/settings/starting-profile.fixture";
import type { DraftAnswers, DraftJournal } from "./draft";

/** The reference person of settings.md 3.2: 80 kg, 40 U a day, gate open; a 0.05 step. */
export const INJECTIONS: DraftJournal = { therapy: "injections", glucoseUnit: "mg/dL", setup: { basalStepMilliUnits: 50, bolusStepMilliUnits: 50 } };
export const PUMP: DraftJournal = { ...INJECTIONS, therapy: "pump" };

export const REFERENCE_DRAFT: DraftAnswers = {
  "about-you": { weightKg: "80", ageYears: "40", totalDailyDoseUnits: "40", hypoProne: "no", largestMealBolusUnits: "6.03" },
  gate: OPEN_GATE,
};

/** The same on a pump with settings that work; 0.525 lies on a step of 0.025 only. */
export const PUMP_DRAFT: DraftAnswers = {
  ...REFERENCE_DRAFT,
  "about-you": { ...REFERENCE_DRAFT["about-you"], workingBasal: "00:00 0.60\n04:00 0,85\n09:00 0.525", workingCarbRatio: "00:00 12.5", workingSensitivity: "00:00 42.5" },
};
