import "server-only";
import { findFallbackCard } from "@/db/repositories/fallback-cards";
import { listCircle } from "@/db/repositories/grants";
import { findJournal } from "@/db/repositories/journals";
import { listReviews } from "@/db/repositories/version-reviews";
import { listVersions } from "@/db/repositories/versions";
import { findDraft } from "@/db/repositories/wizard-drafts";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { nextState } from "@/domain/journal/version-lifecycle";
import { arithmeticOf } from "@/domain/onboarding/arithmetic";
import { checkFactsOf } from "@/domain/onboarding/check-facts";
import type { DraftAnswers } from "@/domain/onboarding/draft";
import { asideOf } from "@/domain/onboarding/draft-pages";
import { draftStanding } from "@/domain/onboarding/draft-standing";
import { draftedProfile } from "@/domain/onboarding/drafted-profile";
import { missingWorkingSettings } from "@/domain/onboarding/page-schema";
import { stepSchemas } from "@/domain/onboarding/step-schemas";
import { WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import { workingProfile } from "@/domain/onboarding/working-profile";
import type { Context } from "@/lib/context";
import { stepInput } from "../schema";

/**
 * One page of the wizard: what was typed, the arithmetic so far, and how far the
 * draft has come. With a closed gate the arithmetic holds no number.
 */
export async function wizardPage(ctx: Context, input: { journalId: string; step: string }) {
  const { journalId, step } = stepInput.parse(input);
  authorize(ctx.actor, "draft.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const draft = await findDraft(ctx.db, journalId);
  if (!journal || !draft) throw new AppError("NOT_FOUND", `draft of ${journalId}`);
  const card = await findFallbackCard(ctx.db, journalId);
  const answers: DraftAnswers = card && card.previousSetup !== "" ? { ...draft.answers, fallback: typedCard(card) } : draft.answers;
  const standing = draftStanding(await listVersions(ctx.db, journalId));
  const arithmetic = arithmeticOf(answers, journal, false);
  const schemas = stepSchemas(journal.glucoseUnit);
  const about = schemas["about-you"].safeParse(answers["about-you"] ?? {});
  const isRead = (s: (typeof WIZARD_STEPS)[number]) => answers[s] !== undefined && schemas[s].safeParse(answers[s]).success;
  const isComplete = (s: (typeof WIZARD_STEPS)[number]) => s !== "about-you" || Object.keys(missingWorkingSettings(answers[s] ?? {}, journal.therapy)).length === 0;
  const remarks = standing.is === "open" && standing.returned ? (await listReviews(ctx.db, journalId)).filter((r) => r.number === standing.returned?.number).at(-1) : undefined;
  const circle = await listCircle(ctx.db, journalId, ctx.now());
  return {
    step, journal, answers, arithmetic,
    isGateOpen: arithmetic === null ? null : arithmetic.gate.open,
    now: ctx.now(),
    rowVersion: draft.rowVersion,
    savedAt: draft.updatedAt,
    typed: answers[step] ?? {},
    /** Texts that another device typed for this page, waiting for a choice. */
    aside: asideOf(draft.answers, step),
    asideSteps: WIZARD_STEPS.filter((s) => asideOf(draft.answers, s).length > 0),
    profile: draftedProfile(answers, arithmetic?.profile?.cautious ?? null, journal),
    checkFacts: checkFactsOf(answers, journal, arithmetic?.totalDailyDose.cautious ?? null),
    /** A pump's own settings as typed, beside which the new ones stand. */
    working: about.success && journal.therapy !== "injections" ? workingProfile(about.data, journal) : null,
    done: WIZARD_STEPS.filter((s) => s !== "review" && isRead(s) && isComplete(s)),
    unreadable: WIZARD_STEPS.filter((s) => s !== "review" && answers[s] !== undefined && !isRead(s)),
    hasEducator: circle.some(({ role }) => role === "educator"),
    /** The version this draft became, while it does not wait for mending. */
    sentAs: standing.is === "sent" ? { number: standing.version.number, state: standing.version.state } : null,
    returned: standing.is === "open" && standing.returned ? { number: standing.returned.number, remarks: remarks?.remarks ?? "", reviewerName: remarks?.reviewerName ?? null } : null,
    mayRecord: arithmetic?.gate.open === true && standing.is === "open" && nextState(standing.returned ? "returned" : "draft", "record") !== null,
  };
}

function typedCard(card: NonNullable<Awaited<ReturnType<typeof findFallbackCard>>>) {
  const units = (milliUnits: number | null) => (milliUnits === null ? "" : String(milliUnits / 1000));
  const { previousSetup, emergencyNumber, contacts } = card;
  return { previousSetup, emergencyNumber, contacts, longActingUnits: units(card.longActingMilliUnits), rapidUnits: units(card.rapidMilliUnits) };
}

export type WizardView = Awaited<ReturnType<typeof wizardPage>>;
