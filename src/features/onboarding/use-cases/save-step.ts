import "server-only";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal, updateJournal } from "@/db/repositories/journals";
import { findDraft, updateDraft } from "@/db/repositories/wizard-drafts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { STEP_SCHEMAS } from "@/domain/onboarding/step-schemas";
import { nextStep, type WizardStep } from "@/domain/onboarding/wizard-step";
import type { Context } from "@/lib/context";
import { saveStepInput, type SaveStepInput } from "../schema";

/**
 * Save one page of the starting profile as typed, once it can be read.
 *
 * @throws {AppError} STALE when another device saved since the page was opened;
 *   the form keeps what was typed, and nothing is overwritten
 */
export async function saveStep(ctx: Context, input: SaveStepInput): Promise<{ next: WizardStep; rowVersion: number }> {
  const { journalId, step, rowVersion } = saveStepInput.parse(input);
  const { journalId: _id, step: _step, rowVersion: _version, returnTo: _returnTo, ...typed } = input;
  const read = STEP_SCHEMAS[step].parse(typed);
  authorize(ctx.actor, "draft.save", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const draft = await findDraft(tx, journalId);
    const journal = await findJournal(tx, journalId);
    if (!draft || !journal) throw new AppError("NOT_FOUND", `draft of ${journalId}`);
    const at = ctx.now();
    const saved = await updateDraft(tx, { journalId, answers: { ...draft.answers, [step]: typed }, rowVersion, updatedAt: at, updatedBy: userId });
    if (saved === null) throw new AppError("STALE", "the draft was saved elsewhere");
    if (step === "device") {
      const device = STEP_SCHEMAS.device.parse(read);
      const setup = { ...journal.setup, basalStepMilliUnits: Math.round(device.basalStepUnits * 1000), bolusStepMilliUnits: Math.round(device.bolusStepUnits * 1000) };
      await updateJournal(tx, journalId, { setup });
    }
    if (step === "fallback") {
      const card = STEP_SCHEMAS.fallback.parse(read);
      await upsertFallbackCard(tx, {
        journalId, previousSetup: card.previousSetup, emergencyNumber: card.emergencyNumber, contacts: card.contacts,
        longActingMilliUnits: card.longActingUnits === null ? null : Math.round(card.longActingUnits * 1000), updatedAt: at,
      });
    }
    return { next: nextStep(step), rowVersion: saved };
  });
}
