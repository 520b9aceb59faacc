import "server-only";
import { findJournal } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { findDraft } from "@/db/repositories/wizard-drafts";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { arithmeticOf } from "@/domain/onboarding/arithmetic";
import { draftedProfile } from "@/domain/onboarding/drafted-profile";
import { STEP_SCHEMAS } from "@/domain/onboarding/step-schemas";
import { WIZARD_STEPS } from "@/domain/onboarding/wizard-step";
import type { Context } from "@/lib/context";
import { stepInput } from "../schema";

/** One page of the wizard: what was typed, the arithmetic so far, and how far the draft has come. */
export async function wizardPage(ctx: Context, input: { journalId: string; step: string }) {
  const { journalId, step } = stepInput.parse(input);
  authorize(ctx.actor, "draft.read", journalId);
  const journal = await findJournal(ctx.db, journalId);
  const draft = await findDraft(ctx.db, journalId);
  if (!journal || !draft) throw new AppError("NOT_FOUND", `draft of ${journalId}`);
  const versions = await listVersions(ctx.db, journalId);
  const starting = versions.find((v) => v.kind === "starting");
  const arithmetic = arithmeticOf(draft.answers, journal, false);
  const isGateOpen = arithmetic === null ? null : arithmetic.gate.open;
  return {
    step, journal, arithmetic, isGateOpen,
    rowVersion: draft.rowVersion,
    savedAt: draft.updatedAt,
    typed: draft.answers[step] ?? {},
    answers: draft.answers,
    profile: draftedProfile(draft.answers, arithmetic?.profile?.cautious ?? null, journal),
    done: WIZARD_STEPS.filter((s) => s !== "review" && draft.answers[s] !== undefined && STEP_SCHEMAS[s].safeParse(draft.answers[s]).success),
    /** The version this draft became, while it does not wait for mending. */
    sentAs: starting && starting.state !== "returned" && starting.state !== "withdrawn" && starting.state !== "declined" ? starting.number : null,
  };
}

export type WizardView = Awaited<ReturnType<typeof wizardPage>>;
