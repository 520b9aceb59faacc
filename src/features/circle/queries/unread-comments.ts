import "server-only";
import { countUnread } from "@/db/repositories/comments";
import { readableSubjects } from "@/domain/access/comment-subject";
import { authorize, requireUser } from "@/domain/access/policy";
import type { Context } from "@/lib/context";

/** How many comments by others the signed-in reader has not marked as read, by journal. */
export async function unreadComments(ctx: Context): Promise<ReadonlyMap<string, number>> {
  authorize(ctx.actor, "journal.list");
  const { userId, grants } = requireUser(ctx.actor);
  const counts = await Promise.all(
    grants.map(async ({ journalId }) => [journalId, await countUnread(ctx.db, { journalId, userId, subjects: readableSubjects(ctx.actor, journalId) })] as const),
  );
  return new Map(counts);
}
