import "server-only";
import { updateDraft } from "@/db/repositories/wizard-drafts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { asideOf, withoutAside, withPage } from "@/domain/onboarding/draft-pages";
import { stepSchemas } from "@/domain/onboarding/step-schemas";
import type { Context } from "@/lib/context";
import { chooseTextInput, type ChooseTextInput } from "../schema";
import { openDraft, writeThrough } from "./save-step";

/**
 * Of the texts that two devices typed for one page, the person says which stays.
 *
 * @throws {AppError} STALE when the draft moved on since the texts were shown, so
 *   that nothing goes unseen; NOT_FOUND for a text that is not there
 */
export async function chooseText(ctx: Context, input: ChooseTextInput): Promise<{ rowVersion: number }> {
  const { journalId, step, rowVersion, keep } = chooseTextInput.parse(input);
  authorize(ctx.actor, "draft.save", journalId);
  const { userId } = requireUser(ctx.actor);

  return ctx.db.transaction(async (tx) => {
    const { draft, journal } = await openDraft(tx, journalId);
    if (draft.rowVersion !== rowVersion) throw new AppError("STALE", "the draft was saved elsewhere");
    const chosen = keep === "saved" ? null : asideOf(draft.answers, step)[keep];
    if (chosen === undefined) throw new AppError("NOT_FOUND", `text ${keep} of ${step}`);
    const settled = withoutAside(draft.answers, step);
    const answers = chosen === null ? settled : withPage(settled, step, chosen, draft.rowVersion + 1);
    const saved = await updateDraft(tx, { journalId, answers, rowVersion, updatedAt: ctx.now(), updatedBy: userId });
    if (saved === null) throw new AppError("STALE", "the draft was saved elsewhere");
    if (chosen !== null && stepSchemas(journal.glucoseUnit)[step].safeParse(chosen).success) await writeThrough(tx, step, chosen, journal, ctx.now());
    return { rowVersion: saved };
  });
}
