import "server-only";
import type { Db } from "@/db/client";
import { upsertFallbackCard } from "@/db/repositories/fallback-cards";
import { findJournal, updateJournal, type JournalRow } from "@/db/repositories/journals";
import { listVersions } from "@/db/repositories/versions";
import { findDraftForUpdate, updateDraft } from "@/db/repositories/wizard-drafts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { arithmeticOf } from "@/domain/onboarding/arithmetic";
import type { TypedPage } from "@/domain/onboarding/draft";
import { isSamePage, savedCountOf, withAside, withPage } from "@/domain/onboarding/draft-pages";
import { draftStanding } from "@/domain/onboarding/draft-standing";
import { fieldsOf, missingWorkingSettings } from "@/domain/onboarding/page-schema";
import { withoutPreset } from "@/domain/onboarding/step-start";
import { stepSchemas } from "@/domain/onboarding/step-schemas";
import { nextStep, type WizardStep } from "@/domain/onboarding/wizard-step";
import { milliUnitsOrNull } from "@/domain/units";
import type { Context } from "@/lib/context";
import { saveStepInput, type SaveStepInput } from "../schema";

/**
 * Save one page of the starting profile as typed, once it can be read.
 *
 * A page that another device saved since it was opened here is not overwritten:
 * what was typed here is kept beside it and both wait for a choice. A page that
 * only other pages moved on from is simply saved.
 *
 * @returns the page to go to, and whether the text was kept aside
 * @throws {AppError} CONFLICT once the draft was sent; INVALID_INPUT by field
 */
export async function saveStep(ctx: Context, input: SaveStepInput): Promise<{ next: WizardStep; rowVersion: number; isAside: boolean }> {
  const { journalId, step, rowVersion } = saveStepInput.parse(input);
  authorize(ctx.actor, "draft.save", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const { draft, journal } = await openDraft(tx, journalId);
    const page = fieldsOf(step, input);
    assertReadable(step, page, journal);
    const preset = arithmeticOf(draft.answers, journal, false)?.profile?.cautious ?? null;
    const kept = withoutPreset(step, page, startFactsOf(journal, preset));
    const isStale = savedCountOf(draft.answers, step) > rowVersion;
    if (isStale && isSamePage(draft.answers[step], kept)) return { next: nextStep(step), rowVersion: draft.rowVersion, isAside: false };
    const answers = isStale ? withAside(draft.answers, step, kept) : withPage(draft.answers, step, kept, draft.rowVersion + 1);
    const saved = await updateDraft(tx, { journalId, answers, rowVersion: draft.rowVersion, updatedAt: ctx.now(), updatedBy: userId });
    if (saved === null) throw new AppError("STALE", "the draft was saved elsewhere");
    if (isStale) return { next: step, rowVersion: saved, isAside: true };
    await writeThrough(tx, step, page, journal, ctx.now());
    return { next: nextStep(step), rowVersion: saved, isAside: false };
  });
}

/** The draft under lock with its journal. @throws {AppError} NOT_FOUND; CONFLICT once it was sent */
export async function openDraft(tx: Db, journalId: string) {
  const draft = await findDraftForUpdate(tx, journalId);
  const journal = await findJournal(tx, journalId);
  if (!draft || !journal) throw new AppError("NOT_FOUND", `draft of ${journalId}`);
  const standing = draftStanding(await listVersions(tx, journalId));
  if (standing.is === "sent") throw new AppError("CONFLICT", `the draft became version ${standing.version.number}`);
  return { draft, journal };
}

/** What pages open with, from the journal. */
export function startFactsOf(journal: JournalRow, preset: Parameters<typeof withoutPreset>[2]["preset"]) {
  const { insulin, basalStepMilliUnits, bolusStepMilliUnits } = journal.setup;
  return { preset, unit: journal.glucoseUnit, insulin, basalStepUnits: basalStepMilliUnits / 1000, bolusStepUnits: bolusStepMilliUnits / 1000 };
}

function assertReadable(step: WizardStep, page: TypedPage, journal: JournalRow): void {
  stepSchemas(journal.glucoseUnit)[step].parse(page);
  const missing = step === "about-you" ? missingWorkingSettings(page, journal.therapy) : {};
  if (Object.keys(missing).length > 0) throw new AppError("INVALID_INPUT", "working settings are missing", missing);
}

/** What a page says of the setup or the way back is written there, too, so that nothing is asked twice. */
export async function writeThrough(tx: Db, step: WizardStep, page: TypedPage, journal: JournalRow, at: Date): Promise<void> {
  const schemas = stepSchemas(journal.glucoseUnit);
  if (step === "device") {
    const device = schemas.device.parse(page);
    const steps = { basalStepMilliUnits: Math.round(device.basalStepUnits * 1000), bolusStepMilliUnits: Math.round(device.bolusStepUnits * 1000) };
    await updateJournal(tx, journal.id, { setup: { ...journal.setup, ...steps, insulin: device.insulin ?? journal.setup.insulin } });
  }
  if (step === "fallback") {
    const { longActingUnits, rapidUnits, ...card } = schemas.fallback.parse(page);
    await upsertFallbackCard(tx, { ...card, journalId: journal.id, longActingMilliUnits: milliUnitsOrNull(longActingUnits), rapidMilliUnits: milliUnitsOrNull(rapidUnits), updatedAt: at });
  }
}
