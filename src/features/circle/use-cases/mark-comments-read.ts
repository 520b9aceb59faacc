import "server-only";
import type { z } from "zod";
import { markReadUpTo } from "@/db/repositories/comments";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";
import { markCommentsReadInput } from "../schema";

/**
 * Mark as read what the reader has seen: everything in the journal up to the
 * newest comment on their page. What came meanwhile stays unread.
 *
 * @throws {AppError} NOT_FOUND, UNAUTHENTICATED
 */
export async function markCommentsRead(ctx: Context, input: z.input<typeof markCommentsReadInput>): Promise<void> {
  const { journalId, readUpTo } = markCommentsReadInput.parse(input);
  authorize(ctx.actor, "comment.read", journalId);
  const { userId } = requireUser(ctx.actor);
  const upTo = new Date(Math.min(Date.parse(readUpTo), ctx.now().getTime()));
  await markReadUpTo(ctx.db, { journalId, userId, readUpTo: upTo });
}
