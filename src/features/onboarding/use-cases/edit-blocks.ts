import "server-only";
import { updateDraft } from "@/db/repositories/wizard-drafts";
import { authorize, requireUser } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import { editRows, type TypedRow } from "@/domain/onboarding/block-rows";
import { savedCountOf, withAside, withPage } from "@/domain/onboarding/draft-pages";
import type { Context } from "@/lib/context";
import { BLOCK_FIELDS, type BlockStep } from "../constants";
import { editBlocksInput, type EditBlocksInput } from "../schema";
import { openDraft } from "./save-step";

/**
 * Add, cut or remove a block where there is no script: the rows as typed go into
 * the draft, changed by one press, and the page opens again with them. Rows that
 * can't be read yet are kept as they are; the page counts as done once they can.
 *
 * @throws {AppError} CONFLICT once the draft was sent
 */
export async function editBlocks(ctx: Context, input: EditBlocksInput): Promise<{ step: BlockStep }> {
  const { journalId, step, rowVersion, edit, blocks } = editBlocksInput.parse(input);
  authorize(ctx.actor, "draft.save", journalId);
  const { userId } = requireUser(ctx.actor);
  const fields = BLOCK_FIELDS[step];
  const typed = blocks.map((row): TypedRow => ({ ...Object.fromEntries(fields.map((field) => [field, row[field] ?? ""])), from: row.from ?? "" }));

  return ctx.db.transaction(async (tx) => {
    const { draft } = await openDraft(tx, journalId);
    const isStale = savedCountOf(draft.answers, step) > rowVersion;
    const page = { blocks: editRows(typed, edit, fields).rows };
    const answers = isStale ? withAside(draft.answers, step, page) : withPage(draft.answers, step, page, draft.rowVersion + 1);
    const saved = await updateDraft(tx, { journalId, answers, rowVersion: draft.rowVersion, updatedAt: ctx.now(), updatedBy: userId });
    if (saved === null) throw new AppError("STALE", "the draft was saved elsewhere");
    return { step };
  });
}
