import { MGDL_PER_MMOL } from "@/domain/units";
import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import { startingProfile } from "@/domain/settings/starting-profile";
import { startingProfileRequestSchema } from "@/domain/settings/starting-profile-request";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import type { TypedBlock } from "@/domain/settings/blocks-text";
import type { DraftAnswers, DraftJournal } from "./draft";
import { STEP_SCHEMAS } from "./step-schemas";

/**
 * The published arithmetic for what has been answered so far; null while the
 * numbers it needs are missing.
 *
 * @param isForEducator shows the arithmetic although the gate is closed
 */
export function arithmeticOf(answers: DraftAnswers, journal: DraftJournal, isForEducator: boolean): StartingProfileAnswer | null {
  const about = STEP_SCHEMAS["about-you"].safeParse(answers["about-you"] ?? {});
  const gate = STEP_SCHEMAS.gate.safeParse(answers.gate ?? {});
  if (!about.success || !gate.success) return null;
  const { weightKg, ageYears, totalDailyDoseUnits, hypoProne, largestMealBolusUnits } = about.data;
  const pump = journal.therapy === "injections" ? null : workingProfile(about.data, journal);
  const request = startingProfileRequestSchema.safeParse({
    weightKg, ageYears, hypoProne: hypoProne === "yes", gate: gate.data,
    ...(pump ? { pump: { ...pump, totalDailyDoseUnits } } : { injectionsTotalDailyDoseUnits: totalDailyDoseUnits }),
    insulinStepUnits: journal.setup.basalStepMilliUnits / 1000,
    forReview: isForEducator,
    glucoseUnit: journal.glucoseUnit,
    largestRecentBolusUnits: largestMealBolusUnits,
  });
  return request.success ? startingProfile(request.data) : null;
}

/** The working settings of a pump as typed, in the shape of the interface; null while one is missing. */
function workingProfile(
  about: { workingBasal?: TypedBlock[] | null; workingCarbRatio?: TypedBlock[] | null; workingSensitivity?: TypedBlock[] | null },
  journal: DraftJournal,
): ApiProfile | null {
  const { workingBasal, workingCarbRatio, workingSensitivity } = about;
  if (!workingBasal || !workingCarbRatio || !workingSensitivity) return null;
  const factor = journal.glucoseUnit === "mg/dL" ? 1 : MGDL_PER_MMOL;
  return {
    basal: workingBasal.map(({ startMinute, value }) => ({ startMinute, unitsPerHour: value })),
    carbRatio: workingCarbRatio.map(({ startMinute, value }) => ({ startMinute, gramsPerUnit: value })),
    sensitivity: workingSensitivity.map(({ startMinute, value }) => ({ startMinute, mgDlPerUnit: value * factor })),
    target: [{ startMinute: 0, lowMgDl: 120, highMgDl: 130 }],
    durationOfActionMinutes: 240,
    limits: { maxBasalUnitsPerHour: null, maxBolusUnits: null, maxInsulinOnBoardUnits: null },
    features: [],
  };
}
