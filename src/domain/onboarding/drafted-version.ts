import { AppError } from "@/domain/errors";
import type { Check } from "@/domain/settings/check-texts";
import { checkProfile } from "@/domain/settings/checks";
import type { SettingsProfile } from "@/domain/settings/profile";
import type { StartingProfileAnswer } from "@/domain/settings/starting-answer";
import { arithmeticOf } from "./arithmetic";
import { checkFactsOf } from "./check-facts";
import type { DraftAnswers, DraftJournal } from "./draft";
import { draftedProfile } from "./drafted-profile";
import { unreadablePages } from "./page-schema";
import { STEP_NAMES } from "./wizard-step";

/** What a draft amounts to once it is sent: the profile, the arithmetic beside it, and what the checks say. */
export type DraftedVersion = Readonly<{ profile: SettingsProfile; arithmetic: StartingProfileAnswer; checks: ReadonlyArray<Check> }>;

function refuse(sentences: string[]): AppError {
  return new AppError("INVALID_INPUT", sentences.join(" "), { form: sentences });
}

/**
 * A whole draft as a version. The arithmetic is the educator's: it holds its
 * numbers although the gate may be closed, and never goes back to the person.
 *
 * @throws {AppError} INVALID_INPUT on `form` while a page is missing or can't be
 *   read, a setting has no value, or a check blocks
 */
export function draftedVersion(answers: DraftAnswers, journal: DraftJournal): DraftedVersion {
  const unreadable = unreadablePages(answers, journal.glucoseUnit);
  if (unreadable.length > 0) throw refuse(unreadable.map((step) => `A field of the page “${STEP_NAMES[step]}” can’t be read yet.`));
  const arithmetic = arithmeticOf(answers, journal, true);
  if (!arithmetic) throw refuse(["A page before this one is not filled in yet."]);
  const profile = draftedProfile(answers, arithmetic.profile?.cautious ?? null, journal);
  if (!profile) throw refuse(["A setting has no value yet. Go through the pages once more."]);
  const checks = checkProfile(profile, checkFactsOf(answers, journal, arithmetic.totalDailyDose.cautious));
  const blocking = checks.filter(({ severity }) => severity === "blocks").map(({ text }) => text);
  if (blocking.length > 0) throw refuse(blocking);
  return { profile, arithmetic, checks };
}
