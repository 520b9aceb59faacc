import "server-only";
import { removeEntry as hideEntry } from "@/db/repositories/entries";
import { authorize } from "@/domain/access/policy";
import { AppError } from "@/domain/errors";
import type { Context } from "@/lib/context";
import { removeEntryInput } from "../schema";

/** Take an entry off the journal's pages. @throws {AppError} NOT_FOUND when it is gone already */
export async function removeEntry(ctx: Context, input: { journalId: string; entryId: string }): Promise<void> {
  const { journalId, entryId } = removeEntryInput.parse(input);
  authorize(ctx.actor, "entry.log", journalId);
  if (!(await hideEntry(ctx.db, journalId, entryId, ctx.now()))) throw new AppError("NOT_FOUND", `entry ${entryId}`);
}
