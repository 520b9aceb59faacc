import type { ApiProfile } from "@/domain/settings/profile-api-schema";
import { startingProfile } from "@/domain/settings/starting-profile";
import { startingProfileRequestSchema } from "@/domain/settings/starting-profile-request";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import { dailyDoseOf } from "./daily-totals";
import type { DraftAnswers, DraftJournal } from "./draft";
import { stepSchemas } from "./step-schemas";
import { workingProfile } from "./working-profile";

/**
 * The published arithmetic for what has been answered so far; null while the
 * numbers it needs are missing. Injections are cut down and spread out; a pump's
 * working settings are carried over unchanged with the arithmetic beside them.
 *
 * @param isForEducator shows the arithmetic although the gate is closed
 */
export function arithmeticOf(answers: DraftAnswers, journal: DraftJournal, isForEducator: boolean): StartingProfileAnswer | null {
  const schemas = stepSchemas(journal.glucoseUnit);
  const about = schemas["about-you"].safeParse(answers["about-you"] ?? {});
  const gate = schemas.gate.safeParse(answers.gate ?? {});
  if (!about.success || !gate.success) return null;
  const { weightKg, ageYears, hypoProne, largestMealBolusUnits } = about.data;
  const dailyDoseUnits = dailyDoseOf(about.data);
  const pump = journal.therapy === "injections" ? null : workingProfile(about.data, journal);
  if (journal.therapy !== "injections" && !pump) return null;
  const request = startingProfileRequestSchema.safeParse({
    weightKg, ageYears, hypoProne: hypoProne === "yes", gate: gate.data,
    ...(pump ? { pump: { ...pump, totalDailyDoseUnits: dailyDoseUnits } } : { injectionsTotalDailyDoseUnits: dailyDoseUnits }),
    insulinStepUnits: journal.setup.basalStepMilliUnits / 1000,
    forReview: isForEducator,
    glucoseUnit: journal.glucoseUnit,
    largestRecentBolusUnits: largestMealBolusUnits,
  });
  if (!request.success) return null;
  const answer = startingProfile(request.data);
  return pump ? withDurationOfRules(answer) : answer;
}

/** A pump's duration is not asked with its other settings: the rules' own stands in until the device page says one. */
function withDurationOfRules(answer: StartingProfileAnswer): StartingProfileAnswer {
  const { profile, durationOfAction } = answer;
  if (!profile || durationOfAction.cautious === null) return answer;
  const withDuration = (preset: ApiProfile) => ({ ...preset, durationOfActionMinutes: durationOfAction.cautious ?? preset.durationOfActionMinutes });
  return { ...answer, profile: { cautious: withDuration(profile.cautious), standard: withDuration(profile.standard) } };
}
