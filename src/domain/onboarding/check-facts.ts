import type { CheckFacts } from "@/domain/settings/checks";
import { dailyDoseOf } from "./daily-totals";
import type { DraftAnswers, DraftJournal } from "./draft";
import { stepSchemas } from "./step-schemas";

/**
 * What the checks of a review know beside the profile. From injections the daily
 * dose is the one the start was worked out from, as the basal share is of that.
 */
export function checkFactsOf(answers: DraftAnswers, journal: DraftJournal, startingDoseUnits: number | null): CheckFacts {
  const about = stepSchemas(journal.glucoseUnit)["about-you"].safeParse(answers["about-you"] ?? {});
  const page = about.success ? about.data : null;
  const largest = page?.largestMealBolusUnits ?? null;
  return {
    totalDailyDoseUnits: startingDoseUnits ?? (page ? dailyDoseOf(page) : null),
    weightKg: page?.weightKg ?? null,
    basalStepMilliUnits: journal.setup.basalStepMilliUnits,
    bolusStepMilliUnits: journal.setup.bolusStepMilliUnits,
    largestRecentBolusMilliUnits: largest === null ? null : Math.round(largest * 1000),
  };
}
